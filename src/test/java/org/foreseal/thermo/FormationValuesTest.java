package org.foreseal.thermo;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import org.foreseal.molecule.Smiles;
import org.foreseal.quantity.Uncertain;
import org.junit.jupiter.api.Test;

/**
 * Enthalpies of formation and entropies against published values, each with its source in {@code
 * formation-values.csv}. The fit saw the same collection, so this checks the method as built and
 * the honesty of its standard deviations on known ground, not its power to predict; leave-one-out
 * figures are in the resource {@code thermo/README.md}.
 *
 * <p>Molecules here carry no stereochemistry and count as E, so the three Z alkenes of the table
 * are left out: all three lie beyond 2.3 sd of the E estimate (144 of 161 with them).
 */
class FormationValuesTest {
  private static final double LIMIT = 2.3;
  private static final double WANTED = 0.90;

  @Test
  void enthalpiesLieWithinTheStatedError() {
    List<Miss> misses = new ArrayList<>();
    for (List<String> row : rows()) {
      misses.add(miss(row, 2, estimate(row.get(1)).enthalpy298KilojoulesPerMole()));
    }
    assertMostWithin(misses, 60);
  }

  @Test
  void entropiesLieWithinTheStatedError() {
    List<Miss> misses = new ArrayList<>();
    for (List<String> row : rows()) {
      if (!row.get(3).isEmpty()) {
        misses.add(miss(row, 3, estimate(row.get(1)).entropy298JoulesPerMoleKelvin()));
      }
    }
    assertMostWithin(misses, 60);
  }

  private static List<List<String>> rows() {
    return TestTables.rows("formation-values.csv").stream()
        .filter(row -> !row.get(1).contains("/C=C\\"))
        .toList();
  }

  private static Thermochemistry estimate(String smiles) {
    return GasPhase.standard().of(Smiles.read(smiles)).value().orElseThrow();
  }

  private static Miss miss(List<String> row, int column, Uncertain ours) {
    double published = Double.parseDouble(row.get(column));
    return new Miss(row.get(0), ours.value() - published, ours.standardDeviation());
  }

  private static void assertMostWithin(List<Miss> misses, int enough) {
    misses.sort(Comparator.comparingDouble(Miss::deviations).reversed());
    long within = misses.stream().filter(m -> m.deviations() <= LIMIT).count();
    String figures =
        within
            + " of "
            + misses.size()
            + " within 2.3 sd; worst "
            + misses.subList(0, Math.min(12, misses.size()));
    assertTrue(misses.size() >= enough, figures);
    assertTrue(within >= WANTED * misses.size(), figures);
  }

  private record Miss(String name, double error, double standardDeviation) {
    double deviations() {
      return Math.abs(error) / standardDeviation;
    }

    @Override
    public String toString() {
      return String.format(Locale.ROOT, "%s %.1f +- %.1f", name, error, standardDeviation);
    }
  }
}
