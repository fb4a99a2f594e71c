package org.foreseal.rule;

import java.util.List;
import org.foreseal.molecule.Pattern;
import org.foreseal.quantity.Place;

/**
 * A kind of species that no rule may make because it does not last under the conditions or in the
 * work-up.
 *
 * @param id id in kebab case
 * @param reason why, in plain words
 * @param pattern its structural mark
 * @param refuses SMILES that hold the mark
 * @param accepts SMILES of similar molecules that must not hold it
 * @param place where it stands in its file
 */
public record SpeciesLimit(
    String id,
    String reason,
    Pattern pattern,
    List<String> refuses,
    List<String> accepts,
    Place place) {
  /** Keeps unmodifiable copies. */
  public SpeciesLimit {
    refuses = List.copyOf(refuses);
    accepts = List.copyOf(accepts);
  }
}
