package org.foreseal.network;

import org.foreseal.molecule.AtomMap;
import org.foreseal.rule.Rule;

/**
 * One balanced step: a rule turns reactants into products. The ids are those of the network's
 * species.
 */
public final class Step {
  private final int id;
  private final Rule rule;
  private final int[] reactants;
  private final int[] products;
  private final AtomMap atomMap;
  private final int sites;

  Step(int id, Rule rule, int[] reactants, int[] products, AtomMap atomMap, int sites) {
    this.id = id;
    this.rule = rule;
    this.reactants = reactants;
    this.products = products;
    this.atomMap = atomMap;
    this.sites = sites;
  }

  /** Number in the network, from 0. */
  public int id() {
    return id;
  }

  /** The rule that makes it. */
  public Rule rule() {
    return rule;
  }

  /** Species consumed, in the order of the rule's pieces; a species consumed twice stands twice. */
  public int[] reactants() {
    return reactants.clone();
  }

  /** Species formed; a species formed twice stands twice. */
  public int[] products() {
    return products.clone();
  }

  /** Where each product atom came from. */
  public AtomMap atomMap() {
    return atomMap;
  }

  /** At how many equivalent places of the reactants it happens. */
  public int sites() {
    return sites;
  }
}
