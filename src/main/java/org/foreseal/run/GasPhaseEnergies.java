package org.foreseal.run;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.foreseal.molecule.Molecule;
import org.foreseal.quantity.Uncertain;
import org.foreseal.thermo.GasPhase;
import org.foreseal.thermo.GasPhaseSession;

/** Gibbs energies of steps in the ideal gas at 1 bar; the water phase is not in them. */
final class GasPhaseEnergies implements StepEnergies {
  private final GasPhaseSession session;
  private final double temperatureKelvin;

  private GasPhaseEnergies(GasPhaseSession session, double temperatureKelvin) {
    this.session = session;
    this.temperatureKelvin = temperatureKelvin;
  }

  static StepEnergies at(double temperatureKelvin) {
    return new GasPhaseEnergies(GasPhase.standard().session(), temperatureKelvin);
  }

  @Override
  public Optional<Uncertain> deltaGibbs(List<Molecule> reactants, List<Molecule> products) {
    return GasPhase.covers(temperatureKelvin)
        ? session.stepGibbs(reactants, products, temperatureKelvin).value()
        : Optional.empty();
  }

  @Override
  public OptionalDouble deltaGibbsValue(List<Molecule> reactants, List<Molecule> products) {
    return GasPhase.covers(temperatureKelvin)
        ? session.stepGibbsValue(reactants, products, temperatureKelvin).value().stream()
            .mapToDouble(Double::doubleValue)
            .findFirst()
        : OptionalDouble.empty();
  }
}
