package org.foreseal.thermo;

import java.util.HashMap;
import java.util.Map;
import org.foreseal.quantity.CsvTable;

/**
 * Scale of the standard deviations and prior standard deviations of terms: sd^2 = residual^2 +
 * scale^2 x variance of the terms. Source: resource {@code thermo/calibration.csv}.
 */
final class Calibration {
  private final Map<String, Double> values = new HashMap<>();

  private Calibration(CsvTable table) {
    for (int row = 0; row < table.size(); row++) {
      for (String column : new String[] {"enthalpy", "entropy", "gibbs298", "gibbs573"}) {
        if (!table.isEmpty(row, column)) {
          values.put(table.text(row, "name") + ' ' + column, table.number(row, column));
        }
      }
    }
  }

  static Calibration read() {
    return new Calibration(CsvTable.read("/thermo/calibration.csv"));
  }

  private double get(String name) {
    Double value = values.get(name);
    if (value == null) {
      throw new IllegalStateException("thermo/calibration.csv lacks " + name);
    }
    return value;
  }

  /** Standard deviation of the enthalpy, kJ/mol, for a variance of its terms. */
  double enthalpyDeviation(double variance) {
    return deviation("enthalpy", variance);
  }

  /** Standard deviation of the entropy, J/(mol K), for a variance of its terms. */
  double entropyDeviation(double variance) {
    return deviation("entropy", variance);
  }

  private double deviation(String property, double variance) {
    return Math.hypot(get("residual " + property), get("scale " + property) * Math.sqrt(variance));
  }

  /** Part of a Gibbs energy's variance that a species has on its own, (kJ/mol)^2. */
  double gibbsResidualSquared() {
    double residual = get("residual gibbs573");
    return residual * residual;
  }

  /** The spread of a Gibbs energy with these variances. */
  GibbsSpread gibbsSpread(double residualSquared, TermVariance terms) {
    return new GibbsSpread(
        residualSquared,
        terms.enthalpy(),
        terms.entropy(),
        get("scale gibbs298"),
        get("scale gibbs573"));
  }

  /** Prior variance of the enthalpy term of a feature, (kJ/mol)^2. */
  double enthalpyPrior(String kind) {
    return square(get("prior " + kind + " enthalpy"));
  }

  /** Prior variance of the entropy term of a feature, (J/(mol K))^2. */
  double entropyPrior(String kind) {
    return square(get("prior " + kind + " entropy"));
  }

  private static double square(double x) {
    return x * x;
  }
}
