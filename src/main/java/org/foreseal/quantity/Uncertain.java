package org.foreseal.quantity;

/**
 * A number with its standard deviation, in the unit that the name of whatever holds it states.
 *
 * @param value best estimate
 * @param standardDeviation one standard deviation, not negative
 */
public record Uncertain(double value, double standardDeviation) {
  /** Refuses what is not a number and negative deviations. */
  public Uncertain {
    if (!Double.isFinite(value)
        || !(standardDeviation >= 0)
        || Double.isInfinite(standardDeviation)) {
      throw new IllegalArgumentException(
          "not a number with an error: " + value + " +- " + standardDeviation);
    }
  }

  /** An exactly known number. */
  public static Uncertain exactly(double value) {
    return new Uncertain(value, 0);
  }
}
