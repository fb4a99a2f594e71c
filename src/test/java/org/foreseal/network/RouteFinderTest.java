package org.foreseal.network;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.foreseal.molecule.Smiles;
import org.junit.jupiter.api.Test;

class RouteFinderTest {
  private final Network network = Networks.grow(Limits.ofDepth(3), "OC(=O)Cc1ccccc1");
  private final RouteFinder routes = new RouteFinder(network, step -> step.rule().prominence());

  private int id(String smiles) {
    return network.find(Smiles.read(smiles)).orElseThrow().id();
  }

  @Test
  void everyStepOfARouteFindsItsReactantsMade() {
    for (Species s : network.species()) {
      for (Route route : routes.routesTo(s.id(), 3)) {
        Set<Integer> made = new HashSet<>();
        network.species().stream().filter(x -> x.depth() == 0).forEach(x -> made.add(x.id()));
        for (Step step : route.steps()) {
          for (int r : step.reactants()) {
            assertTrue(made.contains(r), () -> s.molecule() + " by " + step.rule().id());
          }
          for (int p : step.products()) {
            made.add(p);
          }
        }
        assertTrue(made.contains(s.id()));
      }
    }
  }

  @Test
  void routesComeCheapestFirstAndTheFirstIsTheCheapest() {
    for (Species s : network.species()) {
      List<Route> found = routes.routesTo(s.id(), 4);
      for (int i = 1; i < found.size(); i++) {
        assertTrue(found.get(i - 1).cost() <= found.get(i).cost() + 1e-9);
      }
      if (!found.isEmpty()) {
        // A shared step is paid once in a route and per use in the bound, so the route can only be
        // cheaper.
        assertTrue(found.get(0).cost() <= routes.cheapestCost(s.id()) + 1e-9);
      }
    }
  }

  @Test
  void aCrossKetoneNeedsBothOfItsAcids() {
    Route route = routes.routesTo(id("O=C(Cc1ccccc1)c1ccccc1"), 1).get(0);
    assertEquals(
        "ketonic-decarboxylation-cross", route.steps().get(route.steps().size() - 1).rule().id());
    assertTrue(
        route.steps().stream()
            .anyMatch(s -> s.rule().id().equals("arylacetic-to-arenecarboxylic")));
  }

  @Test
  void theChargeHasNoRoute() {
    assertTrue(routes.routesTo(id("OC(=O)Cc1ccccc1"), 3).isEmpty());
    assertEquals(0, routes.cheapestCost(id("OC(=O)Cc1ccccc1")));
  }

  @Test
  void drawingsHoldSpeciesAndSteps() {
    Route route = routes.routesTo(id("O=C(Cc1ccccc1)Cc1ccccc1"), 1).get(0);
    NetworkDrawing drawing = NetworkDrawing.of(network, route.steps(), s -> s.molecule().smiles());
    assertTrue(drawing.graphMl().contains("<graphml"));
    assertTrue(drawing.graphMl().contains("ketonic-decarboxylation-self"));
    assertTrue(drawing.dot().startsWith("digraph"));
    assertFalse(drawing.dot().contains("\r"));
  }
}
