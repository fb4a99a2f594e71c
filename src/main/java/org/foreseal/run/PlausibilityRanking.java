package org.foreseal.run;

import java.util.Optional;
import java.util.Set;
import org.foreseal.chromatography.WorkUp;
import org.foreseal.molecule.Molecule;
import org.foreseal.network.Network;
import org.foreseal.network.Route;
import org.foreseal.network.Step;
import org.foreseal.quantity.Uncertain;
import org.foreseal.rule.AmbientSpecies;
import org.foreseal.rule.Provision;
import org.foreseal.rule.Rule;
import org.foreseal.rule.Surroundings;

/**
 * The first ranking, without rates: the score of a route is the product of the scores of its steps,
 * so longer routes score lower by themselves. A step scores the product of
 *
 * <ul>
 *   <li>prominence of its rule: 0.9 core, 0.5 usual, 0.15 marginal;
 *   <li>temperature window: a bell of 60 C half-width outside it;
 *   <li>help: 0.7 when something would speed it up and the run does not offer it;
 *   <li>hydrogen, where the step consumes it: 1 with a metal, a hydrogen donor, a reductant or
 *       added hydrogen, 0.5 with an iron-bearing mineral, else 0.2;
 *   <li>Gibbs energy: 1 / (1 + exp((dG - 20) / w)) with w = max(10, sd) kJ/mol; 0.5 where there is
 *       no estimate.
 * </ul>
 *
 * The candidate's score is that of its best route, halved when the GC does not show it. All numbers
 * are judgement and fitted to nothing: the score orders a list and is no probability.
 */
final class PlausibilityRanking implements Ranking {
  private static final double[] PROMINENCE = {0.9, 0.5, 0.15};
  private static final double WINDOW_CELSIUS = 60;
  private static final double UNHELPED = 0.7;
  private static final double SOME_HYDROGEN = 0.5;
  private static final double LITTLE_HYDROGEN = 0.2;
  private static final double MIDDLE_KILOJOULES = 20;
  private static final double NARROWEST_KILOJOULES = 10;
  private static final double UNKNOWN_ENERGY = 0.5;
  private static final double UNSEEN = 0.5;

  private final Network network;
  private final Surroundings surroundings;
  private final StepEnergies energies;

  PlausibilityRanking(Network network, Surroundings surroundings, StepEnergies energies) {
    this.network = network;
    this.surroundings = surroundings;
    this.energies = energies;
  }

  @Override
  public double stepScore(Step step) {
    Rule rule = step.rule();
    double distance = rule.window().distanceCelsius(surroundings) / WINDOW_CELSIUS;
    return PROMINENCE[rule.prominenceIn(surroundings) - 1]
        * Math.exp(-distance * distance)
        * (isHelped(rule) ? 1 : UNHELPED)
        * hydrogenFactor(step)
        * energyFactor(step);
  }

  @Override
  public double candidateScore(Molecule molecule, Route best) {
    double score = Math.exp(-best.cost());
    return WorkUp.isSeenByGc(molecule) ? score : score * UNSEEN;
  }

  private boolean isHelped(Rule rule) {
    return rule.helpedBy().isEmpty()
        || rule.helpedBy().stream().anyMatch(surroundings.offered()::contains);
  }

  private double hydrogenFactor(Step step) {
    boolean consumes = network.reactantsOf(step).contains(AmbientSpecies.HYDROGEN);
    if (!consumes || hasStrongHydrogen()) {
      return 1;
    }
    return surroundings.offered().contains(Provision.IRON_BEARING)
        ? SOME_HYDROGEN
        : LITTLE_HYDROGEN;
  }

  private boolean hasStrongHydrogen() {
    Set<Provision> offered = surroundings.offered();
    return offered.contains(Provision.METAL)
        || offered.contains(Provision.HYDROGEN_DONOR)
        || offered.contains(Provision.REDUCTANT)
        || surroundings.charged().contains(AmbientSpecies.HYDROGEN);
  }

  private double energyFactor(Step step) {
    Optional<Uncertain> gibbs =
        energies.deltaGibbs(network.reactantsOf(step), network.productsOf(step));
    if (gibbs.isEmpty()) {
      return UNKNOWN_ENERGY;
    }
    double width = Math.max(NARROWEST_KILOJOULES, gibbs.get().standardDeviation());
    return 1 / (1 + Math.exp((gibbs.get().value() - MIDDLE_KILOJOULES) / width));
  }
}
