package org.foreseal.molecule;

import java.util.List;
import java.util.Optional;

/**
 * What {@link MoleculeReader} made of a text.
 *
 * @param molecule the neutral, flat species the forecast works with
 * @param name what to call it: the name as written when nothing had to be changed, else the name of
 *     the neutral species
 * @param notes what was changed or assumed, in plain words, for the output to repeat
 * @param stereoSmiles the structure as given, with its stereo marks, when it had any; for display
 *     only, never for identity
 */
public record ReadMolecule(
    Molecule molecule, String name, List<String> notes, Optional<String> stereoSmiles) {
  /** Keeps an unmodifiable copy of the notes. */
  public ReadMolecule {
    notes = List.copyOf(notes);
  }
}
