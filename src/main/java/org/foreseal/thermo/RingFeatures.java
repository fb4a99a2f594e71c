package org.foreseal.thermo;

import java.util.BitSet;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Molecule;

/** Size and type of every non-aromatic ring, and how such rings touch. */
final class RingFeatures {
  private static final int LARGEST_NAMED = 8;

  private RingFeatures() {}

  static void count(TypedMolecule molecule, FeatureCounts counts) {
    List<Ring> rings = molecule.otherRings();
    for (Ring ring : rings) {
      counts.add("R:" + size(ring));
      counts.add("RR:" + describe(molecule, ring));
    }
    for (int r = 0; r < rings.size(); r++) {
      for (int q = r + 1; q < rings.size(); q++) {
        int shared = rings.get(r).shared(rings.get(q));
        if (shared > 0) {
          counts.add(shared == 1 ? "X:spiro" : shared == 2 ? "X:fused" : "X:bridged");
        }
      }
    }
  }

  private static String size(Ring ring) {
    return ring.size() <= LARGEST_NAMED ? Integer.toString(ring.size()) : LARGEST_NAMED + 1 + "+";
  }

  /** Size, hetero atoms, ring C=C, aromatic bonds, carbonyls: for instance {@code 5:C:ar1:CO1}. */
  private static String describe(TypedMolecule molecule, Ring ring) {
    StringBuilder text = new StringBuilder(size(ring)).append(':');
    String hetero = heteroAtoms(molecule.graph(), ring);
    text.append(hetero.isEmpty() ? "C" : hetero);
    int aromatic = 0;
    int carbonyl = 0;
    for (int k = 0; k < ring.size(); k++) {
      aromatic += molecule.shareAromaticRing(ring.atom(k), ring.atom(k + 1)) ? 1 : 0;
      carbonyl += molecule.is(ring.atom(k), AtomType.CARBONYL) ? 1 : 0;
    }
    append(text, ":d", doubleBonds(molecule, ring.members()));
    append(text, ":ar", aromatic);
    append(text, ":CO", carbonyl);
    return text.toString();
  }

  private static void append(StringBuilder text, String label, int n) {
    if (n > 0) {
      text.append(label).append(n);
    }
  }

  private static String heteroAtoms(Molecule graph, Ring ring) {
    Map<String, Integer> found = new TreeMap<>();
    for (int k = 0; k < ring.size(); k++) {
      ChemicalElement e = ChemicalElement.require(graph.element(ring.atom(k)));
      if (e != ChemicalElement.C) {
        found.merge(e.symbol(), 1, Integer::sum);
      }
    }
    StringBuilder text = new StringBuilder();
    found.forEach((symbol, n) -> text.append(symbol).append(n));
    return text.toString();
  }

  private static int doubleBonds(TypedMolecule molecule, BitSet members) {
    int[] count = new int[1];
    molecule.forEachBond(
        (a, b, order, inRing) -> {
          if (order == 2 && members.get(a) && members.get(b) && !molecule.shareAromaticRing(a, b)) {
            count[0]++;
          }
        });
    return count[0];
  }
}
