package org.foreseal.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.foreseal.quantity.CsvTable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The structures of the list were written by hand; the name library is the second opinion. */
class CommonNamesTest {
  private static final int PROMISED_NAMES = 450;
  private static final int MOST_EXCEPTIONS = 80;

  private final MoleculeNames names = MoleculeNames.builtIn();

  private static Map<String, String> exceptions() {
    Map<String, String> systematic = new HashMap<>();
    for (List<String> row : CsvTable.read("/molecule/opsin-exceptions.csv").rows()) {
      assertFalse(row.get(1).isBlank(), "no reason for " + row.get(0));
      systematic.put(row.get(0), row.get(2));
    }
    return systematic;
  }

  @Test
  void everyNameMeansItsStructure() {
    Map<String, String> exceptions = exceptions();
    List<String> wrong = new ArrayList<>();
    for (CommonNames.Entry entry : new CommonNames().all()) {
      String checked = exceptions.getOrDefault(entry.name(), entry.name());
      String smiles =
          SystematicNames.parse(checked).map(SystematicNames.Structure::smiles).orElse("");
      boolean same =
          !smiles.isEmpty() && Smiles.readAll(smiles).equals(List.of(Smiles.read(entry.smiles())));
      if (!same) {
        wrong.add(entry.name() + " (" + checked + "): " + entry.smiles() + " but " + smiles);
      }
    }
    assertEquals(List.of(), wrong);
  }

  @Test
  void exceptionsAreFewListedAndNeeded() {
    Set<String> listed = new HashSet<>();
    new CommonNames().all().forEach(e -> listed.add(e.name()));
    Map<String, String> exceptions = exceptions();
    assertTrue(exceptions.size() <= MOST_EXCEPTIONS);
    for (String name : exceptions.keySet()) {
      assertTrue(listed.contains(name), name + " is not in the list");
      assertFalse(libraryAgrees(name), name + " needs no exception");
    }
  }

  private boolean libraryAgrees(String name) {
    Molecule meant = Smiles.read(names.curated(name).orElseThrow().smiles());
    return SystematicNames.parse(name)
        .filter(s -> s.warning().isEmpty() && SmilesText.isAllTokens(s.smiles()))
        .filter(s -> !s.smiles().matches("\\[[A-Z][a-z]?\\](=O)?"))
        .filter(s -> Smiles.readAll(s.smiles()).equals(List.of(meant)))
        .isPresent();
  }

  @Test
  void holdsThePromisedNumberOfStructures() {
    Set<String> keys = new HashSet<>();
    new CommonNames().all().forEach(e -> keys.add(Smiles.read(e.smiles()).key()));
    assertTrue(keys.size() >= PROMISED_NAMES, keys.size() + " structures");
  }

  @Test
  void noNameIsListedTwiceAndEachStructureIsWrittenOneWay() {
    List<List<String>> rows = CsvTable.read("/names/common-names.csv").rows();
    assertEquals(rows.size(), new CommonNames().all().size(), "a name stands twice");
    Map<String, String> smilesOfKey = new HashMap<>();
    for (List<String> row : rows) {
      String first = smilesOfKey.computeIfAbsent(Smiles.read(row.get(1)).key(), key -> row.get(1));
      assertEquals(first, row.get(1), row.get(0));
    }
  }

  @Test
  void stereoColumnIsTheSameFlatMolecule() {
    int seen = 0;
    for (CommonNames.Entry entry : new CommonNames().all()) {
      if (!entry.stereoSmiles().isEmpty()) {
        assertEquals(Smiles.read(entry.smiles()), Smiles.read(entry.stereoSmiles()), entry.name());
        seen++;
      }
    }
    assertTrue(seen > 40, "only " + seen);
  }

  @Test
  void everyListedMoleculeIsFoundByItsStructure() {
    for (CommonNames.Entry entry : new CommonNames().all()) {
      Molecule molecule = Smiles.read(entry.smiles());
      String shown = names.display(molecule);
      assertEquals(entry.smiles(), names.curated(shown).orElseThrow().smiles(), entry.name());
    }
  }

  @Test
  void noNameCouldBeTakenForSmiles() {
    for (CommonNames.Entry entry : new CommonNames().all()) {
      assertFalse(SmilesText.looksLikeSmiles(entry.name()), entry.name());
    }
  }

  @ParameterizedTest
  @CsvSource({
    "C(=Cc1ccccc1)c1ccccc1, trans-stilbene",
    "O=C(Cc1ccccc1)Cc1ccccc1, '1,3-diphenylacetone'",
    "O=C1CNC(=O)CN1, '2,5-diketopiperazine'",
    "CC=CC, trans-2-butene",
    "CCC(=O)CC, 3-pentanone"
  })
  void saysWhatAChemistSays(String smiles, String name) {
    assertEquals(name, names.display(Smiles.read(smiles)));
  }

  @Test
  void showsTheFormulaWhereThereIsNoName() {
    Molecule odd = Smiles.read("N1SC2(CCP1)OC2");
    assertTrue(names.commonOrGenerated(odd).isEmpty());
    assertEquals("C4H8NOPS", names.display(odd));
  }

  @Test
  void suggestsNamesThatDifferByFewLetters() {
    assertEquals("phenylacetic acid", names.closest("phenylacetic acod").get(0));
    assertEquals("benzophenone", names.closest("benzophenon").get(0));
    assertEquals(List.of(), names.closest("qqqqqqqqqq"));
  }
}
