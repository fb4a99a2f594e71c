package org.foreseal.network;

import java.util.List;
import org.foreseal.molecule.Molecule;

/** Judges a balanced step before it enters the network. Called from several threads. */
@FunctionalInterface
public interface StepPruner {
  /** Keeps every step. */
  StepPruner NONE = (reactants, products) -> Verdict.KEPT;

  /** Whether the step may stay. */
  Verdict judge(List<Molecule> reactants, List<Molecule> products);
}
