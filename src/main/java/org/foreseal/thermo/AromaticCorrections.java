package org.foreseal.thermo;

import java.util.Arrays;
import java.util.List;
import org.foreseal.molecule.Molecule;

/** Corrections for neighbours on aromatic rings: ortho pairs, bay regions, peri positions. */
final class AromaticCorrections {
  private final TypedMolecule molecule;
  private final Molecule graph;
  private final FeatureCounts counts;

  private AromaticCorrections(TypedMolecule molecule, FeatureCounts counts) {
    this.molecule = molecule;
    graph = molecule.graph();
    this.counts = counts;
  }

  static void count(TypedMolecule molecule, FeatureCounts counts) {
    AromaticCorrections corrections = new AromaticCorrections(molecule, counts);
    for (Ring ring : molecule.aromaticRings()) {
      for (int k = 0; k < ring.size(); k++) {
        corrections.ortho(ring.atom(k), ring.atom(k + 1));
      }
    }
    molecule.forEachBond((a, b, order, inRing) -> corrections.bay(a, b));
    for (int i = 0; i < molecule.graph().atomCount(); i++) {
      corrections.peri(i);
    }
  }

  private void ortho(int a, int b) {
    if (!molecule.is(a, AtomType.AROMATIC) || !molecule.is(b, AtomType.AROMATIC)) {
      return;
    }
    int p = molecule.substituent(a);
    int q = molecule.substituent(b);
    if (p >= 0 && q >= 0 && !inOneRing(molecule.otherRings(), a, p, q)) {
      counts.add("X:ortho-" + orthoKind(p, q));
      boolean crowded = graph.degree(p) >= 4 || graph.degree(q) >= 4;
      counts.add("X:ortho-tBu", crowded && orthoKind(p, q).equals("aa") ? 1 : 0);
    }
  }

  private String orthoKind(int p, int q) {
    if (bridgesHydrogen(p, q) || bridgesHydrogen(q, p)) {
      return "HB";
    }
    int polar = (isPolar(p) ? 1 : 0) + (isPolar(q) ? 1 : 0);
    if (polar > 0) {
      return polar == 2 ? "pp" : "pa";
    }
    boolean aryl = molecule.is(p, AtomType.AROMATIC) || molecule.is(q, AtomType.AROMATIC);
    return aryl ? "Ph" : "aa";
  }

  private boolean bridgesHydrogen(int donor, int acceptor) {
    return molecule.type(donor).isAmineOrOxygen()
        && graph.hydrogens(donor) > 0
        && molecule.is(acceptor, AtomType.CARBONYL);
  }

  private boolean isPolar(int atom) {
    return switch (molecule.type(atom)) {
      case OXYGEN, AMINE, SULFIDE, CARBONYL, NITRILE, THIOCARBONYL -> true;
      default -> false;
    };
  }

  private static boolean inOneRing(List<Ring> rings, int... atoms) {
    for (Ring ring : rings) {
      boolean all = true;
      for (int atom : atoms) {
        all &= ring.holds(atom);
      }
      if (all) {
        return true;
      }
    }
    return false;
  }

  /** A bond of one aromatic ring between two fused carbons whose other rings face each other. */
  private void bay(int a, int b) {
    if (!molecule.is(a, AtomType.FUSED) || !molecule.is(b, AtomType.FUSED)) {
      return;
    }
    List<Ring> common =
        molecule.aromaticRings().stream().filter(r -> r.holds(a) && r.holds(b)).toList();
    if (common.size() == 1 && hasOtherRing(a, b) && hasOtherRing(b, a)) {
      int p = outside(common.get(0), a);
      int q = outside(common.get(0), b);
      counts.add("X:bay", p >= 0 && q >= 0 && !inOneRing(molecule.rings(), p, q) ? 1 : 0);
    }
  }

  private boolean hasOtherRing(int atom, int without) {
    return molecule.aromaticRings().stream().anyMatch(r -> r.holds(atom) && !r.holds(without));
  }

  private int outside(Ring ring, int atom) {
    for (int other : molecule.neighbours(atom)) {
      if (!ring.holds(other)) {
        return other;
      }
    }
    return -1;
  }

  /** Substituents on the two sides of a fused carbon, or on one of them. */
  private void peri(int atom) {
    if (!molecule.is(atom, AtomType.FUSED)) {
      return;
    }
    int[] substituents =
        Arrays.stream(molecule.neighbours(atom))
            .filter(x -> molecule.is(x, AtomType.AROMATIC))
            .map(molecule::substituent)
            .filter(x -> x >= 0)
            .toArray();
    if (substituents.length == 1) {
      counts.add("X:peri-H");
    } else if (substituents.length == 2) {
      counts.add("X:peri", inOneRing(molecule.otherRings(), substituents) ? 0 : 1);
    }
  }
}
