package org.foreseal.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PatternTest {
  /** Counts done by hand on the drawn structures. */
  @ParameterizedTest
  @CsvSource(
      delimiterString = " -> ",
      value = {
        "[CX3](=O)[OX2H1] -> OC(=O)CCC(=O)O -> 2",
        "[#6] -> c1ccccc1C -> 7",
        "[c;H1] -> Cc1ccccc1 -> 5",
        "c:c -> c1ccccc1 -> 6",
        "[CX4;!H0] -> CC(C)(C)C -> 4",
        "[C;R] -> C1CCCCC1C -> 6",
        "[C;!R] -> C1CCCCC1C -> 1",
        "[c;R2] -> c1ccc2ccccc2c1 -> 2",
        "[r5] -> C1CCC2CCCCC12 -> 5",
        "C=C -> C=CC=C -> 2",
        "C-!@C -> C1CC1C -> 1",
        "[N+] -> C[N+](=O)[O-] -> 1",
        "[$([CX4][OX2H1])] -> OCC(O)C -> 2",
        "[H]O -> OCCO -> 2",
        "[D1] -> CC(C)C -> 3",
        "[C,N]-,=[O,S] -> CC(=O)O -> 2",
        "[#7,#8,#16].[#6]=[#6] -> C=CCO -> 1",
        "[OX2H1].[OX2H1] -> OCCO -> 1",
        "a -> c1ccoc1 -> 5",
        "A -> c1ccoc1C -> 1",
        "* -> CO -> 2"
      })
  void countsMatches(String smarts, String smiles, int count) {
    assertEquals(count, Pattern.of(smarts).count(Smiles.read(smiles)));
    assertEquals(count > 0, Pattern.of(smarts).isIn(Smiles.read(smiles)));
  }

  @ParameterizedTest
  @CsvSource({"[C", "C(", "[Q]", "[h1]"})
  void refusesWhatItCannotRead(String smarts) {
    assertThrows(IllegalArgumentException.class, () -> Pattern.of(smarts));
  }

  @Test
  void showsItsText() {
    assertEquals("[OX2H1]", Pattern.of("[OX2H1]").toString());
  }
}
