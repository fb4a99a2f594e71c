package org.foreseal.thermo;

/** Where the values of a molecule come from, best first. */
public enum Origin {
  /** Read from the table of small molecules. */
  TABULATED,
  /** A sum of fitted terms, every one of them known. */
  GROUPS,
  /** A sum in which at least one term fell back to a coarser or a similar one. */
  GROUPS_WITH_FALLBACK,
  /**
   * A sum for a ring system the fit did not cover: bridged or spiro rings, more than one ring of
   * three or four atoms, more than three non-aromatic rings, cumulated double bonds beyond 1,2. The
   * study found a median error of 18 kJ/mol there, which the standard deviation includes.
   */
  OUT_OF_SCOPE
}
