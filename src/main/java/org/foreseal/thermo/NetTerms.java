package org.foreseal.thermo;

import java.util.Map;
import java.util.TreeMap;

/**
 * Terms of several molecules added up, products positive and reactants negative, so that what both
 * sides share cancels in the variance.
 */
final class NetTerms {
  private final CovarianceFactor covariance;
  private final double[] enthalpy;
  private final double[] entropy;
  private final Map<String, TermVector.Missing> missing = new TreeMap<>();

  NetTerms(CovarianceFactor covariance) {
    this.covariance = covariance;
    enthalpy = new double[covariance.enthalpyTerms()];
    entropy = new double[covariance.entropyTerms()];
  }

  NetTerms add(TermVector terms, int times) {
    terms.addEnthalpy(enthalpy, times);
    terms.addEntropy(entropy, times);
    for (TermVector.Missing m : terms.missing()) {
      missing.merge(
          m.feature(),
          m.withCount(m.count() * times),
          (one, other) -> one.withCount(one.count() + other.count()));
    }
    return this;
  }

  /** Variance of the sum: of the known terms with their covariance, plus priors of missing ones. */
  TermVariance variance() {
    TermVariance variance = covariance.variance(enthalpy, entropy);
    for (TermVector.Missing m : missing.values()) {
      double square = (double) m.count() * m.count();
      variance = variance.plus(square * m.enthalpyPrior(), square * m.entropyPrior());
    }
    return variance;
  }
}
