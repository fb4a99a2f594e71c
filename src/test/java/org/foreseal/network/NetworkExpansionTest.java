package org.foreseal.network;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Duration;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.foreseal.molecule.AtomMap;
import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.rule.Provision;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class NetworkExpansionTest {
  @ParameterizedTest
  @ValueSource(
      strings = {
        "OC(=O)Cc1ccccc1",
        "OC(=O)CCCCC",
        "OC1CCCCC1",
        "O=Cc1ccccc1",
        "NCC(=O)O",
        "NCc1ccccc1",
        "CCCCCCO",
        "OC(=O)CCC(=O)O",
        "COc1ccccc1O",
        "CC(=O)CCC(C)=O",
        "Oc1ccc(cc1)C(C)=O",
        "CC(N)=O",
        "CCOC(C)=O"
      })
  void everyStepBalancesElementsChargeAndAtoms(String substrate) {
    Network network = Networks.grow(Limits.ofDepth(2), substrate);
    assertFalse(network.steps().isEmpty());
    for (Step step : network.steps()) {
      assertEquals(
          elements(network, step.reactants()),
          elements(network, step.products()),
          step.rule().id());
      checkAtomMap(network, step);
    }
  }

  private static Map<ChemicalElement, Integer> elements(Network network, int[] ids) {
    Map<ChemicalElement, Integer> total = new EnumMap<>(ChemicalElement.class);
    for (int id : ids) {
      network
          .species()
          .get(id)
          .molecule()
          .formula()
          .counts()
          .forEach((e, n) -> total.merge(e, n, Integer::sum));
    }
    return total;
  }

  /** Every heavy atom of the reactants is found once among the products, as the same element. */
  private static void checkAtomMap(Network network, Step step) {
    List<Integer> before = atoms(network, step.reactants());
    List<Integer> after = atoms(network, step.products());
    AtomMap map = step.atomMap();
    assertEquals(after.size(), map.size());
    Set<Integer> used = new HashSet<>();
    for (int i = 0; i < after.size(); i++) {
      int origin = map.origin(i);
      if (after.get(i) != 1) {
        assertEquals(before.get(origin), after.get(i), step.rule().id());
        assertTrue(used.add(origin), step.rule().id());
      }
    }
  }

  private static List<Integer> atoms(Network network, int[] ids) {
    List<Integer> atoms = new ArrayList<>();
    for (int id : ids) {
      Molecule m = network.species().get(id).molecule();
      for (int i = 0; i < m.atomCount(); i++) {
        atoms.add(m.element(i));
      }
    }
    return atoms;
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 8})
  void threadsDoNotChangeAByte(int threads) {
    Limits one = Limits.ofDepth(3).withThreads(1);
    String alone = Networks.written(Networks.grow(one, "OC(=O)Cc1ccccc1", "OC(=O)c1ccccc1"));
    assertEquals(
        alone,
        Networks.written(
            Networks.grow(one.withThreads(threads), "OC(=O)Cc1ccccc1", "OC(=O)c1ccccc1")));
  }

  @ParameterizedTest
  @ValueSource(strings = {"OC(=O)Cc1ccccc1", "OC1CCCCC1", "NCc1ccccc1", "CC(O)C(=O)O"})
  void aDeeperNetworkContainsTheShallowerOne(String substrate) {
    Network shallow = Networks.grow(Limits.ofDepth(2), substrate);
    Network deep = Networks.grow(Limits.ofDepth(3), substrate);
    assertEquals(shallow.species(), deep.species().subList(0, shallow.species().size()));
    for (Step step : shallow.steps()) {
      Step same = deep.steps().get(step.id());
      assertEquals(step.rule().id(), same.rule().id());
      assertTrue(Arrays.equals(step.products(), same.products()));
    }
  }

  @Test
  void everySpeciesBeyondTheChargeHasAMaker() {
    Network network = Networks.grow(Limits.ofDepth(3), "OC(=O)CCc1ccccc1");
    RouteFinder routes = new RouteFinder(network, step -> 1);
    for (Species s : network.species()) {
      assertTrue(s.depth() == 0 || !network.makersOf(s.id()).isEmpty(), s::toString);
      assertTrue(Double.isFinite(routes.cheapestCost(s.id())), s::toString);
    }
  }

  @Test
  void aSpeciesLimitLeavesAUsableNetworkThatSaysSo() {
    Network network = Networks.grow(Limits.ofDepth(3).withSpecies(40), "OC(=O)Cc1ccccc1");
    assertEquals(40, network.species().size());
    assertTrue(network.isCut());
    assertEquals("limit: 40 species", network.stoppedBy());
    assertTrue(network.find(Smiles.read("Cc1ccccc1")).isPresent());
  }

  @Test
  void theWallTimeLeavesAUsableNetworkThatSaysSo() {
    Limits usual = Limits.ofDepth(6);
    Limits hurried =
        new Limits(
            usual.depth(),
            usual.species(),
            usual.heavyAtoms(),
            usual.carbons(),
            usual.pairsPerRule(),
            Duration.ofMillis(1),
            2);
    Network network = Networks.grow(hurried, "CCC=CCC=CCC=CCCCCCC(=O)O", "OC(=O)Cc1ccccc1");
    assertTrue(network.isCut());
    assertTrue(network.stoppedBy().startsWith("limit: wall time"), network.stoppedBy());
  }

  @Test
  void moleculesBeyondTheSizeLimitsAreRefusedWithTheLimit() {
    Limits usual = Limits.ofDepth(1);
    Limits small =
        new Limits(1, usual.species(), 12, 40, usual.pairsPerRule(), usual.wallTime(), 1);
    Network network = Networks.grow(small, "OC(=O)Cc1ccccc1");
    assertTrue(network.find(Smiles.read("O=C(Cc1ccccc1)Cc1ccccc1")).isEmpty());
    assertTrue(
        network.refusals().stream()
            .anyMatch(
                r ->
                    r.kind() == Refusal.Kind.LIMIT
                        && r.reason().equals("larger than 12 heavy atoms")));
    Limits fewCarbons =
        new Limits(1, usual.species(), 40, 8, usual.pairsPerRule(), usual.wallTime(), 1);
    assertTrue(
        Networks.grow(fewCarbons, "OC(=O)Cc1ccccc1").refusals().stream()
            .anyMatch(r -> r.reason().equals("larger than 8 carbon atoms")));
  }

  @Test
  void aNeedThatIsNotMetIsToldForTheCharge() {
    Network network =
        Networks.grow(Limits.ofDepth(2), EnumSet.of(Provision.WATER), "OC(=O)Cc1ccccc1");
    Molecule ketone = Smiles.read("O=C(Cc1ccccc1)Cc1ccccc1");
    assertTrue(network.find(ketone).isEmpty());
    Refusal why =
        network.refusals().stream()
            .filter(r -> r.products().contains(ketone))
            .findFirst()
            .orElseThrow();
    assertEquals(Refusal.Kind.NEED, why.kind());
    assertTrue(why.reason().startsWith("needs oxide"), why.reason());
  }

  @Test
  void aBlockedAcidGivesNoKetoneAndSaysWhy() {
    Network network = Networks.grow(Limits.ofDepth(2), "OC(=O)C(C)(C)c1ccccc1");
    Molecule ketone = Smiles.read("CC(C)(c1ccccc1)C(=O)C(C)(C)c1ccccc1");
    assertTrue(network.find(ketone).isEmpty());
    Refusal why =
        network.refusals().stream()
            .filter(r -> r.products().contains(ketone))
            .findFirst()
            .orElseThrow();
    assertEquals(Refusal.Kind.NEAR_MISS, why.kind());
    assertTrue(why.reason().contains("alpha-H"), why.reason());
  }

  @Test
  void aPrunerRefusesWithItsReason() {
    StepPruner noCarbonDioxide =
        (reactants, products) ->
            products.contains(Smiles.read("O=C=O"))
                ? new Verdict.Pruned("too far uphill", "test")
                : Verdict.KEPT;
    Network network =
        new NetworkExpansion(
                Networks.LIBRARY,
                new org.foreseal.rule.Surroundings(Set.of(Provision.WATER), Set.of(), 300, 300),
                noCarbonDioxide,
                Limits.ofDepth(1),
                n -> {})
            .grow(List.of(Smiles.read("OC(=O)Cc1ccccc1")));
    assertTrue(network.find(Smiles.read("Cc1ccccc1")).isEmpty());
    assertTrue(network.refusals().stream().anyMatch(r -> r.kind() == Refusal.Kind.GIBBS));
  }

  @Test
  void depthZeroIsTheChargeAlone() {
    Network network = Networks.grow(Limits.ofDepth(0), "OC(=O)Cc1ccccc1");
    assertEquals(3, network.species().size());
    assertTrue(network.steps().isEmpty());
  }

  @Test
  void impossibleLimitsAreRefused() {
    assertThrows(IllegalArgumentException.class, () -> Limits.ofDepth(-1));
    assertThrows(IllegalArgumentException.class, () -> Limits.ofDepth(1).withThreads(0));
  }
}
