package org.foreseal.network;

import java.util.List;
import java.util.Optional;
import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Molecule;
import org.foreseal.rule.Guard;
import org.foreseal.rule.Rule;
import org.foreseal.rule.SpeciesLimit;
import org.foreseal.rule.Surroundings;

/**
 * Everything that can stand against a step of one rule, asked in order: need, guards, limits, Gibbs
 * energy.
 */
final class StepJudge {
  private final Rule rule;
  private final Surroundings surroundings;
  private final Limits limits;
  private final List<SpeciesLimit> speciesLimits;
  private final Optional<String> closed;

  StepJudge(Rule rule, Surroundings surroundings, Limits limits, List<SpeciesLimit> speciesLimits) {
    this.rule = rule;
    this.surroundings = surroundings;
    this.limits = limits;
    this.speciesLimits = speciesLimits;
    closed = rule.closedBecause(surroundings);
  }

  /** Whether the run closes the whole rule. */
  boolean isClosed() {
    return closed.isPresent();
  }

  /** Whether a guard refuses these reactants, whatever the products. */
  boolean refusesReactants(List<Molecule> reactants) {
    return rule.refusesReactants(reactants, surroundings);
  }

  /** The first thing that stands against the step. */
  Optional<Refusal> refusal(
      StepPruner pruner, List<Molecule> reactants, List<Molecule> products, int depth) {
    Refusals refused = new Refusals(reactants, products, depth);
    if (closed.isPresent()) {
      return refused.because(Refusal.Kind.NEED, closed.get(), "");
    }
    Optional<Guard> guard = rule.refusedBy(new Guard.Attempt(reactants, products, surroundings));
    if (guard.isPresent()) {
      return refused.because(Refusal.Kind.GUARD, guard.get().reason(), "");
    }
    for (SpeciesLimit limit : speciesLimits) {
      if (products.stream().anyMatch(limit.pattern()::isIn)) {
        return refused.because(Refusal.Kind.GUARD, limit.reason(), "");
      }
    }
    Optional<String> size = tooLarge(products);
    if (size.isPresent()) {
      return refused.because(Refusal.Kind.LIMIT, size.get(), "");
    }
    return pruner.judge(reactants, products) instanceof Verdict.Pruned p
        ? refused.because(Refusal.Kind.GIBBS, p.reason(), p.detail())
        : Optional.empty();
  }

  private Optional<String> tooLarge(List<Molecule> products) {
    for (Molecule p : products) {
      if (p.heavyAtomCount() > limits.heavyAtoms()) {
        return Optional.of("larger than " + limits.heavyAtoms() + " heavy atoms");
      }
      if (p.formula().count(ChemicalElement.C) > limits.carbons()) {
        return Optional.of("larger than " + limits.carbons() + " carbon atoms");
      }
    }
    return Optional.empty();
  }

  /** A refusal of what a near miss would make. */
  Refusal nearMiss(List<Molecule> reactants, List<Molecule> products, String reason) {
    return new Refusal(rule, reactants, products, Refusal.Kind.NEAR_MISS, reason, "", 1);
  }

  /** The step a refusal is about. */
  private final class Refusals {
    private final List<Molecule> reactants;
    private final List<Molecule> products;
    private final int depth;

    Refusals(List<Molecule> reactants, List<Molecule> products, int depth) {
      this.reactants = reactants;
      this.products = products;
      this.depth = depth;
    }

    Optional<Refusal> because(Refusal.Kind kind, String reason, String detail) {
      return Optional.of(new Refusal(rule, reactants, products, kind, reason, detail, depth));
    }
  }
}
