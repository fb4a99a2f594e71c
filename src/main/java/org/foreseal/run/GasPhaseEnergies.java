package org.foreseal.run;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.foreseal.molecule.Molecule;
import org.foreseal.quantity.Uncertain;
import org.foreseal.thermo.Estimate;
import org.foreseal.thermo.GasPhase;
import org.foreseal.thermo.GasPhaseSession;
import org.foreseal.thermo.Thermochemistry;

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

  @Override
  public Optional<Weakness> weakness(Molecule molecule) {
    if (!GasPhase.covers(temperatureKelvin)) {
      return Optional.of(
          new Weakness(
              "no Gibbs energy, outside the range of the method (25 to 527 C)", List.of()));
    }
    Estimate<Thermochemistry> estimate = session.of(molecule);
    if (estimate.reason().isPresent()) {
      return Optional.of(new Weakness("no Gibbs energy", List.of(estimate.reason().get())));
    }
    Thermochemistry values = estimate.value().orElseThrow();
    return switch (values.origin()) {
      case TABULATED, GROUPS -> Optional.empty();
      case OUT_OF_SCOPE ->
          Optional.of(new Weakness("wide error in dG, ring system outside the fit", List.of()));
      case GROUPS_WITH_FALLBACK ->
          Optional.of(new Weakness("wider error in dG, a group is not in the fit", groups(values)));
    };
  }

  /** {@code G:C-(CO)(Cb)(H)2: entropy, heat capacity} is the group {@code C-(CO)(Cb)(H)2}. */
  private static List<String> groups(Thermochemistry values) {
    return values.fallbackFeatures().stream()
        .map(f -> f.replaceFirst("^[A-Z]+:", "").replaceFirst(": .*$", ""))
        .toList();
  }
}
