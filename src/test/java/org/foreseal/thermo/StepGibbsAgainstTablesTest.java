package org.foreseal.thermo;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.quantity.Uncertain;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Gibbs energies of steps at 298.15 K against sums of published enthalpies of formation and
 * entropies: {@code formation-values.csv} for the organic molecules, {@code
 * thermo/small-molecules.csv} for the small ones, each with its sources. The fit saw the same
 * values of the single molecules; what is tested is the step and its standard deviation. Limit: 2.3
 * sd, as the method states for 95 %.
 */
class StepGibbsAgainstTablesTest {
  private static final double KELVIN = 298.15;
  private static final Map<Molecule, Double> PUBLISHED = published();

  @ParameterizedTest
  @ValueSource(
      strings = {
        "CCO > CC=O.[H][H]",
        "CCCO > C=CC.O",
        "CCO.CCO > CCOCC.O",
        "C=CC.[H][H] > CCC",
        "OC1CCCCC1 > C1=CCCCC1.O",
        "CC(C)(C)O > C=C(C)C.O",
        "CCCc1ccccc1 > c1ccccc1.C=CC",
        "CC#N.O > CC(N)=O",
        "CCN > CC#N.[H][H].[H][H]",
        "CSSC.[H][H] > CS.CS",
        "CCCC=O > CCC(C)=O",
        "O=Cc1ccccc1 > c1ccccc1.[C-]#[O+]",
        "c1ccoc1.S > c1ccsc1.O",
        "c1ccc2c(c1)CCCC2 > c1ccc2ccccc2c1.[H][H].[H][H]",
        "CSC.S > CS.CS",
        "CCCCCC > CCCC(C)C",
        "Oc1ccccc1.[H][H] > c1ccccc1.O",
        "Nc1ccccc1.O > Oc1ccccc1.N",
        "C1CCOC1.N > C1CCNC1.O"
      })
  void liesWithinTheStatedError(String step) {
    String[] sides = step.split(" > ", -1);
    List<Molecule> reactants = molecules(sides[0]);
    List<Molecule> products = molecules(sides[1]);
    Uncertain ours =
        GasPhase.standard().stepGibbs(reactants, products, KELVIN).value().orElseThrow();
    double error = ours.value() - (sum(products) - sum(reactants));
    assertTrue(Math.abs(error) <= 2.3 * ours.standardDeviation(), ours + ", error " + error);
  }

  private static double sum(List<Molecule> side) {
    return side.stream().mapToDouble(m -> PUBLISHED.getOrDefault(m, Double.NaN)).sum();
  }

  private static List<Molecule> molecules(String smiles) {
    return Arrays.stream(smiles.split("\\.", -1)).map(Smiles::read).toList();
  }

  /** H - T S, kJ/mol. */
  private static Map<Molecule, Double> published() {
    Map<Molecule, Double> values = new HashMap<>();
    for (List<String> row : TestTables.rows("formation-values.csv")) {
      if (!row.get(3).isEmpty()) {
        put(values, row.get(1), row.get(2), row.get(3));
      }
    }
    for (List<String> row : TestTables.rows("small-molecules.csv")) {
      put(values, row.get(0), row.get(2), row.get(4));
    }
    return values;
  }

  private static void put(
      Map<Molecule, Double> values, String smiles, String enthalpy, String entropy) {
    double gibbs = Double.parseDouble(enthalpy) - KELVIN * Double.parseDouble(entropy) / 1000;
    values.put(Smiles.read(smiles), gibbs);
  }
}
