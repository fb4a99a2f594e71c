package org.foreseal.molecule;

import org.openscience.cdk.exception.CDKException;
import org.openscience.cdk.smiles.SmiFlavor;
import org.openscience.cdk.smiles.SmilesGenerator;

/** Writes canonical SMILES. */
final class SmilesWriter {
  private SmilesWriter() {}

  static String write(Molecule molecule) {
    if (molecule.heavyAtomCount() == 0) {
      return molecule.charge(0) == 0 ? "[H][H]" : "[H+]";
    }
    try {
      return new SmilesGenerator(SmiFlavor.Unique | SmiFlavor.UseAromaticSymbols)
          .create(CdkBridge.toLibrary(molecule));
    } catch (CDKException e) {
      throw new IllegalStateException("a checked molecule could not be written as SMILES", e);
    }
  }
}
