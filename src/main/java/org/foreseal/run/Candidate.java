package org.foreseal.run;

import java.util.List;
import org.foreseal.chromatography.WhereFound;
import org.foreseal.molecule.Molecule;

/**
 * One species to look for.
 *
 * @param rank place in the list from 1; substrates have rank 0
 * @param name a name a chemist would say, or the formula
 * @param molecule the structure
 * @param isSubstrate whether it was charged as a substrate
 * @param isOrganic whether it holds carbon and is not one of the C1 gases
 * @param score the ranking score, 0 to 1, dimensionless
 * @param whereFound where it is after the work-up
 * @param gcVisible whether it passes the column underivatized and gives a detector signal
 * @param depth number of steps from the charge
 * @param needs what the best route needs beyond heat and the medium, in plain words
 * @param cautions short safety remarks
 * @param routes best routes first
 */
public record Candidate(
    int rank,
    String name,
    Molecule molecule,
    boolean isSubstrate,
    boolean isOrganic,
    double score,
    WhereFound whereFound,
    boolean gcVisible,
    int depth,
    List<String> needs,
    List<String> cautions,
    List<ForecastRoute> routes) {
  /** Keeps unmodifiable copies. */
  public Candidate {
    needs = List.copyOf(needs);
    cautions = List.copyOf(cautions);
    routes = List.copyOf(routes);
  }
}
