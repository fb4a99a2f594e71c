package org.foreseal.molecule;

/**
 * Where every atom of the products of one step came from. Heavy atoms are mapped one to one; of the
 * hydrogens only those that change their atom are listed, since hydrogens on one atom are alike.
 *
 * <p>Atoms are numbered through: the atoms of the first molecule in canonical order, then those of
 * the second, and so on.
 */
public final class AtomMap {
  private final short[] originOfProductAtom;
  private final short[] hydrogenMoves;

  AtomMap(short[] originOfProductAtom, short[] hydrogenMoves) {
    this.originOfProductAtom = originOfProductAtom;
    this.hydrogenMoves = hydrogenMoves;
  }

  /** Number of product atoms. */
  public int size() {
    return originOfProductAtom.length;
  }

  /**
   * The reactant atom this product atom was, or -1 for the hydrogen atom that stands for a new H2
   * or H+.
   */
  public int origin(int productAtom) {
    return originOfProductAtom[productAtom];
  }

  /** How many hydrogens change their atom. */
  public int hydrogenMoveCount() {
    return hydrogenMoves.length / 2;
  }

  /** The reactant atom that loses the hydrogen of this move. */
  public int hydrogenFrom(int move) {
    return hydrogenMoves[2 * move];
  }

  /** The product atom that gains the hydrogen of this move. */
  public int hydrogenTo(int move) {
    return hydrogenMoves[2 * move + 1];
  }
}
