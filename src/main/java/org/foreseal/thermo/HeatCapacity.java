package org.foreseal.thermo;

import org.foreseal.quantity.CsvTable;

/**
 * Ideal-gas heat capacity, J/(mol K): linear between its values at 300, 400, 500, 600 and 800 K,
 * flat outside. Integrals are exact for that line.
 *
 * @param at300Kelvin J/(mol K) at 300 K
 * @param at400Kelvin J/(mol K) at 400 K
 * @param at500Kelvin J/(mol K) at 500 K
 * @param at600Kelvin J/(mol K) at 600 K
 * @param at800Kelvin J/(mol K) at 800 K
 */
public record HeatCapacity(
    double at300Kelvin,
    double at400Kelvin,
    double at500Kelvin,
    double at600Kelvin,
    double at800Kelvin) {
  static final HeatCapacity NONE = new HeatCapacity(0, 0, 0, 0, 0);

  private static final double REFERENCE_KELVIN = GasPhase.REFERENCE_KELVIN;
  private static final double JOULES_PER_KILOJOULE = 1000;

  /** The heat capacity in the columns cp300 to cp800 of a table row. */
  static HeatCapacity of(CsvTable table, int row) {
    return new HeatCapacity(
        table.number(row, "cp300"),
        table.number(row, "cp400"),
        table.number(row, "cp500"),
        table.number(row, "cp600"),
        table.number(row, "cp800"));
  }

  /** Value at this temperature (K), J/(mol K). */
  public double at(double temperatureKelvin) {
    if (temperatureKelvin <= 300) {
      return at300Kelvin;
    }
    if (temperatureKelvin <= 400) {
      return line(temperatureKelvin, 300, at300Kelvin, 400, at400Kelvin);
    }
    if (temperatureKelvin <= 500) {
      return line(temperatureKelvin, 400, at400Kelvin, 500, at500Kelvin);
    }
    if (temperatureKelvin <= 600) {
      return line(temperatureKelvin, 500, at500Kelvin, 600, at600Kelvin);
    }
    return temperatureKelvin >= 800
        ? at800Kelvin
        : line(temperatureKelvin, 600, at600Kelvin, 800, at800Kelvin);
  }

  /** This heat capacity and so many times another. */
  HeatCapacity plus(HeatCapacity other, int times) {
    return new HeatCapacity(
        at300Kelvin + times * other.at300Kelvin,
        at400Kelvin + times * other.at400Kelvin,
        at500Kelvin + times * other.at500Kelvin,
        at600Kelvin + times * other.at600Kelvin,
        at800Kelvin + times * other.at800Kelvin);
  }

  private static double line(double x, double x0, double y0, double x1, double y1) {
    return y0 + (y1 - y0) * (x - x0) / (x1 - x0);
  }

  /** Integral of the heat capacity from 298.15 K to this temperature (K), kJ/mol. */
  public double enthalpyRiseKilojoulesPerMole(double temperatureKelvin) {
    return overSegments(temperatureKelvin, (a, b, ca, cb) -> (ca + cb) / 2 * (b - a))
        / JOULES_PER_KILOJOULE;
  }

  /** Integral of heat capacity over T from 298.15 K to this temperature (K), J/(mol K). */
  public double entropyRiseJoulesPerMoleKelvin(double temperatureKelvin) {
    return overSegments(
        temperatureKelvin,
        (a, b, ca, cb) -> {
          double slope = (cb - ca) / (b - a);
          return (ca - slope * a) * Math.log(b / a) + slope * (b - a);
        });
  }

  private double overSegments(double to, Segment integral) {
    double sign = to < REFERENCE_KELVIN ? -1 : 1;
    double low = Math.min(to, REFERENCE_KELVIN);
    double high = Math.max(to, REFERENCE_KELVIN);
    double sum = 0;
    double from = low;
    while (from < high) {
      double end = Math.min(high, nodeAfter(from));
      sum += integral.between(from, end, at(from), at(end));
      from = end;
    }
    return sign * sum;
  }

  private static double nodeAfter(double temperatureKelvin) {
    if (temperatureKelvin < 600) {
      return Math.max(300, 100 * (Math.floor(temperatureKelvin / 100) + 1));
    }
    return temperatureKelvin < 800 ? 800 : Double.POSITIVE_INFINITY;
  }

  /** Integral over one straight piece from {@code a} to {@code b}. */
  private interface Segment {
    double between(double a, double b, double valueAtA, double valueAtB);
  }
}
