package org.foreseal.thermo;

import java.util.List;
import java.util.Map;

/** The terms of one molecule in sparse form. Not changed after it is made. */
final class TermVector {
  /** No terms at all: a tabulated molecule. */
  static final TermVector NONE = new TermVector(Map.of(), Map.of(), List.of());

  private final int[] enthalpyRows;
  private final int[] enthalpyCounts;
  private final int[] entropyRows;
  private final int[] entropyCounts;
  private final List<Missing> missing;

  /** Counts by row of the covariances, and the features whose terms the fit lacks. */
  TermVector(Map<Integer, Integer> enthalpy, Map<Integer, Integer> entropy, List<Missing> missing) {
    enthalpyRows = enthalpy.keySet().stream().mapToInt(Integer::intValue).toArray();
    enthalpyCounts = enthalpy.values().stream().mapToInt(Integer::intValue).toArray();
    entropyRows = entropy.keySet().stream().mapToInt(Integer::intValue).toArray();
    entropyCounts = entropy.values().stream().mapToInt(Integer::intValue).toArray();
    this.missing = List.copyOf(missing);
  }

  /** Adds the enthalpy terms, so many times, to a vector by row. */
  void addEnthalpy(double[] sum, int times) {
    add(sum, enthalpyRows, enthalpyCounts, times);
  }

  /** Adds the entropy terms, so many times, to a vector by row. */
  void addEntropy(double[] sum, int times) {
    add(sum, entropyRows, entropyCounts, times);
  }

  private static void add(double[] sum, int[] rows, int[] counts, int times) {
    for (int k = 0; k < rows.length; k++) {
      sum[rows[k]] += times * counts[k];
    }
  }

  List<Missing> missing() {
    return missing;
  }

  /**
   * A feature whose term the fit lacks, and what one count of it adds to the variance.
   *
   * @param feature name
   * @param count how often it occurs, negative on the side of the reactants
   * @param enthalpyPrior prior variance, (kJ/mol)^2; 0 when the enthalpy term is known
   * @param entropyPrior prior variance, (J/(mol K))^2; 0 when the entropy term is known
   */
  record Missing(String feature, int count, double enthalpyPrior, double entropyPrior) {
    Missing withCount(int newCount) {
      return new Missing(feature, newCount, enthalpyPrior, entropyPrior);
    }
  }
}
