package org.foreseal.thermo;

/**
 * What symmetry takes from and stereoisomers add to an entropy: S = S(intrinsic) - R ln number + R
 * ln isomers.
 *
 * @param number external times internal symmetry number, a whole number; exact below 2^53
 * @param opticalIsomers stereoisomers counted as one species
 */
record Symmetry(double number, int opticalIsomers) {
  /** Gas constant, J/(mol K), exact since the 2019 redefinition of the SI (from memory). */
  private static final double GAS_CONSTANT = 8.314462618;

  /** Entropy to add to the intrinsic one, J/(mol K). */
  double entropyJoulesPerMoleKelvin() {
    return GAS_CONSTANT * (Math.log(opticalIsomers) - Math.log(number));
  }
}
