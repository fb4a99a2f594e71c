package org.foreseal.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MoleculeTest {
  @ParameterizedTest
  @CsvSource({
    "CC1=C(O)C=CC=C1, CC1=CC=CC=C1O",
    "CC(O)=CC(C)=O, CC(=O)CC(C)=O",
    "OC=C, CC=O",
    "OC(=NC)C, CNC(C)=O",
    "[H]C([H])([H])[H], C",
    "c1ccc2cccc2cc1, C1=CC2=CC=CC2=CC=C1",
    "C1=CC=C2C=CC=CC2=C1, c1ccc2ccccc2c1",
  })
  void mergesSpellingsOfOneMolecule(String one, String other) {
    assertEquals(Smiles.read(one), Smiles.read(other));
    assertEquals(Smiles.read(one).smiles(), Smiles.read(other).smiles());
  }

  @ParameterizedTest
  @CsvSource({
    "CCCO, CC(C)O",
    "CC=O, CCO",
    "C1CCCCC1, c1ccccc1",
    "C[N+](C)(C)C, CC(C)(C)C",
    "[H][H], [H+]"
  })
  void keepsDifferentMoleculesApart(String one, String other) {
    assertNotEquals(Smiles.read(one), Smiles.read(other));
  }

  @ParameterizedTest
  @CsvSource({
    "OC(=O)Cc1ccccc1, C8H8O2, 136.05243",
    "[H][H], H2, 2.01565",
    "O=C=O, CO2, 43.98983",
    "c1ccsc1, C4H4S, 84.00337",
    "[C-]#[O+], CO, 27.99491"
  })
  void writesFormulaAndMass(String smiles, String formula, double mass) {
    Formula f = Smiles.read(smiles).formula();
    assertEquals(formula, f.toString());
    // Masses summed by hand from the isotope table, five decimals.
    assertEquals(mass, f.monoisotopicMassDalton(), 2e-5);
  }

  @Test
  void findsRingsOfFusedAndBridgedMolecules() {
    Molecule norbornane = Smiles.read("C1CC2CCC1C2");
    assertEquals(2, norbornane.ringCount());
    assertEquals(5, norbornane.ring(0).length);
    assertEquals(5, norbornane.ring(1).length);
    assertEquals(3, Smiles.read("c1ccc2cc3ccccc3cc2c1").ringCount());
  }
}
