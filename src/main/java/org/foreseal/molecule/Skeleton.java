package org.foreseal.molecule;

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
