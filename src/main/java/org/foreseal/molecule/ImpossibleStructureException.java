package org.foreseal.molecule;

/**
 * A graph that is no molecule: an atom with a valence it cannot have, or a ring that takes no
 * alternating bonds.
 */
public final class ImpossibleStructureException extends Exception {
  /** Says which atom or ring is wrong. */
  public ImpossibleStructureException(String message) {
    // No stack trace: the rule engine meets and drops thousands of these.
    super(message, null, false, false);
  }
}
