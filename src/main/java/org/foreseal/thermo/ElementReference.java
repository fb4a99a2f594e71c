package org.foreseal.thermo;

import java.util.Map;
import java.util.NavigableMap;
import java.util.Optional;
import java.util.TreeMap;
import org.foreseal.quantity.CsvTable;
import org.jspecify.annotations.Nullable;

/**
 * The elements in their reference states at 1 bar: graphite, H2, N2, O2 and, at 298.15 K only,
 * rhombic sulfur. Source: resource {@code thermo/elements.csv}, row by row.
 */
final class ElementReference {
  private static final double JOULES_PER_KILOJOULE = 1000;

  private final Map<String, NavigableMap<Double, State>> states = new TreeMap<>();

  private ElementReference(CsvTable table) {
    for (int row = 0; row < table.size(); row++) {
      states
          .computeIfAbsent(table.text(row, "element"), e -> new TreeMap<>())
          .put(
              table.number(row, "temperature_K"),
              new State(table.number(row, "enthalpy_rise"), table.number(row, "entropy")));
    }
  }

  static ElementReference read() {
    return new ElementReference(CsvTable.read("/thermo/elements.csv"));
  }

  /** Entropy at 298.15 K of the elements of a molecule, J/(mol K). */
  double entropy298(ElementCounts counts) {
    return counts.sum(this::entropyOf);
  }

  private double entropyOf(String reference) {
    return state(curve(reference).ceilingEntry(GasPhase.REFERENCE_KELVIN)).getValue().entropy;
  }

  private NavigableMap<Double, State> curve(String reference) {
    NavigableMap<Double, State> known = states.get(reference);
    if (known == null) {
      throw new IllegalStateException("thermo/elements.csv lacks " + reference);
    }
    return known;
  }

  private static Map.Entry<Double, State> state(Map.@Nullable Entry<Double, State> found) {
    if (found == null) {
      throw new IllegalStateException("thermo/elements.csv does not reach this temperature");
    }
    return found;
  }

  /**
   * H(T) - H(298.15 K) - T S(T) of the elements of a molecule, kJ/mol; empty outside the table.
   *
   * <p>Between tabulated temperatures a cubic through values and slopes (dG/dT = -S).
   */
  Optional<Double> gibbs(ElementCounts counts, double temperatureKelvin) {
    boolean covered =
        counts.references().stream()
            .map(this::curve)
            .allMatch(c -> c.firstKey() <= temperatureKelvin && temperatureKelvin <= c.lastKey());
    return covered
        ? Optional.of(counts.sum(e -> interpolate(curve(e), temperatureKelvin)))
        : Optional.empty();
  }

  private static double interpolate(NavigableMap<Double, State> known, double t) {
    Map.Entry<Double, State> low = state(known.floorEntry(t));
    Map.Entry<Double, State> high = state(known.ceilingEntry(t));
    double t0 = low.getKey();
    double width = high.getKey() - t0;
    double g0 = low.getValue().gibbs(t0);
    if (width == 0) {
      return g0;
    }
    double g1 = high.getValue().gibbs(high.getKey());
    double m0 = -low.getValue().entropy / JOULES_PER_KILOJOULE * width;
    double m1 = -high.getValue().entropy / JOULES_PER_KILOJOULE * width;
    double x = (t - t0) / width;
    double x2 = x * x;
    double x3 = x2 * x;
    return (2 * x3 - 3 * x2 + 1) * g0
        + (x3 - 2 * x2 + x) * m0
        + (3 * x2 - 2 * x3) * g1
        + (x3 - x2) * m1;
  }

  private record State(double enthalpyRise, double entropy) {
    double gibbs(double temperatureKelvin) {
      return enthalpyRise - temperatureKelvin * entropy / JOULES_PER_KILOJOULE;
    }
  }
}
