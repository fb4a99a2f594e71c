package org.foreseal.molecule;

import java.util.function.Predicate;

/** One reactant pattern of a transformation, with the map index of each of its atoms. */
final class ReactantPiece {
  private final QueryPlan plan;
  private final int[] mapOf;

  ReactantPiece(QueryPlan plan, int[] mapOf) {
    this.plan = plan;
    this.mapOf = mapOf;
  }

  int mapOf(int queryAtom) {
    return mapOf[queryAtom];
  }

  boolean find(Molecule molecule, Predicate<int[]> sink) {
    return plan.find(molecule, sink);
  }
}
