package org.foreseal.run;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.foreseal.run.RunSheet.Amount;

/** Reads numbers with units as given in options, and ranges and lists of temperatures. */
final class Measures {
  private static final Pattern NUMBER_AND_UNIT =
      Pattern.compile("([+-]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][+-]?\\d{1,3})?)\\s*(.*)");
  private static final Pattern RANGE =
      Pattern.compile("(.*?)\\.\\.(.*?)(?:\\s+by\\s+(.*))?", Pattern.CASE_INSENSITIVE);
  private static final double KELVIN_AT_ZERO_CELSIUS = 273.15;
  private static final int MOST_TEMPERATURES = 20;

  private static final Map<String, Double> BAR =
      units("bar", 1.0, "kbar", 1e3, "MPa", 10.0, "GPa", 1e4, "atm", 1.01325);
  private static final Map<String, Double> HOURS =
      units("h", 1.0, "min", 1 / 60.0, "d", 24.0, "s", 1 / 3600.0);
  private static final Map<String, Double> GRAMS = units("g", 1.0, "mg", 1e-3, "kg", 1e3);
  private static final Map<String, Double> MILLIGRAMS = units("mg", 1.0, "g", 1e3, "kg", 1e6);
  private static final Map<String, Double> SURFACE = units("m2/g", 1.0);
  private static final Map<String, Double> MOLALITY = units("mol/kg", 1.0, "mmol/kg", 1e-3);
  private static final Map<String, Double> MILLIMOLES =
      units("mmol", 1.0, "mol", 1e3, "umol", 1e-3);
  private static final Map<String, Double> SECONDS = units("s", 1.0, "min", 60.0, "h", 3600.0);

  private Measures() {}

  private static Map<String, Double> units(Object... pairs) {
    Map<String, Double> map = new LinkedHashMap<>();
    for (int i = 0; i < pairs.length; i += 2) {
      map.put((String) pairs[i], (Double) pairs[i + 1]);
    }
    return map;
  }

  static double bar(String text, Place place) {
    return Limits.PRESSURE_BAR.check(value(text, BAR, "300bar", place), "pressure", place);
  }

  static double hours(String text, Place place) {
    return Limits.DURATION_HOURS.check(value(text, HOURS, "48h", place), "time", place);
  }

  static double waterGrams(String text, Place place) {
    return Limits.WATER_GRAMS.check(value(text, GRAMS, "0.25g", place), "water", place);
  }

  static double milligrams(String text, Place place) {
    return Limits.MILLIGRAMS.check(value(text, MILLIGRAMS, "50mg", place), "mass", place);
  }

  static double surface(String text, Place place) {
    return Limits.SURFACE.check(value(text, SURFACE, "5m2/g", place), "surface", place);
  }

  static double seconds(String text, Place place) {
    return Limits.positive(1e6, "s").check(value(text, SECONDS, "20s", place), "time", place);
  }

  /** Whether a text ends in a unit of surface, so that it is not a mass. */
  static boolean isSurface(String text) {
    return text.replace(" ", "").endsWith("m2/g");
  }

  /** Whether a text begins like a number, so that it may be an amount. */
  static boolean looksLikeNumber(String text) {
    return NUMBER_AND_UNIT.matcher(text.strip()).matches();
  }

  /** An amount of a substance in one of the four units of {@link Amount}. */
  static Amount amount(String text, Place place) {
    String unit = split(text, "0.5mol/kg", place)[1];
    String example = "0.5mol/kg, 20mg, 0.1mmol or 5bar";
    if (isOneOf(unit, MOLALITY)) {
      return amount("mol/kg", Limits.MOLALITY, value(text, MOLALITY, example, place), place);
    }
    if (isOneOf(unit, MILLIMOLES)) {
      return amount("mmol", Limits.MILLIMOLES, value(text, MILLIMOLES, example, place), place);
    }
    if (isOneOf(unit, BAR)) {
      return amount("bar", Limits.PRESSURE_BAR, value(text, BAR, example, place), place);
    }
    Map<String, Double> all = new LinkedHashMap<>(MILLIGRAMS);
    if (!isOneOf(unit, all)) {
      MOLALITY.keySet().forEach(u -> all.put(u, 1.0));
      MILLIMOLES.keySet().forEach(u -> all.put(u, 1.0));
      all.put("bar", 1.0);
    }
    return amount("mg", Limits.MILLIGRAMS, value(text, all, example, place), place);
  }

  private static Amount amount(String unit, Limits limits, double value, Place place) {
    return new Amount(limits.check(value, "amount", place), unit);
  }

