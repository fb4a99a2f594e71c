package org.foreseal.molecule;

import java.util.List;

/**
 * One distinct result of a transformation.
 *
 * @param products the products, in ascending order
 * @param atomMap where their atoms came from, for the first site found
 * @param sites at how many equivalent places of the reactants the same products arise
 */
public record Outcome(List<Molecule> products, AtomMap atomMap, int sites) {
  /** Keeps an unmodifiable copy. */
  public Outcome {
    products = List.copyOf(products);
  }
}
