package org.foreseal.thermo;

import java.util.Collections;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * How often each feature of the group method occurs in a molecule. Names: A: atom type, B: bond
 * pair, G: group, R: ring size, RR: ring type, X: correction.
 *
 * <p>Molecules carry no stereochemistry here: a disubstituted acyclic C=C counts as E.
 */
final class FeatureCounts {
  private final SortedMap<String, Integer> counts = new TreeMap<>();

  /** Counts every feature of a molecule. */
  static FeatureCounts of(TypedMolecule molecule) {
    FeatureCounts counts = new FeatureCounts();
    GroupFeatures.count(molecule, counts);
    RingFeatures.count(molecule, counts);
    ChainCorrections.count(molecule, counts);
    AromaticCorrections.count(molecule, counts);
    return counts;
  }

  void add(String feature) {
    add(feature, 1);
  }

  void add(String feature, int times) {
    if (times != 0) {
      counts.merge(feature, times, Integer::sum);
    }
  }

  int get(String feature) {
    return counts.getOrDefault(feature, 0);
  }

  /** All counts, features in alphabetical order. */
  SortedMap<String, Integer> asMap() {
    return Collections.unmodifiableSortedMap(counts);
  }
}
