package org.foreseal.rule;

/**
 * Temperatures at which a reaction is usually seen.
 *
 * @param lowCelsius lower end, C
 * @param highCelsius upper end, C
 * @param isHard whether the rule is refused outside, with {@link #TOLERANCE_CELSIUS} to spare;
 *     otherwise being outside only lowers the rank
 */
public record Window(double lowCelsius, double highCelsius, boolean isHard) {
  /** How far outside a hard window a run may lie, C. */
  public static final double TOLERANCE_CELSIUS = 20;

  /** Refuses a window that ends before it begins. */
  public Window {
    if (!(lowCelsius <= highCelsius)) {
      throw new IllegalArgumentException("window from " + lowCelsius + " to " + highCelsius);
    }
  }

  /** Distance of a run's temperature range from this window, C; 0 when they meet. */
  public double distanceCelsius(Surroundings run) {
    return Math.max(
        0, Math.max(lowCelsius - run.highestCelsius(), run.lowestCelsius() - highCelsius));
  }

  /** Whether the window forbids the rule in this run. */
  public boolean forbids(Surroundings run) {
    return isHard && distanceCelsius(run) > TOLERANCE_CELSIUS;
  }
}
