package org.foreseal.network;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.PriorityQueue;
import java.util.Set;
import java.util.function.ToDoubleFunction;

/**
 * Finds the cheapest routes to a species. A step counts only when all its reactants are made, so a
 * route is a set of steps closed under its co-reactants, not a path from species to species; a step
 * that two branches share is paid once.
 *
 * <p>First the cheapest cost of every species is found, cheapest first (the generalisation of the
 * shortest-path search to steps with several reactants, Inf. Process. Lett. 1977, 6, 1, from
 * memory). These costs then guide a best-first search over partial routes, worked backwards from
 * the target.
 */
public final class RouteFinder {
  private static final int MOST_EXPANSIONS = 4000;

  /**
   * A step shared by two branches makes a route cheaper than its bound, so a few more are found and
   * sorted.
   */
  private static final int SPARE = 4;

  private final Network network;
  private final double[] stepCost;
  private final double[] cheapest;
  private final int[] bestMaker;

  /**
   * Prepares the search.
   *
   * @param network the network
   * @param cost cost of each step, positive; asked from several threads
   */
  public RouteFinder(Network network, ToDoubleFunction<Step> cost) {
    this.network = network;
    stepCost = network.steps().parallelStream().mapToDouble(cost).toArray();
    cheapest = new double[network.species().size()];
    Arrays.fill(cheapest, Double.POSITIVE_INFINITY);
    bestMaker = new int[cheapest.length];
    Arrays.fill(bestMaker, -1);
    relax();
  }

  private record Reached(int species, double cost) {}

  private void relax() {
    PriorityQueue<Reached> queue =
        new PriorityQueue<>(
            Comparator.comparingDouble(Reached::cost).thenComparingInt(Reached::species));
    boolean[] settled = new boolean[cheapest.length];
    int[] missing =
        network.steps().stream()
            .mapToInt(s -> (int) Arrays.stream(s.reactants()).distinct().count())
            .toArray();
    List<List<Step>> users = users();
    for (Species s : network.species()) {
      if (s.depth() == 0) {
        cheapest[s.id()] = 0;
        queue.add(new Reached(s.id(), 0));
      }
    }
    while (!queue.isEmpty()) {
      int species = queue.remove().species();
      if (!settled[species]) {
        settled[species] = true;
        for (Step step : users.get(species)) {
          if (--missing[step.id()] == 0) {
            offer(step, settled, queue);
          }
        }
      }
    }
  }

  private List<List<Step>> users() {
    List<List<Step>> users = new ArrayList<>();
    network.species().forEach(s -> users.add(new ArrayList<>()));
    for (Step step : network.steps()) {
      Arrays.stream(step.reactants()).distinct().forEach(r -> users.get(r).add(step));
    }
    return users;
  }

  private void offer(Step step, boolean[] settled, PriorityQueue<Reached> queue) {
    double cost = stepCost[step.id()];
    for (int r : Arrays.stream(step.reactants()).distinct().toArray()) {
      cost += cheapest[r];
    }
    for (int p : step.products()) {
      if (!settled[p] && cost < cheapest[p]) {
        cheapest[p] = cost;
        bestMaker[p] = step.id();
        queue.add(new Reached(p, cost));
      }
    }
  }

  /** Cost of the cheapest route to a species; 0 for the charge, infinite when there is none. */
  public double cheapestCost(int species) {
    return cheapest[species];
  }

  /**
   * The route along the cheapest maker of every species, quick even in large networks; nothing for
   * the charge itself. A step that two branches share is paid once.
   */
  public Optional<Route> cheapestRoute(int target) {
    if (network.species().get(target).depth() == 0 || bestMaker[target] < 0) {
      return Optional.empty();
    }
    Set<Integer> steps = new LinkedHashSet<>();
    collect(target, steps);
    double cost = steps.stream().mapToDouble(id -> stepCost[id]).sum();
    return Optional.of(new Route(steps.stream().map(id -> network.steps().get(id)).toList(), cost));
  }

  /** Makers before users; the search settled every reactant before it offered the step. */
  private void collect(int species, Set<Integer> steps) {
    int maker = network.species().get(species).depth() == 0 ? -1 : bestMaker[species];
    if (maker >= 0 && !steps.contains(maker)) {
      for (int reactant : network.steps().get(maker).reactants()) {
        collect(reactant, steps);
      }
      steps.add(maker);
    }
  }

  /** Up to {@code most} routes to a species, cheapest first; none for the charge itself. */
  public List<Route> routesTo(int target, int most) {
    if (network.species().get(target).depth() == 0) {
      return List.of();
    }
    PriorityQueue<PartialRoute> agenda =
        new PriorityQueue<>(
            Comparator.comparingDouble(PartialRoute::bound)
                .thenComparing(PartialRoute::stepIds, Arrays::compare));
    agenda.add(PartialRoute.startingAt(target));
    List<Route> found = new ArrayList<>();
    for (int expansions = 0;
        expansions < MOST_EXPANSIONS && found.size() < most + SPARE && !agenda.isEmpty();
        expansions++) {
      PartialRoute best = agenda.remove();
      if (best.isComplete()) {
        Route route = best.finished();
        if (found.stream().noneMatch(r -> sameSteps(r, route))) {
          found.add(route);
        }
      } else {
        for (Step maker : network.makersOf(best.nextOpen())) {
          best.with(maker, network, stepCost[maker.id()], cheapest).ifPresent(agenda::add);
        }
      }
    }
    found.sort(Comparator.comparingDouble(Route::cost));
    return List.copyOf(found.subList(0, Math.min(most, found.size())));
  }

  private static boolean sameSteps(Route a, Route b) {
    return a.steps().size() == b.steps().size() && a.steps().containsAll(b.steps());
  }
}
