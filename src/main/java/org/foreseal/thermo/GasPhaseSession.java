package org.foreseal.thermo;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.foreseal.molecule.Molecule;
import org.foreseal.quantity.Uncertain;

/**
 * Gas-phase values that are worked out once per molecule and kept for as long as the session lives,
 * for networks with many steps. Safe to use from several threads.
 */
public final class GasPhaseSession {
  private final GroupMethod method;
  private final Map<Molecule, Estimate<Species>> known = new ConcurrentHashMap<>();

  GasPhaseSession(GroupMethod method) {
    this.method = method;
  }

  /** As {@link GasPhase#of}. */
  public Estimate<Thermochemistry> of(Molecule molecule) {
    return species(molecule).map(Species::thermochemistry);
  }

  private Estimate<Species> species(Molecule molecule) {
    return known.computeIfAbsent(molecule, method::species);
  }

  /**
   * Gibbs energy of a balanced step, kJ/mol, ideal gas at 1 bar: products minus reactants. A
   * molecule that occurs on both sides cancels exactly.
   *
   * <p>Its variance is k^2 (x'Cx + priors of missing terms) with x the terms of the products minus
   * those of the reactants, so that the terms both sides share cancel, plus for every molecule left
   * over n^2 times the variance it has on its own: (1.75 kJ/mol)^2 for a sum of groups, the
   * tabulated error for a tabulated molecule. k grows from 2.5 at 298 K to 3 at 573 K.
   *
   * @param temperatureKelvin K, valid 298 to 800
   * @return the Gibbs energy, or why one of the molecules has none
   * @throws IllegalArgumentException when the two sides do not hold the same atoms
   */
  public Estimate<Uncertain> stepGibbs(
      List<Molecule> reactants, List<Molecule> products, double temperatureKelvin) {
    Estimate<List<Share>> shares = shares(reactants, products);
    if (!(shares instanceof Estimate.Made<List<Share>> made)) {
      return Estimate.none(shares.reason().orElse(""));
    }
    NetTerms terms = new NetTerms(CovarianceFactor.standard());
    double ownVariance = 0;
    for (Share share : made.estimated()) {
      terms.add(share.species().terms(), share.times());
      ownVariance +=
          (double) share.times() * share.times() * share.species().ownVariance(temperatureKelvin);
    }
    GibbsSpread spread = method.spread(ownVariance, terms.variance());
    double gibbs = gibbs(made.estimated(), temperatureKelvin);
    return Estimate.of(new Uncertain(gibbs, spread.standardDeviation(temperatureKelvin)));
  }

  /**
   * The value of {@link #stepGibbs} without its error, which takes most of the time.
   *
   * @param temperatureKelvin K, valid 298 to 800
   * @return kJ/mol, or why one of the molecules has none
   * @throws IllegalArgumentException when the two sides do not hold the same atoms
   */
  public Estimate<Double> stepGibbsValue(
      List<Molecule> reactants, List<Molecule> products, double temperatureKelvin) {
    return shares(reactants, products).map(shares -> gibbs(shares, temperatureKelvin));
  }

  /** A molecule left over in a step; reactants count negative. */
  private record Share(Species species, int times) {}

  private Estimate<List<Share>> shares(List<Molecule> reactants, List<Molecule> products) {
    Map<Molecule, Integer> net = new LinkedHashMap<>();
    products.forEach(m -> net.merge(m, 1, Integer::sum));
    reactants.forEach(m -> net.merge(m, -1, Integer::sum));
    net.values().removeIf(n -> n == 0);
    List<Share> shares = new ArrayList<>();
    ElementCounts balance = ElementCounts.NONE;
    for (Map.Entry<Molecule, Integer> entry : net.entrySet()) {
      Estimate<Species> estimate = species(entry.getKey());
      if (!(estimate instanceof Estimate.Made<Species> made)) {
        return Estimate.none(entry.getKey() + ": " + estimate.reason().orElse(""));
      }
      shares.add(new Share(made.estimated(), entry.getValue()));
      balance = balance.plus(made.estimated().elements(), entry.getValue());
    }
    if (!balance.equals(ElementCounts.NONE)) {
      throw new IllegalArgumentException("not balanced: " + reactants + " -> " + products);
    }
    return Estimate.of(shares);
  }

  /** The elements' own terms cancel between the sides. */
  private static double gibbs(List<Share> shares, double temperatureKelvin) {
    double gibbs = 0;
    for (Share share : shares) {
      gibbs +=
          share.times() * share.species().thermochemistry().gibbsWithoutElements(temperatureKelvin);
    }
    return gibbs;
  }
}
