package org.foreseal.chromatography;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.foreseal.molecule.Smiles;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Where common products end up; common practice of extraction with dichloromethane and GC, no
 * source.
 */
class WorkUpTest {
  @ParameterizedTest
  @CsvSource({
    "Cc1ccccc1, EXTRACT, true",
    "O=C(Cc1ccccc1)Cc1ccccc1, EXTRACT, true",
    "OC(=O)c1ccccc1, EXTRACT, true",
    "Oc1ccccc1, EXTRACT, true",
    "CCCCCCO, EXTRACT, true",
    "CC(C)=O, EXTRACT, true",
    "Nc1ccccc1, EXTRACT, true",
    "NCc1ccccc1, EXTRACT, true",
    "O=C=O, GAS, false",
    "[H][H], GAS, false",
    "[C-]#[O+], GAS, false",
    "C, GAS, false",
    "C=CC, GAS, false",
    "N, GAS, false",
    "S, GAS, false",
    "C=O, GAS, false",
    "O, WATER, false",
    "CO, WATER, false",
    "OC=O, WATER, false",
    "CC(=O)O, WATER, false",
    "OCC(O)CO, WATER, false",
    "NCC(=O)O, WATER, false",
    "OC(=O)CCC(=O)O, WATER, false",
    "CN, WATER, false",
    "CC(=O)N, WATER, false",
    "OC(=O)CCCCCCCC(=O)O, EXTRACT, false",
    "OC(C(=O)O)c1ccccc1, EXTRACT, false",
    "NC(Cc1ccccc1)C(=O)O, EXTRACT, false",
    "[O-]C(=O)Cc1ccccc1, WATER, false",
    "CCCCCC, EXTRACT, true"
  })
  void productsGoWhereChemistsFindThem(String smiles, WhereFound where, boolean seen) {
    assertEquals(where, WorkUp.whereFound(Smiles.read(smiles)));
    assertEquals(seen, WorkUp.isSeenByGc(Smiles.read(smiles)));
  }
}
