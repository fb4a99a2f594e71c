package org.foreseal.molecule;

import java.util.Optional;
import uk.ac.cam.ch.wwmm.opsin.NameToStructure;
import uk.ac.cam.ch.wwmm.opsin.OpsinResult;

/** Asks the name library for the structure of a systematic name. Loaded on first use only. */
final class SystematicNames {
  private SystematicNames() {}

  /**
   * What the library made of a name.
   *
   * @param smiles the structure, as isomeric SMILES
   * @param warning why it is not sure, empty when it is
   */
  record Structure(String smiles, String warning) {}

  static Optional<Structure> parse(String name) {
    OpsinResult result = NameToStructure.getInstance().parseChemicalName(name);
    String smiles = result.getSmiles();
    if (result.getStatus() == OpsinResult.OPSIN_RESULT_STATUS.FAILURE || smiles == null) {
      return Optional.empty();
    }
    boolean sure = result.getStatus() == OpsinResult.OPSIN_RESULT_STATUS.SUCCESS;
    return Optional.of(new Structure(smiles, sure ? "" : String.valueOf(result.getMessage())));
  }
}
