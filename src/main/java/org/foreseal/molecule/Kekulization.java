package org.foreseal.molecule;

/**
 * Gives bonds that are known only as aromatic an alternating single-double pattern: a perfect
 * matching of the atoms that still need a double bond. Atoms with the fewest choices are served
 * first, so backtracking is rare.
 */
final class Kekulization {
  private final int[][] neighbours;
  private final int[][] orders;
  private final boolean[] needy;

  private Kekulization(int[][] neighbours, int[][] orders, boolean[] needy) {
    this.neighbours = neighbours;
    this.orders = orders;
    this.needy = needy;
  }

  /**
   * Replaces every order {@link MoleculeBuilder#AROMATIC} in {@code orders} by 1 or 2, in place.
   */
  static void localise(
      int[] element, int[] charge, int[] hydrogens, int[][] neighbours, int[][] orders)
      throws ImpossibleStructureException {
    boolean[] needy = new boolean[neighbours.length];
    for (int i = 0; i < neighbours.length; i++) {
      int sigma = hydrogens[i];
      boolean open = false;
      for (int order : orders[i]) {
        open |= order == MoleculeBuilder.AROMATIC;
        sigma += order == MoleculeBuilder.AROMATIC ? 1 : order;
      }
      ChemicalElement e = ChemicalElement.require(element[i]);
      needy[i] =
          open && !e.allowsValence(charge[i], sigma) && e.allowsValence(charge[i], sigma + 1);
    }
    Kekulization k = new Kekulization(neighbours, orders, needy);
    if (!k.match()) {
      throw new ImpossibleStructureException("an aromatic ring takes no alternating double bonds");
    }
    k.closeRemaining();
  }

  private boolean match() {
    int atom = mostConstrained();
    if (atom < 0) {
      return true;
    }
    for (int k = 0; k < neighbours[atom].length; k++) {
      int other = neighbours[atom][k];
      if (orders[atom][k] == MoleculeBuilder.AROMATIC && needy[other]) {
        set(atom, other, 2);
        if (match()) {
          return true;
        }
        set(atom, other, MoleculeBuilder.AROMATIC);
      }
    }
    return false;
  }

  private int mostConstrained() {
    int best = -1;
    int bestChoices = Integer.MAX_VALUE;
    for (int i = 0; i < neighbours.length; i++) {
      if (needy[i]) {
        int choices = 0;
        for (int k = 0; k < neighbours[i].length; k++) {
          choices += orders[i][k] == MoleculeBuilder.AROMATIC && needy[neighbours[i][k]] ? 1 : 0;
        }
        if (choices < bestChoices) {
          bestChoices = choices;
          best = i;
        }
      }
    }
    return best;
  }

  private void set(int a, int b, int order) {
    needy[a] = order == MoleculeBuilder.AROMATIC;
    needy[b] = needy[a];
    setSlot(a, b, order);
    setSlot(b, a, order);
  }

  private void setSlot(int from, int to, int order) {
    for (int k = 0; k < neighbours[from].length; k++) {
      if (neighbours[from][k] == to) {
        orders[from][k] = order;
      }
    }
  }

  private void closeRemaining() {
    for (int[] row : orders) {
      for (int k = 0; k < row.length; k++) {
        row[k] = row[k] == MoleculeBuilder.AROMATIC ? 1 : row[k];
      }
    }
  }
}
