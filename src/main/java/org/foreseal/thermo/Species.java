package org.foreseal.thermo;

/**
 * A molecule as a step sees it: its values, its terms and what is uncertain about it alone.
 *
 * @param thermochemistry values
 * @param terms fitted terms, none for a tabulated molecule
 * @param elements what it is made of
 */
record Species(Thermochemistry thermochemistry, TermVector terms, ElementCounts elements) {
  /** Variance that no other molecule shares, (kJ/mol)^2. */
  double ownVariance(double temperatureKelvin) {
    GibbsSpread spread = thermochemistry.spread();
    if (thermochemistry.origin() == Origin.TABULATED) {
      double deviation = spread.standardDeviation(temperatureKelvin);
      return deviation * deviation;
    }
    return spread.residualSquared();
  }
}
