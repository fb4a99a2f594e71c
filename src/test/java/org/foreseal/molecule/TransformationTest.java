package org.foreseal.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Each trap met with general toolkits' transformations is a case here. */
class TransformationTest {
  private static Set<String> outcomes(String smirks, String... reactants) {
    List<Molecule> molecules = Arrays.stream(reactants).map(Smiles::read).toList();
    return Transformation.of(smirks).apply(molecules).stream()
        .map(o -> o.products().stream().map(Molecule::smiles).collect(Collectors.joining(".")))
        .collect(Collectors.toSet());
  }

  private static String canonical(String smiles) {
    return Smiles.readAll(smiles).stream()
        .sorted()
        .map(Molecule::smiles)
        .collect(Collectors.joining("."));
  }

  @Test
  void bothHydrogensOfAnOxidationLeaveTogether() {
    // Some engines leave one hydrogen on the carbon and a lone one behind with this spelling.
    assertEquals(
        Set.of(canonical("CC=O.[H][H]")),
        outcomes("[C;X4:1]([H:3])[O:2][H:6]>>[C:1]=[O:2].[H:3][H:6]", "CCO"));
  }

  @Test
  void everySiteOfAnUnsymmetricBondGivesItsIsomer() {
    // One match per set of atoms would lose the second alcohol.
    assertEquals(
        Set.of(canonical("CC(O)CCC"), canonical("CCC(O)CC")),
        outcomes("[C:1]=[C:2].[H:3][O:4][H:5]>>[C:1]([H:3])[C:2][O:4][H:5]", "CC=CCC", "O"));
  }

  @Test
  void equivalentSitesAreMergedAndCounted() {
    List<Outcome> outcomes =
        Transformation.of("[c:1][H:2].[H:3][O:4][H:5]>>[c:1][O:4][H:5].[H:2][H:3]")
            .apply(List.of(Smiles.read("c1ccccc1"), Smiles.read("O")));
    assertEquals(1, outcomes.size());
    assertEquals(6, outcomes.get(0).sites());
  }

  @Test
  void ringsThatLoseAromaticBondsFindNewAlternation() {
    String meso =
        "[c;R1:1]1:[c;R2:2]:[c;R2:3]:[c;R1:4]:[c;R2:5]:[c;R2:6]:1.[H:7][H:8]"
            + ">>[C:1]1([H:7])-[c:2]:[c:3]-[C:4]([H:8])-[c:5]:[c:6]-1";
    assertEquals(
        Set.of(canonical("C1c2ccccc2Cc2ccccc12")),
        outcomes(meso, "c1ccc2cc3ccccc3cc2c1", "[H][H]"));
  }

  @Test
  void aromatisedRingsAreAromaticAtOnce() {
    String smirks =
        "[H:11][C;X4:1]1([H:12])[C;X4:2]([H:13])([H:14])[C:3]([H:15])=[C:4]([H:16])[C:5]([H:17])=[C:6]1[H:18]"
            + ">>[C:1]1([H:12])=[C:2]([H:14])[C:3]([H:15])=[C:4]([H:16])[C:5]([H:17])=[C:6]1[H:18].[H:11][H:13]";
    assertEquals(Set.of(canonical("c1ccccc1.[H][H]")), outcomes(smirks, "C1=CC=CCC1"));
  }

  @Test
  void aSiteThatWouldBreakAValenceGivesNothing() {
    assertEquals(Set.of(), outcomes("[C:1][O:2]>>[C:1]=[O:2]", "CCO"));
  }

  @Test
  void aBondCutInsideARingLeavesOnePiece() {
    // Templates that are split at the dot would double atoms here.
    String retroAldol =
        "[H:1][O:6][C;X4:5]-[C;X4:2][C;X3:3]=[O:4]>>[O:6]=[C:5].[H:1][C:2][C:3]=[O:4]";
    assertEquals(Set.of(canonical("O=CCCCC(C)=O")), outcomes(retroAldol, "CC(=O)C1CCC1O"));
  }