  /**
   * Temperatures of an option: {@code 300C}, {@code 573K}, {@code 260C,300C}, {@code 260..300C}.
   */
  static List<Double> temperaturesCelsius(String text, Place place) {
    String unit = "";
    String[] parts = text.strip().split(",", -1);
    List<Double> result = new ArrayList<>();
    for (int i = parts.length - 1; i >= 0; i--) {
      String part = parts[i].strip();
      unit = unitAtEnd(part, unit);
      result.addAll(range(part, unit, place));
    }
    return ordered(result, place);
  }

  private static String unitAtEnd(String part, String otherwise) {
    String beforeStep = part.replaceFirst("\\s+by\\s+.*", "");
    String unit = beforeStep.replaceFirst("^.*[\\d.\\s]", "");
    return unit.isEmpty() ? otherwise : unit;
  }

  /** Temperatures of a run sheet, where the key gives the unit: {@code 260..300 by 20}. */
  static List<Double> sheetTemperatures(String text, Place place) {
    return ordered(range(text.strip(), "C", place), place);
  }

  static List<Double> ordered(List<Double> values, Place place) {
    List<Double> sorted = values.stream().sorted().toList();
    if (sorted.stream().distinct().count() < sorted.size()) {
      throw new BadInputException(
          place, "the same temperature twice", "give each temperature once");
    }
    if (sorted.size() > MOST_TEMPERATURES) {
      throw new BadInputException(
          place,
          sorted.size() + " temperatures",
          "at most " + MOST_TEMPERATURES + " side by side; take a larger step");
    }
    return sorted;
  }

  private static List<Double> range(String text, String unit, Place place) {
    Matcher range = RANGE.matcher(text);
    if (!range.matches()) {
      return List.of(celsius(text, unit, place));
    }
    double low = celsius(range.group(1), unit, place);
    double high = celsius(range.group(2), unit, place);
    if (low >= high) {
      throw new BadInputException(
          place, "a range that does not rise", "write the lower temperature first: 260..300");
    }
    return range.group(3) == null
        ? List.of(low, high)
        : steps(low, high, step(range.group(3), place), place);
  }

  private static double step(String text, Place place) {
    String[] parts = split(text, "20", place);
    if (!parts[1].isEmpty() && !"C".equals(parts[1]) && !"K".equals(parts[1])) {
      throw new BadInputException(place, "a step of " + text.strip(), "write 260..300 by 20");
    }
    return Limits.positive(600, "C").check(Double.parseDouble(parts[0]), "step", place);
  }

  private static List<Double> steps(double low, double high, double step, Place place) {
    if ((high - low) / step > MOST_TEMPERATURES) {
      throw new BadInputException(place, "a range of too many steps", "take a larger step");
    }
    List<Double> result = new ArrayList<>();
    for (int i = 0; low + i * step <= high + 1e-9; i++) {
      result.add(Math.min(high, low + i * step));
    }
    return result;
  }

  private static double celsius(String text, String inheritedUnit, Place place) {
    String[] parts = split(text, "300C", place);
    double number = Double.parseDouble(parts[0]);
    String unit = parts[1].isEmpty() ? inheritedUnit : parts[1];
    double celsius =
        switch (unit.replace("°", "").replace("deg", "").toUpperCase(Locale.ROOT)) {
          case "C" -> number;
          case "K" -> number - KELVIN_AT_ZERO_CELSIUS;
          case "" -> throw noUnit(text, "300C", place);
          default ->
              throw new BadInputException(
                  place, "no unit of temperature is called " + unit, "write 300C or 573K");
        };
    return Limits.TEMPERATURE_CELSIUS.check(Math.round(celsius * 1e6) / 1e6, "temperature", place);
  }

  private static double value(String text, Map<String, Double> units, String example, Place place) {
    String[] parts = split(text, example, place);
    if (parts[1].isEmpty()) {
      throw noUnit(text, example, place);
    }
    for (Map.Entry<String, Double> unit : units.entrySet()) {
      if (unit.getKey().equalsIgnoreCase(parts[1])) {
        return Double.parseDouble(parts[0]) * unit.getValue();
      }
    }
    throw new BadInputException(
        place,
        "the unit " + parts[1] + " does not fit here",
        "units here: " + String.join(", ", units.keySet()));
  }

  private static boolean isOneOf(String unit, Map<String, Double> units) {
    return units.keySet().stream().anyMatch(u -> u.equalsIgnoreCase(unit));
  }

  private static BadInputException noUnit(String text, String example, Place place) {
    return new BadInputException(
        place, text.strip() + " has no unit", "write the unit with the number, such as " + example);
  }

  /** Number and unit. */
  private static String[] split(String text, String example, Place place) {
    Matcher matcher = NUMBER_AND_UNIT.matcher(text.strip());
    if (!matcher.matches()) {
      String shown = text.isBlank() ? "nothing" : text.strip();
      throw new BadInputException(
          place, shown + " where a number with its unit is wanted", "write it like " + example);
    }
    return new String[] {matcher.group(1), matcher.group(2).strip()};
  }
}
