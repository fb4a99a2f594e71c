package org.foreseal.molecule;

/**
 * A few structural features as bits, to tell at a glance that a pattern cannot be in a molecule:
 * which elements occur, whether there is an aromatic atom, a double or a triple bond.
 */
final class Features {
  private static final int ELEMENT_BITS = 29;
  private static final int AROMATIC = 1 << ELEMENT_BITS;
  private static final int DOUBLE = 1 << 30;
  private static final int TRIPLE = 1 << 31;

  private Features() {}

  /** What a prepared structure holds. */
  static int of(Skeleton s) {
    int bits = 0;
    for (int i = 0; i < s.size; i++) {
      bits |= element(s.element[i]);
      bits |= s.aromatic[i] ? AROMATIC : 0;
      for (int k = 0; k < s.orders[i].length; k++) {
        bits |= s.orders[i][k] == 2 && !s.aromaticBond[i][k] ? DOUBLE : 0;
        bits |= s.orders[i][k] == 3 ? TRIPLE : 0;
      }
    }
    return bits;
  }

  /** What a pattern demands. Hydrogens are counts, so they demand nothing. */
  static int demandedBy(QueryGraph query) {
    int bits = 0;
    for (QueryGraph.Atom atom : query.atoms()) {
      if (!atom.isHydrogen() && atom.element().isPresent()) {
        bits |= element(atom.element().getAsInt());
      }
      bits |= atom.aromatic() ? AROMATIC : 0;
    }
    for (QueryGraph.Bond bond : query.bonds()) {
      bits |= bond.written() == QueryGraph.Written.DOUBLE ? DOUBLE : 0;
      bits |= bond.written() == QueryGraph.Written.TRIPLE ? TRIPLE : 0;
    }
    return bits;
  }

  /** Two elements may share a bit; the pattern is then looked for in vain, never missed. */
  private static int element(int atomicNumber) {
    return 1 << (atomicNumber % ELEMENT_BITS);
  }
}
