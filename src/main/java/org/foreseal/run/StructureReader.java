package org.foreseal.run;

import java.util.List;
import org.foreseal.molecule.Molecule;
import org.foreseal.quantity.Place;

/** Reads a compound that the user wrote as a SMILES or as a name. */
@FunctionalInterface
public interface StructureReader {
  /**
   * The compound.
   *
   * @throws org.foreseal.quantity.BadInputException when it is neither
   */
  Structure read(String text, Place place);

  /**
   * A compound as read.
   *
   * @param molecule neutral structure
   * @param name name shown
   * @param notes how it was understood where that is not obvious
   */
  record Structure(Molecule molecule, String name, List<String> notes) {
    /** Keeps an unmodifiable copy. */
    public Structure {
      notes = List.copyOf(notes);
    }
  }
}
