package org.foreseal.rule;

import java.util.Set;
import org.foreseal.molecule.Molecule;

/**
 * What a rule is told about the run.
 *
 * @param offered what solids, additives and medium offer
 * @param charged molecules put into the vessel by the user: substrates and molecular additives
 * @param lowestCelsius lowest temperature of the run, C
 * @param highestCelsius highest temperature of the run, C
 */
public record Surroundings(
    Set<Provision> offered, Set<Molecule> charged, double lowestCelsius, double highestCelsius) {
  /** Keeps unmodifiable copies. */
  public Surroundings {
    offered = Set.copyOf(offered);
    charged = Set.copyOf(charged);
  }
}
