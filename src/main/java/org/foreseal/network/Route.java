package org.foreseal.network;

import java.util.List;

/**
 * One way from the charge to a species: every step it takes, each after those that make its
 * reactants.
 *
 * @param steps the steps in order
 * @param cost sum of their costs
 */
public record Route(List<Step> steps, double cost) {
  /** Keeps an unmodifiable copy. */
  public Route {
    steps = List.copyOf(steps);
  }
}
