package org.foreseal.molecule;

import java.util.List;
import java.util.OptionalInt;

/**
 * A parsed SMARTS: atoms and bonds with their conditions, map numbers, and what a product template
 * says of them.
 *
 * @param atoms query atoms in the order written
 * @param bonds query bonds
 */
record QueryGraph(List<Atom> atoms, List<Bond> bonds) {
  QueryGraph {
    atoms = List.copyOf(atoms);
    bonds = List.copyOf(bonds);
  }

  /**
   * One query atom.
   *
   * @param test its condition
   * @param map map number, 0 for none
   * @param charge formal charge it demands or, in a product, sets
   * @param element atomic number it demands, empty when several fit
   * @param aromatic whether it demands an aromatic atom
   */
  record Atom(AtomTest test, int map, OptionalInt charge, OptionalInt element, boolean aromatic) {
    boolean isHydrogen() {
      return element.isPresent() && element.getAsInt() == 1;
    }
  }

  /**
   * One query bond.
   *
   * @param from index of one atom
   * @param to index of the other
   * @param test its condition
   * @param written the order a product template gives it
   */
  record Bond(int from, int to, BondTest test, Written written) {}

  /** How a bond is written. */
  enum Written {
    /** No symbol: single, or aromatic between aromatic atoms. */
    PLAIN(1),
    /** {@code -}. */
    SINGLE(1),
    /** {@code =}. */
    DOUBLE(2),
    /** {@code #}. */
    TRIPLE(3),
    /** {@code :}. */
    AROMATIC(MoleculeBuilder.AROMATIC),
    /** Any other expression; a template that keeps it unchanged may use it. */
    OTHER(0);

    private final int order;

    Written(int order) {
      this.order = order;
    }

    int order() {
      return order;
    }
  }
}
