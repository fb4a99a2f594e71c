package org.foreseal.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.openscience.cdk.config.Isotopes;
import org.openscience.cdk.interfaces.IIsotope;

class ChemicalElementTest {
  private static final double TABLES_AGREE_DALTON = 5e-6;

  @ParameterizedTest
  @EnumSource(ChemicalElement.class)
  void massIsThatOfTheMostAbundantIsotope(ChemicalElement element) throws IOException {
    IIsotope major = Isotopes.getInstance().getMajorIsotope(element.atomicNumber());
    assertEquals(major.getSymbol(), element.symbol());
    assertEquals(major.getExactMass(), element.monoisotopicMassDalton(), TABLES_AGREE_DALTON);
  }

  @ParameterizedTest
  @EnumSource(ChemicalElement.class)
  void isFoundByItsAtomicNumber(ChemicalElement element) {
    assertEquals(Optional.of(element), ChemicalElement.of(element.atomicNumber()));
    assertEquals(element, ChemicalElement.require(element.atomicNumber()));
  }

  @ParameterizedTest
  @EnumSource(
      value = ChemicalElement.class,
      names = {"FE", "CU"})
  void metalsAreNoInput(ChemicalElement metal) {
    assertFalse(metal.isAllowedInInput());
    assertTrue(metal.allowsValence(2, 0));
    assertFalse(metal.allowsValence(0, 1));
  }
}
