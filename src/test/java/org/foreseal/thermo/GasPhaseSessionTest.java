package org.foreseal.thermo;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.quantity.Uncertain;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class GasPhaseSessionTest {
  private static final double KELVIN = 573.15;

  private final GasPhaseSession session = GasPhase.standard().session();

  private static List<Molecule> molecules(String smiles) {
    return Arrays.stream(smiles.split("\\.")).map(Smiles::read).toList();
  }

  private Uncertain step(String reactants, String products) {
    return session
        .stepGibbs(molecules(reactants), molecules(products), KELVIN)
        .value()
        .orElseThrow();
  }

  @Test
  void isTheDifferenceOfApparentGibbsEnergies() {
    double expected = 0;
    for (Molecule m : molecules("O=C(Cc1ccccc1)Cc1ccccc1.O=C=O.O")) {
      expected += session.of(m).value().orElseThrow().apparentGibbs(KELVIN).value();
    }
    for (Molecule m : molecules("OC(=O)Cc1ccccc1.OC(=O)Cc1ccccc1")) {
      expected -= session.of(m).value().orElseThrow().apparentGibbs(KELVIN).value();
    }
    Uncertain step = step("OC(=O)Cc1ccccc1.OC(=O)Cc1ccccc1", "O=C(Cc1ccccc1)Cc1ccccc1.O=C=O.O");
    assertEquals(expected, step.value(), 1e-9);
  }

  @ParameterizedTest
  @CsvSource({
    "CCCCCCO, CCCCC=C.O",
    "O=C(O)Cc1ccccc1, Cc1ccccc1.O=C=O",
    "CC(O)c1ccccc1, C=Cc1ccccc1.O",
    "CCCCCCC(=O)O.CCO, CCCCCCC(=O)OCC.O",
    "CCc1ccccc1, C=Cc1ccccc1.[H][H]"
  })
  void sharedTermsMakeAStepMoreCertainThanItsMolecules(String reactants, String products) {
    double squares = 0;
    for (String side : List.of(reactants, products)) {
      for (Molecule m : molecules(side)) {
        double sd = session.of(m).value().orElseThrow().apparentGibbs(KELVIN).standardDeviation();
        squares += sd * sd;
      }
    }
    assertTrue(step(reactants, products).standardDeviation() < Math.sqrt(squares));
  }

  @Test
  void anUnknownGroupOnBothSidesCancels() {
    // The ring type of 1-indanone is unknown; a methyl group moved along the chain elsewhere keeps
    // it, and only what each molecule has on its own remains.
    Uncertain step = step("O=C1CCc2cc(CC)ccc21.Cc1ccccc1", "O=C1CCc2cc(C)ccc21.CCc1ccccc1");
    assertTrue(step.standardDeviation() < 8, step.toString());
    assertTrue(
        session
                .of(Smiles.read("O=C1CCc2cc(C)ccc21"))
                .value()
                .orElseThrow()
                .apparentGibbs(KELVIN)
                .standardDeviation()
            > 30);
  }

  @Test
  void theSameMoleculeOnBothSidesCancelsExactly() {
    Uncertain with = step("CCO.c1ccncc1.O", "C=C.O.c1ccncc1.O");
    Uncertain without = step("CCO", "C=C.O");
    assertEquals(without, with);
    Uncertain nothing = step("CCO.O", "O.CCO");
    assertEquals(0, nothing.value());
    assertEquals(0, nothing.standardDeviation());
  }

  @Test
  void theReverseStepHasTheOppositeSign() {
    Uncertain there = step("CCO", "C=C.O");
    Uncertain back = step("C=C.O", "CCO");
    assertEquals(there.value(), -back.value(), 1e-12);
    assertEquals(there.standardDeviation(), back.standardDeviation(), 1e-12);
  }

  @Test
  void aTabulatedMoleculeBringsItsOwnError() {
    // Water gas shift, four tabulated molecules: 4 x (0.3^2 + (0.57315 x 0.3)^2) less hydrogen's
    // enthalpy, which is exact.
    double s = 0.57315 * 0.3;
    double expected = Math.sqrt(3 * 0.3 * 0.3 + 4 * s * s);
    assertEquals(expected, step("[C-]#[O+].O", "O=C=O.[H][H]").standardDeviation(), 1e-9);
  }

  @Test
  void refusesAnUnbalancedStep() {
    assertThrows(
        IllegalArgumentException.class,
        () -> session.stepGibbs(molecules("CCO"), molecules("C=C"), KELVIN));
  }

  @Test
  void namesTheMoleculeThatHasNoEstimate() {
    String reason =
        session.stepGibbs(molecules("CCCl.O"), molecules("CCO.Cl"), KELVIN).reason().orElseThrow();
    assertTrue(reason.contains("Cl"), reason);
  }

  @Test
  void equalsTheMethodWithoutMemory() {
    List<Molecule> reactants = molecules("CCO");
    List<Molecule> products = molecules("C=C.O");
    assertEquals(
        session.stepGibbs(reactants, products, KELVIN),
        GasPhase.standard().stepGibbs(reactants, products, KELVIN));
  }

  @Test
  void givesTheSameFromManyThreads() {
    List<Molecule> all =
        TestTables.rows("feature-counts.csv").stream().map(r -> Smiles.read(r.get(0))).toList();
    List<Estimate<Thermochemistry>> together = all.parallelStream().map(session::of).toList();
    GasPhaseSession alone = GasPhase.standard().session();
    assertEquals(all.stream().map(alone::of).toList(), together);
  }

  @Test
  void anEstimateCarriesItsReasonThroughAChange() {
    Estimate<Integer> none = Estimate.<String>none("too small").map(String::length);
    assertEquals("too small", none.reason().orElseThrow());
    assertTrue(none.value().isEmpty());
    assertEquals(3, Estimate.of("abc").map(String::length).value().orElseThrow());
  }
}
