package org.foreseal.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.network.Verdict;
import org.foreseal.quantity.Uncertain;
import org.foreseal.rule.AmbientSpecies;
import org.foreseal.rule.Provision;
import org.junit.jupiter.api.Test;

class GibbsPrunerTest {
  private static final Molecule A = Smiles.read("CCO");
  private static final Molecule B = Smiles.read("CC=O");

  /** R T ln 10 at 500 K is 9.572 kJ/mol (R = 8.314462618 J/(mol K), CODATA 2018). */
  private static final double DECADE = 9.572;

  private static Verdict judge(
      double value, double sd, Set<Provision> offered, List<Molecule> products) {
    StepEnergies energies = (r, p) -> Optional.of(new Uncertain(value, sd));
    return new GibbsPruner(energies, 500, offered).judge(List.of(A), products);
  }

  @Test
  void aStepWithinReachOfDilutionStays() {
    // One reactant at 100 bar, one product at 1e-6 bar: eight decades.
    assertEquals(Verdict.KEPT, judge(8 * DECADE - 0.1, 0, Set.of(), List.of(B)));
    assertInstanceOf(Verdict.Pruned.class, judge(8 * DECADE + 0.1, 0, Set.of(), List.of(B)));
  }

  @Test
  void twoStandardDeviationsSpeakForTheStep() {
    assertEquals(Verdict.KEPT, judge(8 * DECADE + 19.9, 10, Set.of(), List.of(B)));
    assertInstanceOf(Verdict.Pruned.class, judge(8 * DECADE + 20.1, 10, Set.of(), List.of(B)));
  }

  @Test
  void anOxidantHoldsHydrogenLow() {
    List<Molecule> products = List.of(B, AmbientSpecies.HYDROGEN);
    assertInstanceOf(Verdict.Pruned.class, judge(15 * DECADE, 0, Set.of(), products));
    assertEquals(Verdict.KEPT, judge(15 * DECADE, 0, Set.of(Provision.IRON_BEARING), products));
    assertInstanceOf(
        Verdict.Pruned.class, judge(30 * DECADE, 0, Set.of(Provision.IRON_BEARING), products));
    assertEquals(Verdict.KEPT, judge(30 * DECADE, 0, Set.of(Provision.OXIDANT), products));
  }

  @Test
  void aStepWithoutEstimateStays() {
    StepEnergies none = (r, p) -> Optional.empty();
    assertEquals(Verdict.KEPT, new GibbsPruner(none, 500, Set.of()).judge(List.of(A), List.of(B)));
  }
}
