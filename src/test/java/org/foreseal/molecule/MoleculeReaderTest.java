package org.foreseal.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class MoleculeReaderTest {
  private final MoleculeReader reader = new MoleculeReader(MoleculeNames.builtIn());

  @ParameterizedTest
  @CsvSource({
    "phenylacetic acid, OC(=O)Cc1ccccc1",
    "Phenylacetic  Acid, OC(=O)Cc1ccccc1",
    "dibenzyl ketone, O=C(Cc1ccccc1)Cc1ccccc1",
    "\u03b1-methylstyrene, CC(=C)c1ccccc1",
    "GABA, NCCCC(=O)O",
    "limonene, CC1=CCC(CC1)C(C)=C",
    "3-(4-chlorophenyl)heptan-2-one, CC(=O)C(CCCC)c1ccc(Cl)cc1",
    "'[1,1''-biphenyl]-4-ol', Oc1ccc(cc1)-c1ccccc1",
    "bicyclo[2.2.1]heptane, C1CC2CCC1C2"
  })
  void readsNames(String name, String smiles) {
    ReadMolecule read = reader.read(name);
    assertEquals(Smiles.read(smiles), read.molecule());
    assertEquals(name, read.name());
    assertEquals(List.of(), read.notes());
  }

  @ParameterizedTest
  @CsvSource({
    "OC(=O)Cc1ccccc1, phenylacetic acid",
    "C, methane",
    "CO, methanol",
    "[H][H], hydrogen",
    "c1ccccc1, benzene",
    "[C-]#[O+], carbon monoxide"
  })
  void readsSmiles(String smiles, String name) {
    ReadMolecule read = reader.read("  " + smiles + " ");
    assertEquals(Smiles.read(smiles), read.molecule());
    assertEquals(name, read.name());
  }

  @ParameterizedTest
  @CsvSource({
    "H2O, O",
    "CO2, O=C=O",
    "NH3, N",
    "H2S, S",
    "HCl, Cl",
    "HCN, C#N",
    "N2, N#N",
    "CH3OH, CO",
    "CCl4, ClC(Cl)(Cl)Cl",
    "S8, S1SSSSSSS1",
    "H2, [H][H]"
  })
  void readsFormulasOfSmallSpecies(String formula, String smiles) {
    ReadMolecule read = reader.read(formula);
    assertEquals(Smiles.read(smiles), read.molecule());
    assertEquals(List.of(), read.notes());
  }

  @ParameterizedTest
  @CsvSource({
    "CO, CO, carbon monoxide",
    "NO, NO, nitric oxide",
    "COS, COS, carbonyl sulfide",
    "S, S, sulfur",
    "C, C, charcoal"
  })
  void saysWhenSmilesIsAlsoAFormula(String text, String smiles, String otherMeaning) {
    ReadMolecule read = reader.read(text);
    assertEquals(Smiles.read(smiles), read.molecule());
    assertTrue(read.notes().get(0).contains(otherMeaning), read.notes().toString());
  }

  @ParameterizedTest
  @CsvSource({
    "sodium phenylacetate, OC(=O)Cc1ccccc1, sodium counter-ion set aside",
    "[Na+].[O-]C(=O)Cc1ccccc1, OC(=O)Cc1ccccc1, sodium counter-ion set aside",
    "calcium acetate, CC(=O)O, calcium counter-ion set aside",
    "benzylamine hydrochloride, NCc1ccccc1, chloride counter-ion set aside",
    "[Cl-].[NH3+]C, CN, chloride counter-ion set aside",
    "[NH3+]CC(=O)[O-], NCC(=O)O, drawn ionised",
    "c1cc[nH+]cc1, n1ccccc1, drawn ionised",
    "CC(=O)O.O, CC(=O)O, water of crystallisation",
    "CN(=O)=O, C[N+](=O)[O-], charge-separated",
    "O=n1ccccc1, [O-][n+]1ccccc1, charge-separated",
    "CN=N#N, CN=[N+]=[N-], charge-separated",
    "C[S+]([O-])C, CS(C)=O, double bond",
    "C[S+2]([O-])([O-])C, CS(C)(=O)=O, double bond",
    "OC=C, CC=O, enol",
    "[O-]C(C)=C.[Na+], CC(C)=O, sodium",
    "C/C=C/C, CC=CC, stereo",
    "C[C@H](N)C(=O)O, CC(N)C(=O)O, stereo",
    "L-alanine, CC(N)C(=O)O, stereo"
  })
  void normalisesAndSaysSo(String text, String smiles, String note) {
    ReadMolecule read = reader.read(text);
    assertEquals(Smiles.read(smiles), read.molecule());
    assertTrue(read.notes().stream().anyMatch(n -> n.contains(note)), read.notes().toString());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "C[N+](=O)[O-]",
        "[O-][n+]1ccccc1",
        "[C-]#[O+]",
        "CN=[N+]=[N-]",
        "C[N+]#[C-]",
        "C=[N+]=[N-]",
        "N#[N+][O-]"
      })
  void keepsChargesThatBelongToTheMolecule(String smiles) {
    ReadMolecule read = reader.read(smiles);
    assertEquals(Smiles.read(smiles), read.molecule());
    assertEquals(List.of(), read.notes());
  }

  @Test
  void drawsADiazoGroupOneWay() {
    assertEquals(reader.read("CN=[N+]=[N-]").molecule(), reader.read("C[N-][N+]#N").molecule());
  }

  @Test
  void namesTheNeutralSpeciesOnceSomethingWasChanged() {
    assertEquals("phenylacetic acid", reader.read("sodium phenylacetate").name());
    assertEquals("3-phenylpropionic acid", reader.read("3-phenylpropionic acid").name());
  }

  @Test
  void keepsTheStereoStructureForDisplay() {
    assertEquals(Optional.of("C/C=C/C"), reader.read("C/C=C/C").stereoSmiles());
    assertTrue(reader.read("trans-stilbene").stereoSmiles().isPresent());
    assertEquals(Optional.empty(), reader.read("CCO").stereoSmiles());
  }

  @ParameterizedTest
  @CsvSource({
    "CC[13CH3], 3, isotope",
    "CC([2H])C, 4, isotope",
    "C[CH]C, 2, radical",
    "CC(C)(C)(C)C, 2, cannot carry 5 bonds",
    "CC[Mg]Br, 3, metal",
    "CC[SiH3], 3, element",
    "CC>>CO, 3, reaction",
    "CC*, 3, any atom",
    "CC.OCC, 4, different molecules",
    "CC$C, 3, bond",
    "CC(C, 4, not understood"
  })
  void pointsAtTheTrouble(String smiles, int column, String problem) {
    BadInputException e = assertThrows(BadInputException.class, () -> reader.read(smiles));
    assertTrue(e.report().contains(problem), e.report());
    assertEquals(column, e.place().column());
    assertFalse(e.hint().isBlank());
  }

  @Test
  void countsColumnsFromWhereTheTextStands() {
    String line = "  - {smiles: \"CC[13CH3]\"}";
    Place place = new Place("run.yaml", 4, 15, line);
    BadInputException e =
        assertThrows(BadInputException.class, () -> reader.read("CC[13CH3]", place));
    assertEquals("run.yaml:4:17", e.place().label());
    assertEquals('[', line.charAt(e.place().column() - 1));
    assertTrue(e.hint().contains("label"));
  }

  @Test
  void refusesMoreThanSixtyHeavyAtomsButTakesSixty() {
    assertEquals(60, reader.read("C".repeat(60)).molecule().heavyAtomCount());
    BadInputException e = assertThrows(BadInputException.class, () -> reader.read("C".repeat(61)));
    assertTrue(e.report().contains("61"));
  }

  @Test
  void suggestsTheNearestName() {
    BadInputException e =
        assertThrows(BadInputException.class, () -> reader.read("phenylacetic acod"));
    assertTrue(e.hint().contains("phenylacetic acid"), e.hint());
  }

  @Test
  void refusesPermanentCharges() {
    BadInputException e = assertThrows(BadInputException.class, () -> reader.read("C[N+](C)(C)C"));
    assertTrue(e.report().contains("permanent"));
    assertThrows(BadInputException.class, () -> reader.read("tetramethylammonium bromide"));
  }
}
