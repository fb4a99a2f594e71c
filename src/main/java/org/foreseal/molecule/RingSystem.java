package org.foreseal.molecule;

import java.util.List;

/**
 * A ring system of a molecule whose numbering is known.
 *
 * @param parent the parent it was recognised as
 * @param atoms every atom of it, the carbonyl oxygens of a fixed parent included
 * @param numberings the ways to number it: atom at each place of the parent's list of locants
 */
record RingSystem(RingParent parent, List<Integer> atoms, List<int[]> numberings) {
  RingSystem {
    atoms = List.copyOf(atoms);
    numberings = List.copyOf(numberings);
  }

  /** A single all-carbon ring that is not aromatic. */
  boolean isCarbocycle() {
    return parent.kind() == RingParent.Kind.CARBOCYCLE;
  }

  boolean isBenzene() {
    return parent.kind() == RingParent.Kind.BENZENE;
  }

  /** A parent whose name already says its carbonyl groups: it takes prefixes only. */
  boolean isFixed() {
    return parent.kind() == RingParent.Kind.FIXED;
  }
}
