package org.foreseal.molecule;

/**
 * What SMARTS asks of an atom, for real atoms and for the hydrogens that are only counts ({@code
 * ~index}).
 */
final class AtomFacts {
  private AtomFacts() {}

  static int element(Molecule m, int code) {
    return code < 0 ? 1 : m.element(code);
  }

  static boolean isHydrogen(Molecule m, int code) {
    return element(m, code) == 1;
  }

  static boolean isAromatic(Molecule m, int code) {
    return code >= 0 && m.isAromatic(code);
  }

  static int hydrogens(Molecule m, int code) {
    return code < 0 ? (m.element(~code) == 1 ? 1 : 0) : m.hydrogens(code);
  }

  static int connections(Molecule m, int code) {
    return code < 0 ? 1 : m.degree(code) + m.hydrogens(code);
  }

  static int heavyNeighbours(Molecule m, int code) {
    return code < 0 ? 1 : m.degree(code);
  }

  static int charge(Molecule m, int code) {
    return code < 0 ? 0 : m.charge(code);
  }

  static int rings(Molecule m, int code) {
    return code < 0 ? 0 : m.ringsHolding(code);
  }

  static int smallestRing(Molecule m, int code) {
    return code < 0 ? 0 : m.smallestRing(code);
  }
}