  @Test
  void twoPiecesNeverMeetInsideOneMolecule() {
    String ester =
        "[C:1](=[O:2])[O:3][H:4].[H:5][O:6][C;X4:7]>>[C:1](=[O:2])[O:6][C:7].[H:4][O:3][H:5]";
    assertThrows(
        IllegalArgumentException.class,
        () -> outcomes(ester, "OCCCC(=O)O"),
        "one molecule is not two reactants");
    assertEquals(
        Set.of(canonical("OCCCC(=O)OCCCC(=O)O.O")), outcomes(ester, "OCCCC(=O)O", "OCCCC(=O)O"));
  }

  @Test
  void chargesAreSetWhereTheTemplateSaysSo() {
    String shift = "[C-:1]#[O+:2].[H:3][O:4][H:5]>>[O+0:2]=[C+0:1]=[O:4].[H:3][H:5]";
    assertEquals(Set.of(canonical("O=C=O.[H][H]")), outcomes(shift, "[C-]#[O+]", "O"));
  }

  @Test
  void bookkeepingIonsBalance() {
    String copper = "[H:1][H:2].[Cu+2:3].[Cu+2:4]>>[H+:1].[H+:2].[Cu+:3].[Cu+:4]";
    assertEquals(
        Set.of(canonical("[H+].[H+].[Cu+].[Cu+]")), outcomes(copper, "[H][H]", "[Cu+2]", "[Cu+2]"));
  }

  @Test
  void atomMapsFollowCarbonsAndMovingHydrogens() {
    Molecule acid = Smiles.read("CC(=O)O");
    Outcome o =
        Transformation.of("[C;X4:1][C:2](=[O:3])[O:4][H:5]>>[C:1][H:5].[O:3]=[C:2]=[O:4]")
            .apply(List.of(acid))
            .get(0);
    int methyl = carbonWithHydrogens(acid, 3);
    int productAtom = 0;
    for (Molecule p : o.products()) {
      for (int i = 0; i < p.atomCount(); i++, productAtom++) {
        if (p.element(i) == 6 && p.hydrogens(i) == 4) {
          assertEquals(methyl, o.atomMap().origin(productAtom));
          assertEquals(productAtom, o.atomMap().hydrogenTo(0));
        }
      }
    }
    assertEquals(1, o.atomMap().hydrogenMoveCount());
    assertEquals(8, acid.element(o.atomMap().hydrogenFrom(0)));
  }

  private static int carbonWithHydrogens(Molecule m, int hydrogens) {
    for (int i = 0; i < m.atomCount(); i++) {
      if (m.element(i) == 6 && m.hydrogens(i) == hydrogens) {
        return i;
      }
    }
    throw new AssertionError("no such carbon");
  }

  @ParameterizedTest
  @CsvSource(
      delimiterString = " :: ",
      value = {
        "[C:1][O:2] :: has reactants",
        "[C:1][O>>[C:1] :: SMARTS not understood",
        "[C:1]O>>[C:1] :: needs a map number",
        "[C:1][O:2]>>[C:1] :: only among the reactants",
        "[C:1]>>[C:1][O:2] :: only among the products",
        "[C:1][C:1]>>[C:1] :: stands twice among the reactants",
        "[C:1][O:2]>>[C:1].[O:2].[O:2] :: stands twice among the products",
        "[C:1][O:2]>>[C:1][N:2] :: changes its element",
        "[C:1].[O:2]>>[C:1]~[O:2] :: definite order",
        "[C;h3:1]>>[C:1] :: not supported"
      })
  void templatesThatCannotBalanceAreRefused(String smirks, String complaint) {
    IllegalArgumentException e =
        assertThrows(IllegalArgumentException.class, () -> Transformation.of(smirks));
    assertTrue(String.valueOf(e.getMessage()).contains(complaint), e::toString);
  }

  @Test
  void theNumberOfReactantsIsChecked() {
    Transformation t = Transformation.of("[C:1][O:2]>>[C:1].[O:2]");
    assertThrows(IllegalArgumentException.class, () -> t.apply(List.of()));
  }
}
