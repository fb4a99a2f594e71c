package org.foreseal.network;

import java.util.List;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Outcome;
import org.foreseal.rule.Rule;

/** A step found by one rule at one depth, before it is numbered. */
final class Proposal {
  private final Rule rule;
  private final int[] reactants;
  private final Outcome outcome;

  Proposal(Rule rule, int[] reactants, Outcome outcome) {
    this.rule = rule;
    this.reactants = reactants;
    this.outcome = outcome;
  }

  Rule rule() {
    return rule;
  }

  int[] reactants() {
    return reactants;
  }

  Outcome outcome() {
    return outcome;
  }

  List<Molecule> products() {
    return outcome.products();
  }
}
