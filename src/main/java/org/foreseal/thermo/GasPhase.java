package org.foreseal.thermo;

import java.util.List;
import org.foreseal.molecule.Molecule;
import org.foreseal.quantity.Uncertain;

/**
 * Ideal-gas thermochemistry at 1 bar of molecules of C, H, N, O and S by group additivity with
 * fitted terms; molecules too small for groups come from a table. Valid from 298 to 800 K: heat
 * capacities are held flat outside. Immutable and safe to share between threads.
 *
 * <p>Leave-one-out, the median error of the Gibbs energy at 573 K is 1.8 kJ/mol (95th percentile
 * 16) over 724 molecules, most of them hydrocarbons; 4 to 5 for acids, esters and amides. Source of
 * all terms: own fit, described with its data in the resource {@code thermo/README.md}.
 *
 * <p>For many molecules or steps use a {@link #session()}, which remembers what it worked out.
 */
public final class GasPhase {
  /** Temperature of the tabulated enthalpies and entropies, K. */
  public static final double REFERENCE_KELVIN = 298.15;

  /** Lowest temperature of the method, K. */
  public static final double LOWEST_KELVIN = 298;

  /** Highest temperature of the method, K. */
  public static final double HIGHEST_KELVIN = 800;

  private final GroupMethod method;

  private GasPhase(GroupMethod method) {
    this.method = method;
  }

  /** The method with the shipped terms, read once. */
  public static GasPhase standard() {
    return Holder.STANDARD;
  }

  /** Whether this temperature (K) lies within the method's range. */
  public static boolean covers(double temperatureKelvin) {
    return temperatureKelvin >= LOWEST_KELVIN && temperatureKelvin <= HIGHEST_KELVIN;
  }

  /** A session that remembers the molecules it meets for as long as it lives. */
  public GasPhaseSession session() {
    return new GasPhaseSession(method);
  }

  /**
   * Thermochemistry of a molecule, or why there is none: charged atoms, other elements, atom types,
   * bonds or rings the fit never met.
   */
  public Estimate<Thermochemistry> of(Molecule molecule) {
    return session().of(molecule);
  }

  /** As {@link GasPhaseSession#stepGibbs}, without remembering the molecules. */
  public Estimate<Uncertain> stepGibbs(
      List<Molecule> reactants, List<Molecule> products, double temperatureKelvin) {
    return session().stepGibbs(reactants, products, temperatureKelvin);
  }

  /**
   * Gibbs energy of formation from the elements at the same temperature, kJ/mol; see {@link
   * Thermochemistry#apparentGibbs} for the one to use in reactions.
   *
   * @param temperatureKelvin K; the elements are tabulated from 298.15 to 700 K, sulfur at 298.15 K
   *     only
   */
  public Estimate<Uncertain> formationGibbs(Molecule molecule, double temperatureKelvin) {
    Estimate<Species> species = method.species(molecule);
    if (species.value().isEmpty()) {
      return species.map(s -> s.thermochemistry().apparentGibbs(temperatureKelvin));
    }
    Thermochemistry values = species.value().get().thermochemistry();
    return method
        .elements()
        .gibbs(species.value().get().elements(), temperatureKelvin)
        .map(
            elements ->
                Estimate.of(
                    new Uncertain(
                        values.gibbsWithoutElements(temperatureKelvin) - elements,
                        values.spread().standardDeviation(temperatureKelvin))))
        .orElseGet(() -> Estimate.none("the elements are not tabulated at this temperature"));
  }

  /** Reads the terms once, on first use. */
  private static final class Holder {
    static final GasPhase STANDARD = new GasPhase(new GroupMethod());
  }
}
