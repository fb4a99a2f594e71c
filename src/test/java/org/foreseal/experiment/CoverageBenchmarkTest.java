package org.foreseal.experiment;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.foreseal.network.Limits;
import org.foreseal.network.Network;
import org.foreseal.network.NetworkExpansion;
import org.foreseal.network.StepPruner;
import org.foreseal.rule.RuleLibrary;
import org.foreseal.run.ChargedVessel;
import org.junit.jupiter.api.Test;

/**
 * How much of what published experiments saw is in the network of their run at all, whatever its
 * rank. The rules and guards were made with these records in view, so the figure is a fit, not a
 * forecast.
 */
class CoverageBenchmarkTest {
  private static final int DEPTH = 3;

  private record Tally(double reached, double total, int records, int products, int found) {
    Tally plus(double weight, boolean isReached) {
      return new Tally(
          reached + (isReached ? weight : 0),
          total + weight,
          records,
          products + 1,
          found + (isReached ? 1 : 0));
    }

    Tally plusRecord() {
      return new Tally(reached, total, records + 1, products, found);
    }
  }

  @Test
  void networksHoldAtLeastNinetyFivePercentOfThePublishedProducts() {
    RuleLibrary library = RuleLibrary.builtIn();
    Map<String, Tally> classes = new TreeMap<>();
    List<String> missing = new ArrayList<>();
    List<String> cut = new ArrayList<>();
    List<Integer> sizes = new ArrayList<>();
    for (PublishedExperiment e : PublishedExperiment.all()) {
      if (e.scored()) {
        Network network = grow(library, e);
        sizes.add(network.species().size());
        if (network.isCut()) {
          cut.add(e.id() + " " + network.stoppedBy());
        }
        score(e, network, classes, missing);
      }
    }
    print(classes, missing, cut, sizes);
    Tally all = total(classes);
    assertEquals(146, all.products(), "scored products of the set");
    assertEquals(117.75, all.total(), 1e-9, "weight of the set");
    assertTrue(all.reached() / all.total() >= 0.95, "coverage " + all.reached() / all.total());
    assertEquals(List.of(), cut, "runs cut by a limit");
  }

  private static Network grow(RuleLibrary library, PublishedExperiment e) {
    ChargedVessel vessel = ChargedVessel.of(e.sheet());
    return new NetworkExpansion(
            library, vessel.surroundings(), StepPruner.NONE, Limits.ofDepth(DEPTH), message -> {})
        .grow(vessel.molecules());
  }

  private static void score(
      PublishedExperiment e, Network network, Map<String, Tally> classes, List<String> missing) {
    Tally empty = new Tally(0, 0, 0, 0, 0);
    classes.put(e.reactionClass(), classes.getOrDefault(e.reactionClass(), empty).plusRecord());
    for (PublishedExperiment.Product p : e.scoredProducts()) {
      boolean reached = network.find(p.molecule()).isPresent();
      classes.put(
          e.reactionClass(),
          classes.getOrDefault(e.reactionClass(), empty).plus(p.weight(), reached));
      if (!reached) {
        missing.add(e.id() + ": " + p.name() + " (" + p.weight() + ")");
      }
    }
  }

  private static Tally total(Map<String, Tally> classes) {
    Tally sum = new Tally(0, 0, 0, 0, 0);
    for (Tally t : classes.values()) {
      sum =
          new Tally(
              sum.reached() + t.reached(),
              sum.total() + t.total(),
              sum.records() + t.records(),
              sum.products() + t.products(),
              sum.found() + t.found());
    }
    return sum;
  }

  private static void print(
      Map<String, Tally> classes, List<String> missing, List<String> cut, List<Integer> sizes) {
    System.out.println("Published products held by the depth-" + DEPTH + " network of their run");
    System.out.printf(
        Locale.ROOT,
        "%-32s %7s %8s %7s %9s%n",
        "class",
        "records",
        "products",
        "found",
        "weighted");
    classes.forEach(CoverageBenchmarkTest::printRow);
    printRow("all", total(classes));
    List<Integer> sorted = sizes.stream().sorted().toList();
    System.out.println(
        "species per network: median "
            + sorted.get(sorted.size() / 2)
            + ", largest "
            + sorted.get(sorted.size() - 1));
    System.out.println("cut by a limit: " + cut);
    System.out.println("not reached: " + missing);
  }

  private static void printRow(String name, Tally t) {
    System.out.printf(
        Locale.ROOT,
        "%-32s %7d %8d %7d %9.2f%n",
        name,
        t.records(),
        t.products(),
        t.found(),
        t.reached() / t.total());
  }
}
