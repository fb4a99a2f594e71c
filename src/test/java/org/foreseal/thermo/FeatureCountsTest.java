package org.foreseal.thermo;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.foreseal.molecule.Smiles;
import org.junit.jupiter.api.Test;

/**
 * Feature counts, symmetry numbers and optical isomers against an independent implementation on
 * another toolkit, frozen in {@code feature-counts.csv}.
 */
class FeatureCountsTest {
  /** Symmetry number only: which of two equal nitrogens is which hand is taken by class here. */
  private static final String PYRAMIDS = "two equal pyramidal nitrogens, oriented alike here";

  /**
   * Symmetry number only: on which face of a ring a substituent stands is not known without
   * stereochemistry, and each implementation takes the face its atom order gives.
   */
  private static final String RING_FACES = "faces of ring centres without stereochemistry";

  /** Molecules on which the two differ, each with the reason. */
  private static final Map<String, String> DIFFERENCES =
      Map.ofEntries(
          Map.entry("O=c1c(O)c(O)c1=O", "our molecules turn an enol into its ketone when read"),
          Map.entry("C1C2C3C2C2C1C32", "cage with several sets of smallest rings; out of scope"),
          Map.entry("CNC(=O)NC", PYRAMIDS),
          Map.entry("CCNC(=O)NCC", PYRAMIDS),
          Map.entry("CC1CC(C)CC(C)C1", RING_FACES),
          Map.entry("CC1OC(C)OC(C)O1", RING_FACES),
          Map.entry("C1C2CC3CC1CC(C2)C3", RING_FACES),
          Map.entry("CC12CC3(C)CC(C)(C1)CC(C)(C2)C3", RING_FACES),
          Map.entry("O=C1C2CC3CC(C2)CC1C3", RING_FACES),
          Map.entry("CC1(C)C2CC3CC(C2)CC1C3", RING_FACES),
          Map.entry("C12C3C4C1C1C2C3C41", RING_FACES));

  @Test
  void equalsAnIndependentImplementation() {
    List<String> wrong = new ArrayList<>();
    List<List<String>> rows = TestTables.rows("feature-counts.csv");
    for (List<String> row : rows) {
      String smiles = row.get(0);
      TypedMolecule typed = new TypedMolecule(Smiles.read(smiles));
      Symmetry symmetry = SymmetryFinder.of(typed).orElseThrow();
      String ours =
          (long) symmetry.number()
              + ","
              + symmetry.opticalIsomers()
              + ","
              + FeatureCounts.of(typed).asMap().entrySet().stream()
                  .map(e -> e.getKey() + "=" + e.getValue())
                  .collect(Collectors.joining(";"));
      String theirs = row.get(1) + "," + row.get(2) + "," + row.get(3);
      if (ours.equals(theirs) == DIFFERENCES.containsKey(smiles)) {
        wrong.add(smiles + "\n  theirs " + theirs + "\n  ours   " + ours);
      }
    }
    assertTrue(rows.size() >= 300, "enough molecules");
    assertEquals(List.of(), wrong);
  }
}
