package org.foreseal.thermo;

/**
 * Variance of a sum of terms, before calibration.
 *
 * @param enthalpy (kJ/mol)^2
 * @param entropy (J/(mol K))^2
 */
record TermVariance(double enthalpy, double entropy) {
  TermVariance plus(double moreEnthalpy, double moreEntropy) {
    return new TermVariance(enthalpy + moreEnthalpy, entropy + moreEntropy);
  }
}
