package org.foreseal.molecule;

/**
 * The one tautomer normalisation of this project: a non-aromatic C=C-OH becomes the ketone or
 * aldehyde, a C(OH)=N the amide. Phenols and hydroxypyridines stay as drawn because their ring is
 * aromatic. When both ends of an enediol could keep the oxygen, the more substituted carbon does;
 * remaining ties fall to the canonical order.
 */
final class KetoForm {
  private KetoForm() {}

  static Fragment of(Fragment drawn) throws ImpossibleStructureException {
    Molecule m = drawn.molecule();
    int carbon = enolCarbon(m);
    if (carbon < 0) {
      return drawn;
    }
    MoleculeBuilder builder = new MoleculeBuilder();
    builder.append(m);
    int oxygen = hydroxyl(m, carbon);
    int partner = doublePartner(m, carbon);
    builder.setOrder(carbon, oxygen, 2);
    builder.setOrder(carbon, partner, 1);
    builder.changeHydrogens(oxygen, -1);
    builder.changeHydrogens(partner, 1);
    Fragment keto = builder.build().get(0);
    int[] after = new int[m.atomCount()];
    for (int i = 0; i < after.length; i++) {
      after[i] = drawn.builderAtom(keto.builderAtom(i));
    }
    return new Fragment(keto.molecule(), after);
  }

  private static int enolCarbon(Molecule m) {
    int best = -1;
    for (int i = 0; i < m.atomCount(); i++) {
      boolean enol =
          m.element(i) == 6 && !m.isAromatic(i) && hydroxyl(m, i) >= 0 && doublePartner(m, i) >= 0;
      if (enol && (best < 0 || m.degree(i) > m.degree(best))) {
        best = i;
      }
    }
    return best;
  }

  private static int hydroxyl(Molecule m, int carbon) {
    for (int k = 0; k < m.degree(carbon); k++) {
      int other = m.neighbour(carbon, k);
      if (m.element(other) == 8
          && m.hydrogens(other) == 1
          && m.charge(other) == 0
          && m.order(carbon, k) == 1) {
        return other;
      }
    }
    return -1;
  }

  private static int doublePartner(Molecule m, int carbon) {
    for (int k = 0; k < m.degree(carbon); k++) {
      int other = m.neighbour(carbon, k);
      boolean takesHydrogen = m.element(other) == 6 || m.element(other) == 7;
      if (m.order(carbon, k) == 2
          && takesHydrogen
          && m.charge(other) == 0
          && !m.isAromatic(other)) {
        return other;
      }
    }
    return -1;
  }
}
