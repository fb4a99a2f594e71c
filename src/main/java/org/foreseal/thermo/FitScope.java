package org.foreseal.thermo;

import java.util.ArrayList;
import java.util.List;

/** Names the ring systems and double bonds the fit did not cover. */
final class FitScope {
  private static final int MOST_RINGS = 3;

  private FitScope() {}

  /** What is outside the fit, empty when nothing is. */
  static List<String> outside(TypedMolecule molecule, FeatureCounts counts) {
    List<String> found = new ArrayList<>();
    if (counts.get("R:3") + counts.get("R:4") > 1) {
      found.add("more than one ring of three or four atoms " + rings(counts));
    }
    if (counts.get("X:bridged") > 0) {
      found.add("bridged rings " + rings(counts));
    }
    if (counts.get("X:spiro") > 0) {
      found.add("spiro rings " + rings(counts));
    }
    if (molecule.otherRings().size() > MOST_RINGS) {
      found.add("more than three non-aromatic rings " + rings(counts));
    }
    if (hasLongCumulene(molecule)) {
      found.add("cumulated double bonds");
    }
    return found;
  }

  private static String rings(FeatureCounts counts) {
    List<String> types = new ArrayList<>();
    counts
        .asMap()
        .forEach(
            (feature, n) -> {
              if (feature.startsWith("RR:")) {
                types.add((n > 1 ? n + " x " : "") + feature.substring(3));
              }
            });
    return "(" + String.join(", ", types) + ")";
  }

  /** Cumulated double bonds of three and more, or in a ring. */
  private static boolean hasLongCumulene(TypedMolecule molecule) {
    boolean[] found = new boolean[1];
    molecule.forEachBond(
        (a, b, order, inRing) -> {
          boolean one = molecule.is(a, AtomType.CUMULENE);
          boolean other = molecule.is(b, AtomType.CUMULENE);
          found[0] |= (one && other) || ((one || other) && inRing);
        });
    return found[0];
  }
}
