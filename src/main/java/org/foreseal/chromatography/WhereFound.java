package org.foreseal.chromatography;

import java.util.Locale;

/** Where a product is after the work-up. */
public enum WhereFound {
  /** In the organic extract that is injected. */
  EXTRACT,
  /** In the gas that leaves when the vessel is opened. */
  GAS,
  /** In the water phase. */
  WATER;

  /** The word of the outputs. */
  public String word() {
    return name().toLowerCase(Locale.ROOT);
  }
}
