package org.foreseal.thermo;

/**
 * What the standard deviation of a Gibbs energy is made of: a part that every molecule has on its
 * own and the scaled variance of the fitted terms.
 *
 * @param residualSquared square of the part on its own, (kJ/mol)^2
 * @param enthalpyVariance variance of the enthalpy terms, (kJ/mol)^2
 * @param entropyVariance variance of the entropy terms, (J/(mol K))^2
 * @param scaleAt298 factor on the standard deviation of the terms at 298.15 K
 * @param scaleAt573 the same at 573.15 K; linear in between, flat outside
 */
public record GibbsSpread(
    double residualSquared,
    double enthalpyVariance,
    double entropyVariance,
    double scaleAt298,
    double scaleAt573) {
  private static final double UPPER_KELVIN = 573.15;
  private static final double JOULES_PER_KILOJOULE = 1000;

  /** Standard deviation of the Gibbs energy, kJ/mol. */
  public double standardDeviation(double temperatureKelvin) {
    double share =
        (temperatureKelvin - GasPhase.REFERENCE_KELVIN)
            / (UPPER_KELVIN - GasPhase.REFERENCE_KELVIN);
    double scale = scaleAt298 + (scaleAt573 - scaleAt298) * Math.max(0, Math.min(1, share));
    double kilokelvin = temperatureKelvin / JOULES_PER_KILOJOULE;
    double terms = enthalpyVariance + kilokelvin * kilokelvin * entropyVariance;
    return Math.sqrt(residualSquared + scale * scale * terms);
  }
}
