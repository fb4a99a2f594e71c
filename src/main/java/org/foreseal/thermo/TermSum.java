package org.foreseal.thermo;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * Adds the terms of a molecule up and notes every term that is missing. A missing group, ring type
 * or correction counts zero beyond its atom types, bond pairs and ring size, and adds its prior
 * variance; a missing atom type, bond pair or ring size has a stand-in or ends the estimate.
 */
final class TermSum {
  /** Ring-system error outside the fit: 3 x 9 = 27 kJ/mol sd, a median error of 18 kJ/mol. */
  private static final double OUT_OF_SCOPE_VARIANCE = 81;

  private final Coefficients coefficients;
  private final Calibration calibration;
  private final Map<Integer, Integer> enthalpyCounts = new TreeMap<>();
  private final Map<Integer, Integer> entropyCounts = new TreeMap<>();
  private final List<TermVector.Missing> missing = new ArrayList<>();
  private final List<String> fallbacks = new ArrayList<>();
  private final List<String> obstacles = new ArrayList<>();
  private HeatCapacity heatCapacity = HeatCapacity.NONE;
  private double enthalpy;
  private double entropy;

  TermSum(Coefficients coefficients, Calibration calibration) {
    this.coefficients = coefficients;
    this.calibration = calibration;
  }

  void add(String feature, int count) {
    List<String> lacking = new ArrayList<>();
    for (Property property : Property.values()) {
      Optional<Coefficients.Term> own = coefficients.find(feature).filter(property::isKnown);
      Optional<Coefficients.Term> used = own.or(() -> standIn(feature, property));
      if (own.isEmpty()) {
        lacking.add(property.label);
      }
      if (used.isEmpty() && isCoarse(feature)) {
        obstacles.add(describe(feature));
      }
      used.ifPresent(term -> take(property, term, count));
    }
    if (!lacking.isEmpty()) {
      fallbacks.add(feature + ": " + String.join(", ", lacking));
      missing.add(
          new TermVector.Missing(
              feature, count, enthalpyPrior(feature, lacking), entropyPrior(feature, lacking)));
    }
  }

  /** Notes a ring system outside the fit; it cancels only against the same ring system. */
  void addOutOfScope(String ringSystem) {
    fallbacks.add("ring system outside the fit: " + ringSystem);
    missing.add(new TermVector.Missing("ring system " + ringSystem, 1, OUT_OF_SCOPE_VARIANCE, 0));
  }

  private Optional<Coefficients.Term> standIn(String feature, Property property) {
    return property == Property.ENTHALPY
        ? Optional.empty()
        : coefficients.standIn(feature).filter(property::isKnown);
  }

  private void take(Property property, Coefficients.Term term, int count) {
    switch (property) {
      case ENTHALPY -> {
        enthalpy += count * term.enthalpy();
        enthalpyCounts.merge(term.enthalpyRow(), count, Integer::sum);
      }
      case ENTROPY -> {
        entropy += count * term.entropy();
        entropyCounts.merge(term.entropyRow(), count, Integer::sum);
      }
      case HEAT_CAPACITY ->
          heatCapacity = heatCapacity.plus(term.heatCapacity().orElse(HeatCapacity.NONE), count);
    }
  }

  private double enthalpyPrior(String feature, List<String> lacking) {
    return lacking.contains(Property.ENTHALPY.label) ? calibration.enthalpyPrior(kind(feature)) : 0;
  }

  /** A stand-in is as uncertain as an unknown ring type. */
  private double entropyPrior(String feature, List<String> lacking) {
    return lacking.contains(Property.ENTROPY.label)
        ? calibration.entropyPrior(isCoarse(feature) ? "RR" : kind(feature))
        : 0;
  }

  private static String kind(String feature) {
    return feature.substring(0, feature.indexOf(':'));
  }

  private static boolean isCoarse(String feature) {
    String kind = kind(feature);
    return kind.equals("A") || kind.equals("B") || kind.equals("R");
  }

  private static String describe(String feature) {
    String name = feature.substring(feature.indexOf(':') + 1);
    return switch (kind(feature)) {
      case "A" -> "atom type " + name;
      case "B" -> "bond between atom types " + name.replace("|", " and ");
      default -> "ring of size " + name;
    };
  }

  /** What stands in the way of an estimate. */
  List<String> obstacles() {
    return obstacles.stream().distinct().toList();
  }

  /** Enthalpy, kJ/mol. */
  double enthalpy() {
    return enthalpy;
  }

  /** Intrinsic entropy, J/(mol K). */
  double entropy() {
    return entropy;
  }

  HeatCapacity heatCapacity() {
    return heatCapacity;
  }

  List<String> fallbacks() {
    return fallbacks.stream().sorted().toList();
  }

  TermVector vector() {
    return new TermVector(enthalpyCounts, entropyCounts, missing);
  }

  private enum Property {
    ENTHALPY("enthalpy"),
    ENTROPY("entropy"),
    HEAT_CAPACITY("heat capacity");

    private final String label;

    Property(String label) {
      this.label = label;
    }

    boolean isKnown(Coefficients.Term term) {
      return switch (this) {
        case ENTHALPY -> term.hasEnthalpy();
        case ENTROPY -> term.hasEntropy();
        case HEAT_CAPACITY -> term.heatCapacity().isPresent();
      };
    }
  }
}
