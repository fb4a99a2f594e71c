package org.foreseal.run;

import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;

/**
 * The values a quantity of a run can take. The upper ends are far outside any laboratory and catch
 * slips of the unit.
 *
 * @param low lowest value
 * @param isLowIncluded whether the lowest value itself is taken
 * @param high highest value, taken
 * @param unit unit of both ends
 */
record Limits(double low, boolean isLowIncluded, double high, String unit) {
  static final Limits TEMPERATURE_CELSIUS = new Limits(0, true, 600, "C");
  static final Limits PRESSURE_BAR = positive(20_000, "bar");
  static final Limits DURATION_HOURS = positive(1e6, "h");
  static final Limits MOLALITY = positive(60, "mol/kg");
  static final Limits MILLIGRAMS = positive(1e7, "mg");
  static final Limits MILLIMOLES = positive(1e6, "mmol");
  static final Limits WATER_GRAMS = positive(1e6, "g");
  static final Limits SURFACE = positive(5000, "m2/g");
  static final Limits ACIDITY = new Limits(0, true, 14, "");
  static final Limits VOLUME_MILLILITRES = positive(1e6, "mL");
  static final Limits MOLE_PERCENT = positive(100, "mole %");
  static final Limits DEPTH = new Limits(0, true, 6, "steps");
  static final Limits SEED = new Limits(0, true, 9e15, "");

  static Limits positive(double high, String unit) {
    return new Limits(0, false, high, unit);
  }

  double check(double value, String name, Place place) {
    boolean isInside = (isLowIncluded ? value >= low : value > low) && value <= high;
    if (!isInside) {
      throw new BadInputException(
          place,
          name + ": " + Quantities.plain(value) + " is out of range",
          "it must be " + words());
    }
    return value;
  }

  private String words() {
    String from = isLowIncluded ? "at least " : "above ";
    return (from + Quantities.plain(low) + " and at most " + Quantities.plain(high) + " " + unit)
        .strip();
  }
}
