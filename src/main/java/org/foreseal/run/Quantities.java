package org.foreseal.run;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers as people write them: no exponent where none is needed, no trailing zeros. */
public final class Quantities {
  private static final MathContext SIX_DIGITS = new MathContext(6, RoundingMode.HALF_EVEN);

  private Quantities() {}

  /** At most six digits, without an exponent between 1e-4 and 1e7. */
  public static String plain(double value) {
    if (!Double.isFinite(value)) {
      return Double.toString(value);
    }
    BigDecimal rounded = new BigDecimal(value).round(SIX_DIGITS).stripTrailingZeros();
    if (rounded.signum() == 0) {
      return "0";
    }
    int magnitude = rounded.precision() - rounded.scale();
    return magnitude < -3 || magnitude > 7 ? rounded.toString() : rounded.toPlainString();
  }
}
