package org.foreseal.report;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;
import org.foreseal.molecule.Molecule;
import org.foreseal.quantity.Uncertain;

/** Numbers as the outputs show them, the same everywhere. */
final class Figures {
  private static final MathContext SIX_DIGITS = new MathContext(6, RoundingMode.HALF_EVEN);

  private Figures() {}

  /** A score, two decimals. */
  static String score(double value) {
    return String.format(Locale.ROOT, "%.2f", value);
  }

  /** A Gibbs energy with its standard deviation, whole kJ/mol. */
  static String gibbs(Uncertain value) {
    return whole(value.value()) + " ± " + whole(value.standardDeviation());
  }

  private static String whole(double value) {
    return Long.toString(Math.round(value));
  }

  /** Monoisotopic mass in Da, five decimals. */
  static String dalton(Molecule molecule) {
    return String.format(Locale.ROOT, "%.5f", molecule.formula().monoisotopicMassDalton());
  }

  /** A count with its word: 1 fault, 2 faults. */
  static String count(int number, String word) {
    return number + " " + word + (number == 1 ? "" : "s");
  }

  /** One decimal, for CSV. */
  static String tenths(double value) {
    String text = String.format(Locale.ROOT, "%.1f", value);
    return "-0.0".equals(text) ? "0.0" : text;
  }

  /** A number of at most six digits; whole ones without a decimal point. */
  static JsonNode json(double value) {
    BigDecimal rounded = new BigDecimal(value).round(SIX_DIGITS).stripTrailingZeros();
    if (rounded.signum() == 0) {
      return JsonNodeFactory.instance.numberNode(0);
    }
    boolean isWhole = rounded.scale() <= 0 && rounded.precision() - rounded.scale() <= 15;
    return isWhole
        ? JsonNodeFactory.instance.numberNode(rounded.longValueExact())
        : JsonNodeFactory.instance.numberNode(rounded);
  }
}
