package org.foreseal.run;

import org.foreseal.molecule.Molecule;
import org.foreseal.network.Route;
import org.foreseal.network.Step;

/** Orders candidates. Replaced by the expected amounts once the rates of the steps are known. */
interface Ranking {
  /** How readily a step runs in this run, above 0 and at most 1. */
  double stepScore(Step step);

  /** Score of a candidate from its best route, 0 to 1. */
  double candidateScore(Molecule molecule, Route best);
}
