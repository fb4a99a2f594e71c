package org.foreseal.thermo;

import java.util.List;
import org.foreseal.quantity.Uncertain;

/**
 * Ideal-gas thermochemistry of one molecule at 1 bar, valid from 298 to 800 K. The standard
 * deviations are calibrated so that 2.3 of them hold about 95 % of published values; errors have
 * heavy tails, so the sd says more than any median error of the method.
 *
 * @param enthalpy298KilojoulesPerMole enthalpy of formation at 298.15 K, kJ/mol
 * @param entropy298JoulesPerMoleKelvin standard entropy at 298.15 K, J/(mol K), symmetry and
 *     optical isomers included
 * @param heatCapacity heat capacity, J/(mol K)
 * @param symmetryNumber external times internal symmetry number, a whole number; 1 for tabulated
 *     molecules, whose entropy already holds it
 * @param opticalIsomers stereoisomers the entropy counts as one species: 2 to the number of
 *     stereocentres, because molecules here carry no stereochemistry
 * @param origin table, groups, groups with fallback, or a ring system outside the fit
 * @param fallbackFeatures terms that were not known, each with the properties that lack it; in
 *     alphabetical order
 * @param spread what the standard deviation of the Gibbs energy is made of
 * @param elementEntropy298JoulesPerMoleKelvin entropy at 298.15 K of the elements it is made of
 */
public record Thermochemistry(
    Uncertain enthalpy298KilojoulesPerMole,
    Uncertain entropy298JoulesPerMoleKelvin,
    HeatCapacity heatCapacity,
    double symmetryNumber,
    int opticalIsomers,
    Origin origin,
    List<String> fallbackFeatures,
    GibbsSpread spread,
    double elementEntropy298JoulesPerMoleKelvin) {
  private static final double JOULES_PER_KILOJOULE = 1000;

  /** Keeps an unmodifiable copy of the list. */
  public Thermochemistry {
    fallbackFeatures = List.copyOf(fallbackFeatures);
  }

  /**
   * Apparent Gibbs energy of formation, kJ/mol: the elements stay at 298.15 K, so differences
   * between the two sides of a step are its Gibbs energy.
   *
   * <p>G = H + int Cp dT - T (S + int Cp/T dT) + 298.15 K x S(elements, 298.15 K).
   *
   * @param temperatureKelvin K, valid 298 to 800; outside the heat capacity is held flat
   */
  public Uncertain apparentGibbs(double temperatureKelvin) {
    double offset =
        GasPhase.REFERENCE_KELVIN * elementEntropy298JoulesPerMoleKelvin / JOULES_PER_KILOJOULE;
    return new Uncertain(
        gibbsWithoutElements(temperatureKelvin) + offset,
        spread.standardDeviation(temperatureKelvin));
  }

  /** H(T) - T S(T), kJ/mol, with H counted from the elements at 298.15 K. */
  double gibbsWithoutElements(double temperatureKelvin) {
    double entropy =
        entropy298JoulesPerMoleKelvin.value()
            + heatCapacity.entropyRiseJoulesPerMoleKelvin(temperatureKelvin);
    return enthalpy298KilojoulesPerMole.value()
        + heatCapacity.enthalpyRiseKilojoulesPerMole(temperatureKelvin)
        - temperatureKelvin * entropy / JOULES_PER_KILOJOULE;
  }
}
