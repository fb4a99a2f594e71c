package org.foreseal.thermo;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.foreseal.quantity.CsvTable;

/**
 * The fitted terms by feature, and the nearest known terms for those the entropy or heat-capacity
 * fit never met. Source: resources {@code thermo/coefficients.csv} and {@code
 * thermo/stand-ins.csv}.
 */
final class Coefficients {
  private final Map<String, Term> terms = new HashMap<>();
  private final Map<String, String> standIns = new HashMap<>();
  private int enthalpyTerms;
  private int entropyTerms;

  private Coefficients(CsvTable table, CsvTable nearest) {
    for (int row = 0; row < table.size(); row++) {
      Term term = term(table, row);
      terms.put(table.text(row, "feature"), term);
    }
    for (int row = 0; row < nearest.size(); row++) {
      standIns.put(nearest.text(row, "missing"), nearest.text(row, "nearest"));
    }
  }

  static Coefficients read() {
    return new Coefficients(
        CsvTable.read("/thermo/coefficients.csv"), CsvTable.read("/thermo/stand-ins.csv"));
  }

  private Term term(CsvTable table, int row) {
    boolean enthalpy = !table.isEmpty(row, "enthalpy");
    boolean entropy = !table.isEmpty(row, "entropy");
    boolean heatCapacity = !table.isEmpty(row, "cp300");
    return new Term(
        enthalpy ? enthalpyTerms++ : -1,
        entropy ? entropyTerms++ : -1,
        enthalpy ? table.number(row, "enthalpy") : 0,
        entropy ? table.number(row, "entropy") : 0,
        heatCapacity ? Optional.of(HeatCapacity.of(table, row)) : Optional.empty());
  }

  int enthalpyTerms() {
    return enthalpyTerms;
  }

  int entropyTerms() {
    return entropyTerms;
  }

  /** The term of a feature, if the fit knows the feature for any property. */
  Optional<Term> find(String feature) {
    return Optional.ofNullable(terms.get(feature));
  }

  /** The nearest known term, if one is named. */
  Optional<Term> standIn(String feature) {
    return Optional.ofNullable(standIns.get(feature)).flatMap(this::find);
  }

  /**
   * The fitted terms of one feature.
   *
   * @param enthalpyRow row in the enthalpy covariance, -1 when the enthalpy fit lacks it
   * @param entropyRow row in the entropy covariance, -1 when the entropy fit lacks it
   * @param enthalpy kJ/mol
   * @param entropy J/(mol K)
   * @param heatCapacity empty when the heat-capacity fit lacks it
   */
  record Term(
      int enthalpyRow,
      int entropyRow,
      double enthalpy,
      double entropy,
      Optional<HeatCapacity> heatCapacity) {
    boolean hasEnthalpy() {
      return enthalpyRow >= 0;
    }

    boolean hasEntropy() {
      return entropyRow >= 0;
    }
  }
}
