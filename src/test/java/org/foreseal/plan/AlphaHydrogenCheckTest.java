package org.foreseal.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.plan.AlphaHydrogenReport.Acid;
import org.foreseal.plan.AlphaHydrogenReport.Ketone;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class AlphaHydrogenCheckTest {
  private static AlphaHydrogenReport check(String... acids) {
    List<AlphaHydrogenCheck.Given> given =
        Arrays.stream(acids)
            .map(s -> new AlphaHydrogenCheck.Given(s, Smiles.read(s), Place.onCommandLine(s, 1)))
            .toList();
    return new AlphaHydrogenCheck(Molecule::smiles).check(given);
  }

  // Counted by hand on the structures.
  @ParameterizedTest
  @CsvSource({
    "OC(=O)Cc1ccccc1, 2, true, CH2",
    "CC(=O)O, 3, true, CH3",
    "CCC(=O)O, 2, true, CH2",
    "CC(C)C(=O)O, 1, true, CH",
    "OC(=O)CCCCC(=O)O, 4, true, CH2",
    "OC(=O)CC(=O)O, 2, true, CH2",
    "OC(=O)C1CCCCC1, 1, true, CH",
    "CC(C)(C(=O)O)c1ccccc1, 0, false, quaternary carbon",
    "CC(C)(C)C(=O)O, 0, false, quaternary carbon",
    "OC(=O)c1ccccc1, 0, false, aromatic ring carbon",
    "OC(=O)c1ccco1, 0, false, aromatic ring carbon",
    "C=CC(=O)O, 0, false, C=C carbon",
    "OC(=O)C=Cc1ccccc1, 0, false, C=C carbon",
    "C#CC(=O)O, 0, false, alkyne carbon",
    "CC(=O)C(=O)O, 0, false, C=O carbon",
    "OC(=O)C(=O)O, 0, false, carboxyl carbon"
  })
  void countsAlphaHydrogens(String smiles, int hydrogens, boolean enolate, String kind) {
    Acid acid = check(smiles).acids().get(0);
    assertEquals(hydrogens, acid.alphaHydrogens());
    assertEquals(enolate, acid.canGiveEnolate());
    assertEquals(kind, acid.alphaCarbons().get(0).kind());
    assertFalse(acid.reason().isBlank());
  }

  @ParameterizedTest
  @CsvSource({
    "OC(=O)Cc1ccccc1, O=C(Cc1ccccc1)Cc1ccccc1",
    "CC(=O)O, CC(C)=O",
    "CC(C)C(=O)O, CC(C)C(=O)C(C)C",
    "OC(=O)C1CCCCC1, O=C(C1CCCCC1)C1CCCCC1",
    "OC(=O)CCCCC(=O)O, O=C1CCCC1",
    "OC(=O)CCCCCC(=O)O, O=C1CCCCC1",
    "OC(=O)Cc1ccccc1CC(=O)O, O=C1Cc2ccccc2C1"
  })
  void buildsTheKetoneOfOneAcid(String acid, String ketone) {
    assertEquals(Smiles.read(ketone), check(acid).ketones().get(0).ketone().orElseThrow());
  }

  @ParameterizedTest
  @CsvSource({
    "CCC(=O)O, OC(=O)c1ccccc1, CCC(=O)c1ccccc1",
    "OC(=O)c1ccccc1, CCC(=O)O, CCC(=O)c1ccccc1",
    "CC(=O)O, CC(C)(C)C(=O)O, CC(=O)C(C)(C)C",
    "OC(=O)Cc1ccccc1, CC(C)(C(=O)O)c1ccccc1, O=C(Cc1ccccc1)C(C)(C)c1ccccc1",
    "CC(=O)O, CCC(=O)O, CCC(C)=O",
    "CC(=O)O, C=CC(=O)O, CC(=O)C=C"
  })
  void buildsTheKetoneOfTwoAcids(String first, String second, String ketone) {
    Ketone pair = check(first, second).ketones().get(1);
    assertEquals(Smiles.read(ketone), pair.ketone().orElseThrow());
  }

  @Test
  void givesNothingForTwoBlockedAcidsAndSaysWhy() {
    Ketone pair = check("OC(=O)c1ccccc1", "CC(C)(C)C(=O)O").ketones().get(1);
    assertFalse(pair.isPossible());
    assertTrue(pair.reason().contains("aromatic ring"), pair.reason());
    assertTrue(pair.reason().contains("four other groups"), pair.reason());
  }

  @Test
  void namesTheAcidThatGivesTheEnolate() {
    Ketone pair = check("OC(=O)c1ccccc1", "CCC(=O)O").ketones().get(1);
    assertTrue(pair.reason().startsWith("CCC(=O)O gives the enolate"), pair.reason());
  }

  @Test
  void keepsFormicAcidOutOfKetones() {
    AlphaHydrogenReport report = check("OC=O", "CC(=O)O");
    assertEquals("no alpha carbon", report.acids().get(0).reason().substring(0, 15));
    assertTrue(report.acids().get(0).alphaCarbons().isEmpty());
    assertFalse(report.ketones().get(0).isPossible());
    assertFalse(report.ketones().get(1).isPossible());
    assertTrue(report.ketones().get(2).isPossible());
  }

  @ParameterizedTest
  @CsvSource({
    "CC(O)C(=O)O, alpha-hydroxy",
    "NCC(=O)O, alpha-amino",
    "OC(=O)CC(=O)O, malonic",
    "CC(=O)CC(=O)O, beta-carbonyl",
    "CC(=O)C(=O)O, alpha-keto",
    "COCC(=O)O, alpha-alkoxy",
    "ClCC(=O)O, halogen",
    "SCC(=O)O, alpha-thio"
  })
  void warnsOfReactionsThatWin(String acid, String words) {
    assertTrue(check(acid).acids().get(0).cautions().get(0).contains(words));
  }

  @Test
  void listsEveryPairOnce() {
    AlphaHydrogenReport report = check("CC(=O)O", "CCC(=O)O", "OC=O", "OC(=O)c1ccccc1");
    assertEquals(10, report.ketones().size());
    assertTrue(report.ketones().stream().allMatch(k -> k.first() <= k.second()));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"Cc1ccccc1", "CCO", "CC(=O)OC", "CC(=O)OC(C)=O", "OC(O)=O", "NC(=O)O", "O=C=O"})
  void refusesWhatIsNoCarboxylicAcid(String smiles) {
    assertThrows(BadInputException.class, () -> check(smiles));
  }

  @Test
  void refusesAnAcidGivenTwice() {
    assertThrows(BadInputException.class, () -> check("CC(=O)O", "OC(C)=O"));
  }
}
