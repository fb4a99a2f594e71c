package org.foreseal.thermo;

import org.foreseal.molecule.Molecule;

/**
 * Corrections for neighbours that crowd or help each other along acyclic bonds: gauche, 1,5, cis,
 * vicinal and alpha hetero atoms.
 */
final class ChainCorrections {
  /** Gauche contacts of a bond by how many further heavy neighbours each end has (0 to 3). */
  private static final int[][] GAUCHE = {{0, 0, 0, 0}, {0, 0, 1, 2}, {0, 1, 2, 4}, {0, 2, 4, 6}};

  private final TypedMolecule molecule;
  private final Molecule graph;
  private final FeatureCounts counts;

  private ChainCorrections(TypedMolecule molecule, FeatureCounts counts) {
    this.molecule = molecule;
    graph = molecule.graph();
    this.counts = counts;
  }

  static void count(TypedMolecule molecule, FeatureCounts counts) {
    ChainCorrections corrections = new ChainCorrections(molecule, counts);
    molecule.forEachBond(
        (a, b, order, inRing) -> {
          if (!inRing && order == 1) {
            corrections.singleBond(a, b);
          } else if (!inRing && order == 2) {
            corrections.doubleBond(a, b);
          }
        });
    for (int i = 0; i < molecule.graph().atomCount(); i++) {
      corrections.crowdedEnds(i);
    }
  }

  private boolean isAlkyl(int atom) {
    return molecule.is(atom, AtomType.ALKYL);
  }

  private void singleBond(int a, int b) {
    if (isAlkyl(a) && isAlkyl(b)) {
      boolean allCarbon = carbonsOnly(a, b) && carbonsOnly(b, a);
      counts.add(allCarbon ? "X:gauche" : "X:gauche-het", gauche(a, b));
      vicinal(a, b);
    } else if (isAlkyl(a)) {
      besideAlkyl(a, b);
    } else if (isAlkyl(b)) {
      besideAlkyl(b, a);
    }
  }

  private void besideAlkyl(int alkyl, int other) {
    switch (molecule.type(other)) {
      case OXYGEN, AMINE, SULFIDE ->
          counts.add("X:gauche-" + molecule.type(other).label(), gauche(alkyl, other));
      case CARBONYL -> {
        for (int x : molecule.neighbours(alkyl)) {
          counts.add("X:alpha-XCO", molecule.type(x).isAmineOrOxygen() ? 1 : 0);
        }
      }
      default -> {
        // no correction across this kind of bond
      }
    }
  }

  private int gauche(int a, int b) {
    return GAUCHE[Math.min(3, graph.degree(a) - 1)][Math.min(3, graph.degree(b) - 1)];
  }

  private boolean carbonsOnly(int atom, int besides) {
    for (int other : molecule.neighbours(atom)) {
      if (other != besides && !molecule.isCarbon(other)) {
        return false;
      }
    }
    return true;
  }

  private void vicinal(int a, int b) {
    for (int p : molecule.neighbours(a)) {
      for (int q : molecule.neighbours(b)) {
        if (molecule.type(p).isAmineOrOxygen() && molecule.type(q).isAmineOrOxygen()) {
          counts.add("X:vic-XX");
          counts.add("X:vic-HB", graph.hydrogens(p) + graph.hydrogens(q) > 0 ? 1 : 0);
        }
      }
    }
  }

  /** An acyclic alkyl carbon between two branched alkyl carbons. */
  private void crowdedEnds(int middle) {
    if (!isAlkyl(middle) || molecule.isRingAtom(middle)) {
      return;
    }
    int[] ends = molecule.neighbours(middle);
    for (int x = 0; x < ends.length; x++) {
      for (int y = x + 1; y < ends.length; y++) {
        if (isAlkyl(ends[x]) && isAlkyl(ends[y])) {
          int low = Math.min(graph.degree(ends[x]), graph.degree(ends[y]));
          int high = Math.max(graph.degree(ends[x]), graph.degree(ends[y]));
          counts.add("X:1,5", high == 4 && low >= 3 ? low - 2 : 0);
          counts.add("X:1,5c", graph.degree(middle) >= 3 && low >= 3 ? 1 : 0);
        }
      }
    }
  }

  /**
   * Tri- and tetrasubstituted C=C always have substituents side by side; a disubstituted one counts
   * as E, because molecules here carry no stereochemistry.
   */
  private void doubleBond(int a, int b) {
    boolean alkene = molecule.is(a, AtomType.ALKENE) && molecule.is(b, AtomType.ALKENE);
    if (alkene && graph.degree(a) > 1 && graph.degree(b) > 1) {
      counts.add("X:cis", graph.degree(a) + graph.degree(b) - 4);
    }
  }
}
