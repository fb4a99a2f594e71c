package org.foreseal.thermo;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.foreseal.molecule.Smiles;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Total symmetry numbers, external times internal. Methyl rotors count 3 each, rings are planar on
 * time average. Values: common practice of statistical thermodynamics, worked out by hand from the
 * point group of the time-averaged shape.
 */
class SymmetryFinderTest {
  @ParameterizedTest
  @CsvSource({
    "CC, 18",
    "CCC, 18",
    "CCCC, 18",
    "CC(C)C, 81",
    "CC(C)(C)C, 972",
    "CC(C)C(C)C, 162",
    "C=C, 4",
    "CC=C, 3",
    "CC(C)=C, 18",
    "CC=CC, 18",
    "CC(C)=C(C)C, 324",
    "c1ccccc1, 12",
    "Cc1ccccc1, 6",
    "Cc1ccc(C)cc1, 36",
    "Cc1cc(C)cc(C)c1, 162",
    "c1ccc(cc1)-c1ccccc1, 8",
    "c1ccc2ccccc2c1, 4",
    "c1ccc2cc3ccccc3cc2c1, 4",
    "c1ccncc1, 2",
    "C1CCCCC1, 12",
    "C1CCCC1, 10",
    "C1CC1, 6",
    "C1CC2CCC1C2, 2",
    "CN(C)C, 81",
    "CNC, 9",
    "CC(=O)C, 18",
    "CC(C)O, 9",
    "CC(=O)O, 3",
    "CC(C)(C)O, 81",
    "CO, 3",
    "COC, 18",
    "CS(=O)C, 9",
    "CC(=O)C(C)=O, 18",
    "O=C(Cc1ccccc1)Cc1ccccc1, 8",
    "O=C1CCCCC1, 2",
    "C=CC=C, 2",
    "C#CC, 3",
    "CC#CC, 18",
    "CCC(C)O, 9"
  })
  void findsTotalSymmetryNumbers(String smiles, double expected) {
    TypedMolecule typed = new TypedMolecule(Smiles.read(smiles));
    assertEquals(expected, SymmetryFinder.of(typed).orElseThrow().number());
  }

  @ParameterizedTest
  @CsvSource({
    "CCC(C)O, 2",
    "CC(O)C(C)O, 4",
    "CC(C)O, 1",
    "CC(O)C(=O)O, 2",
    "CC(O)CC(O)C, 4",
    "CC(N)c1ccccc1, 2",
    "CC1CCCCC1=O, 2",
    "CC1CCC(C)CC1, 1"
  })
  void countsStereocentresAsUnspecified(String smiles, int expected) {
    TypedMolecule typed = new TypedMolecule(Smiles.read(smiles));
    assertEquals(expected, SymmetryFinder.of(typed).orElseThrow().opticalIsomers());
  }

  @ParameterizedTest
  @CsvSource({"CC(C)(C)C(C(C)(C)C)(C(C)(C)C)C(C)(C)C", "CC(C)(C)CC(CC(C)(C)C)(CC(C)(C)C)CC(C)(C)C"})
  void copesWithManyEqualBranches(String smiles) {
    TypedMolecule typed = new TypedMolecule(Smiles.read(smiles));
    // 12 methyls, each tert-butyl 3 orientation-keeping turns, the core 12: 3^12 x 3^4 x 12.
    assertEquals(Math.pow(3, 16) * 12, SymmetryFinder.of(typed).orElseThrow().number(), 1e-6);
  }
}
