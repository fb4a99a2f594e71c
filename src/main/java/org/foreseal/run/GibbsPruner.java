package org.foreseal.run;

import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.network.StepPruner;
import org.foreseal.network.Verdict;
import org.foreseal.quantity.Uncertain;
import org.foreseal.rule.AmbientSpecies;
import org.foreseal.rule.Provision;

/**
 * Drops a step only when it cannot run even in its favour: two standard deviations below the
 * estimate, with every reactant at the highest and every product at the lowest pressure a run can
 * reach, its Gibbs energy is still positive.
 *
 * <p>The pressures are wide on purpose (common practice): reactants up to 100 bar, products down to
 * 1e-6 bar, which is a thousandth of what a detector sees and enough for an intermediate that
 * reacts on. Hydrogen is bookkeeping in oxidations: an oxidant or air holds it far lower (1e-30
 * bar), an iron mineral at 1e-8 bar. Steps without an estimate stay.
 */
final class GibbsPruner implements StepPruner {
  private static final double GAS_CONSTANT = 8.314462618e-3;
  private static final double LN_10 = Math.log(10);
  private static final double HIGHEST_LOG_BAR = 2;
  private static final double LOWEST_LOG_BAR = -6;
  private static final double HYDROGEN_BY_OXIDANT = -30;
  private static final double HYDROGEN_BY_IRON = -8;
  private static final double SAFETY_DEVIATIONS = 2;

  private final StepEnergies energies;
  private final double temperatureKelvin;
  private final double lowestHydrogen;

  GibbsPruner(StepEnergies energies, double temperatureKelvin, Set<Provision> offered) {
    this.energies = energies;
    this.temperatureKelvin = temperatureKelvin;
    if (offered.contains(Provision.OXIDANT) || offered.contains(Provision.AIR)) {
      lowestHydrogen = HYDROGEN_BY_OXIDANT;
    } else {
      lowestHydrogen = offered.contains(Provision.IRON_BEARING) ? HYDROGEN_BY_IRON : LOWEST_LOG_BAR;
    }
  }

  @Override
  public Verdict judge(List<Molecule> reactants, List<Molecule> products) {
    double margin = marginKilojoules(reactants, products);
    OptionalDouble value = energies.deltaGibbsValue(reactants, products);
    if (value.isEmpty() || value.getAsDouble() <= margin) {
      return Verdict.KEPT;
    }
    Uncertain g = energies.deltaGibbs(reactants, products).orElseThrow();
    if (g.value() - SAFETY_DEVIATIONS * g.standardDeviation() <= margin) {
      return Verdict.KEPT;
    }
    return new Verdict.Pruned(
        "too far uphill to run",
        String.format(
            Locale.ROOT,
            "dG %.0f +- %.0f kJ/mol at %.0f C in the gas; at most %.0f can be made up by dilution",
            g.value(),
            g.standardDeviation(),
            temperatureKelvin - 273.15,
            margin));
  }

  /** What the most favourable pressures contribute, kJ/mol. */
  private double marginKilojoules(List<Molecule> reactants, List<Molecule> products) {
    double decades = reactants.size() * HIGHEST_LOG_BAR;
    for (Molecule p : products) {
      decades -= p.equals(AmbientSpecies.HYDROGEN) ? lowestHydrogen : LOWEST_LOG_BAR;
    }
    return GAS_CONSTANT * temperatureKelvin * LN_10 * decades;
  }
}
