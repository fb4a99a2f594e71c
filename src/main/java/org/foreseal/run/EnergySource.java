package org.foreseal.run;

/** Where Gibbs energies come from. */
@FunctionalInterface
interface EnergySource {
  /** Gibbs energies at this temperature, K. */
  StepEnergies at(double temperatureKelvin);
}
