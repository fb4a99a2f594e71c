package org.foreseal.molecule;

import java.util.Arrays;

/**
 * One connected structure in the atom order of its builder, while it is being prepared: localised
 * bonds first, then rings, then aromatic marks.
 */
final class Skeleton {
  final int size;
  final int[] element;
  final int[] charge;
  final int[] hydrogens;
  final int[][] neighbours;
  final int[][] orders;
  final boolean[] aromatic;
  final boolean[][] aromaticBond;
  int[][] rings = new int[0][];

  Skeleton(int size) {
    this.size = size;
    element = new int[size];
    charge = new int[size];
    hydrogens = new int[size];
    neighbours = new int[size][];
    orders = new int[size][];
    aromatic = new boolean[size];
    aromaticBond = new boolean[size][];
  }

  boolean hasRings() {
    int ends = 0;
    for (int[] row : neighbours) {
      ends += row.length;
    }
    return ends / 2 >= size;
  }

  /**
   * The same structure with atom {@code i} at place {@code rank[i]} and its neighbours in ascending
   * order.
   */
  Skeleton inOrder(int[] rank) {
    Skeleton to = new Skeleton(size);
    for (int i = 0; i < size; i++) {
      int at = rank[i];
      to.element[at] = element[i];
      to.charge[at] = charge[i];
      to.hydrogens[at] = hydrogens[i];
      to.aromatic[at] = aromatic[i];
      int degree = neighbours[i].length;
      long[] slots = new long[degree];
      for (int k = 0; k < degree; k++) {
        slots[k] = (long) rank[neighbours[i][k]] << 8 | k;
      }
      Arrays.sort(slots);
      to.neighbours[at] = new int[degree];
      to.orders[at] = new int[degree];
      to.aromaticBond[at] = new boolean[degree];
      for (int k = 0; k < degree; k++) {
        int from = (int) (slots[k] & 255);
        to.neighbours[at][k] = (int) (slots[k] >> 8);
        to.orders[at][k] = orders[i][from];
        to.aromaticBond[at][k] = aromaticBond[i][from];
      }
    }
    return to;
  }

  /**
   * Finds the alternation of the aromatic bonds anew, so that it depends only on the order of the
   * atoms.
   */
  void localiseAnew() throws ImpossibleStructureException {
    for (int i = 0; i < size; i++) {
      for (int k = 0; k < orders[i].length; k++) {
        orders[i][k] = bondCode(i, k);
      }
    }
    Kekulization.localise(element, charge, hydrogens, neighbours, orders);
  }

  int bondSlot(int from, int to) {
    for (int k = 0; k < neighbours[from].length; k++) {
      if (neighbours[from][k] == to) {
        return k;
      }
    }
    return -1;
  }

  void markAromatic(int a, int b) {
    aromaticBond[a][bondSlot(a, b)] = true;
    aromaticBond[b][bondSlot(b, a)] = true;
  }

  /** Bond code of the identity: 1, 2, 3, or 4 for an aromatic bond. */
  int bondCode(int atom, int slot) {
    return aromaticBond[atom][slot] ? MoleculeBuilder.AROMATIC : orders[atom][slot];
  }

  void checkValences() throws ImpossibleStructureException {
    for (int i = 0; i < size; i++) {
      int total = hydrogens[i];
      for (int order : orders[i]) {
        total += order;
      }
      ChemicalElement e = ChemicalElement.require(element[i]);
      if (hydrogens[i] < 0 || !e.allowsValence(charge[i], total)) {
        throw new ImpossibleStructureException(
            e.symbol()
                + (charge[i] == 0 ? "" : " with charge " + charge[i])
                + " cannot carry "
                + total
                + " bonds");
      }
    }
  }
}
