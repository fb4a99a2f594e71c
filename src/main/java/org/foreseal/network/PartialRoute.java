package org.foreseal.network;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;

/**
 * A route under construction, worked backwards: the steps chosen so far and the species still to be
 * made.
 */
final class PartialRoute {
  private final Map<Integer, Step> makerOf;
  private final SortedSet<Integer> open;
  private final double cost;
  private final double bound;

  private PartialRoute(
      Map<Integer, Step> makerOf, SortedSet<Integer> open, double cost, double bound) {
    this.makerOf = makerOf;
    this.open = open;
    this.cost = cost;
    this.bound = bound;
  }

  static PartialRoute startingAt(int target) {
    return new PartialRoute(new LinkedHashMap<>(), new TreeSet<>(Set.of(target)), 0, 0);
  }

  /** Least total cost any completion can have. */
  double bound() {
    return bound;
  }

  boolean isComplete() {
    return open.isEmpty();
  }

  /** The open species with the highest number, that is of the greatest depth. */
  int nextOpen() {
    return open.last();
  }

  int[] stepIds() {
    return makerOf.values().stream().mapToInt(Step::id).distinct().sorted().toArray();
  }

  /**
   * This route with one more step, or nothing when a species would then be needed for its own
   * making.
   */
  Optional<PartialRoute> with(Step maker, Network network, double stepCost, double[] cheapest) {
    Map<Integer, Step> makers = new LinkedHashMap<>(makerOf);
    SortedSet<Integer> stillOpen = new TreeSet<>(open);
    boolean isNew = !makerOf.containsValue(maker);
    makers.put(nextOpen(), maker);
    stillOpen.remove(nextOpen());
    for (int reactant : maker.reactants()) {
      boolean charged = network.species().get(reactant).depth() == 0;
      if (!charged && !makers.containsKey(reactant)) {
        stillOpen.add(reactant);
      }
    }
    double newCost = cost + (isNew ? stepCost : 0);
    double ahead = stillOpen.stream().mapToDouble(s -> cheapest[s]).max().orElse(0);
    PartialRoute next = new PartialRoute(makers, stillOpen, newCost, newCost + ahead);
    return Double.isInfinite(ahead) || next.ordered().isEmpty()
        ? Optional.empty()
        : Optional.of(next);
  }

  Route finished() {
    return new Route(ordered().orElseThrow(), cost);
  }

  /** The steps, makers before users; nothing when they wait for each other. */
  private Optional<List<Step>> ordered() {
    Set<Step> done = new LinkedHashSet<>();
    Set<Step> waiting = new LinkedHashSet<>(makerOf.values());
    while (!waiting.isEmpty()) {
      List<Step> ready = new ArrayList<>();
      for (Step step : waiting) {
        if (Arrays.stream(step.reactants())
            .mapToObj(makerOf::get)
            .allMatch(m -> m == null || done.contains(m))) {
          ready.add(step);
        }
      }
      if (ready.isEmpty()) {
        return Optional.empty();
      }
      ready.sort(Comparator.comparingInt(Step::id));
      done.addAll(ready);
      waiting.removeAll(ready);
    }
    return Optional.of(List.copyOf(done));
  }
}
