package org.foreseal.run;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.foreseal.molecule.ChemicalElement;
import org.foreseal.molecule.Smiles;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.openscience.cdk.config.Isotopes;
import org.openscience.cdk.interfaces.IAtom;
import org.openscience.cdk.silent.Atom;

class LoadingTest {
  /** The abridged weights round the isotope table to at least four figures. */
  @ParameterizedTest
  @EnumSource(
      value = ChemicalElement.class,
      names = {"FE", "CU"},
      mode = EnumSource.Mode.EXCLUDE)
  void agreesWithTheIsotopeTable(ChemicalElement element) throws java.io.IOException {
    IAtom atom = new Atom(element.symbol());
    double fromTable = Isotopes.getInstance().getNaturalMass(atom.getAtomicNumber());
    String hydride =
        switch (element) {
          case H -> "[H][H]";
          case C -> "C";
          case N -> "N";
          case O -> "O";
          case P -> "P";
          case S -> "S";
          default -> element.symbol();
        };
    int hydrogens =
        switch (element) {
          case H -> 0;
          case C -> 4;
          case N, P -> 3;
          case O, S -> 2;
          default -> 1;
        };
    int own = element == ChemicalElement.H ? 2 : 1;
    double ours = (Loading.gramsPerMole(Smiles.read(hydride)) - hydrogens * 1.008) / own;
    assertEquals(fromTable, ours, fromTable * 5e-4);
  }

  // Molar masses from the abridged weights, summed by hand.
  @ParameterizedTest
  @CsvSource({"OC(=O)Cc1ccccc1, 136.150", "O, 18.015", "CCO, 46.069", "Clc1ccccc1, 112.556"})
  void sumsMolarMasses(String smiles, double gramsPerMole) {
    assertEquals(gramsPerMole, Loading.gramsPerMole(Smiles.read(smiles)), 2e-3);
  }

  @Test
  void leavesMillimolesOpenWithoutTheMassOfWater() {
    RunSheet sheet =
        new RunReader(
                new org.foreseal.molecule.MoleculeReader(
                    org.foreseal.molecule.MoleculeNames.builtIn()))
            .read(
                new RunReader.Sheet(
                    "x",
                    "substrates: [{name: ethanol, molality: 1}, {name: toluene}, "
                        + "{name: acetone, milligrams: 58.08}]\ntemperature_C: 200\n"));
    assertEquals(true, Loading.millimoles(sheet, sheet.substrates().get(0)).isEmpty());
    assertEquals(true, Loading.millimoles(sheet, sheet.substrates().get(1)).isEmpty());
    assertEquals(1, Loading.millimoles(sheet, sheet.substrates().get(2)).orElseThrow(), 1e-3);
  }
}
