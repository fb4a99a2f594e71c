package org.foreseal.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import org.foreseal.molecule.Molecule;

/**
 * A carboxyl group.
 *
 * @param carbon its carbon
 * @param oxo the oxygen of its C=O
 * @param hydroxyl the oxygen of its OH
 * @param alpha the atom it hangs on; none in formic acid
 */
record Carboxyl(int carbon, int oxo, int hydroxyl, OptionalInt alpha) {
  static final int CARBON = 6;
  private static final int OXYGEN = 8;

  /**
   * Every carboxyl group of a molecule, in canonical order. Carbonic acid and its like have none.
   */
  static List<Carboxyl> of(Molecule molecule) {
    List<Carboxyl> found = new ArrayList<>();
    for (int atom = 0; atom < molecule.atomCount(); atom++) {
      if (molecule.element(atom) == CARBON) {
        addIfCarboxyl(molecule, atom, found);
      }
    }
    return found;
  }

  private static void addIfCarboxyl(Molecule m, int carbon, List<Carboxyl> found) {
    int oxo = -1;
    int hydroxyl = -1;
    int alpha = -1;
    for (int slot = 0; slot < m.degree(carbon); slot++) {
      int other = m.neighbour(carbon, slot);
      boolean isTerminalOxygen =
          m.element(other) == OXYGEN && m.degree(other) == 1 && m.charge(other) == 0;
      if (isTerminalOxygen && m.order(carbon, slot) == 2) {
        oxo = other;
      } else if (isTerminalOxygen && m.hydrogens(other) == 1 && hydroxyl < 0) {
        hydroxyl = other;
      } else {
        alpha = other;
      }
    }
    boolean hangsOnCarbon = alpha < 0 ? m.hydrogens(carbon) == 1 : m.element(alpha) == CARBON;
    if (oxo >= 0 && hydroxyl >= 0 && hangsOnCarbon) {
      OptionalInt at = alpha < 0 ? OptionalInt.empty() : OptionalInt.of(alpha);
      found.add(new Carboxyl(carbon, oxo, hydroxyl, at));
    }
  }
}
