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
  /** Molecules on which the two differ, each with the reason. */
  private static final Map<String, String> DIFFERENCES =
      Map.of(
          "O=c1c(O)c(O)c1=O",
          "squaric acid: our molecules turn an enol into its ketone when they are read");

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
