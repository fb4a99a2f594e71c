package org.foreseal.run;

import java.util.List;
import java.util.Map;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;

/** Reads SMILES and a handful of names, so that these tests do not hang on the name reader. */
public final class TestStructures implements StructureReader {
  private static final Map<String, String> NAMES =
      Map.of(
          "phenylacetic acid", "OC(=O)Cc1ccccc1",
          "benzoic acid", "OC(=O)c1ccccc1",
          "2-methyl-2-phenylpropanoic acid", "CC(C)(C(=O)O)c1ccccc1",
          "acetic acid", "CC(=O)O",
          "toluene", "Cc1ccccc1",
          "benzylamine", "NCc1ccccc1");

  @Override
  public Structure read(String text, Place place) {
    String smiles = NAMES.getOrDefault(text, text);
    List<Molecule> molecules = Smiles.readAll(smiles, place);
    if (molecules.size() != 1) {
      throw new BadInputException(place, "several molecules", "give one");
    }
    return new Structure(molecules.get(0), text, List.of());
  }
}
