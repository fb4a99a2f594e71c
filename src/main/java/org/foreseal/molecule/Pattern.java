package org.foreseal.molecule;

import java.util.BitSet;
import java.util.HashSet;
import java.util.Set;

/**
 * A compiled SMARTS for asking whether and how often a molecule holds a structural feature. The
 * pattern is one connected piece; {@code [H]} is a hydrogen atom.
 */
public final class Pattern {
  private final String smarts;
  private final QueryPlan plan;

  private Pattern(String smarts, QueryPlan plan) {
    this.smarts = smarts;
    this.plan = plan;
  }

  /**
   * Compiles a SMARTS.
   *
   * @throws IllegalArgumentException when it does not parse or uses an unsupported primitive
   */
  public static Pattern of(String smarts) {
    return new Pattern(smarts, QueryPlan.of(QueryCompiler.compile(smarts)));
  }

  /** Whether the molecule holds the pattern. */
  public boolean isIn(Molecule molecule) {
    return plan.find(molecule, match -> true);
  }

  /** In how many different sets of heavy atoms the pattern is found. */
  public int count(Molecule molecule) {
    Set<BitSet> found = new HashSet<>();
    plan.find(
        molecule,
        match -> {
          BitSet atoms = new BitSet();
          for (int code : match) {
            if (code >= 0) {
              atoms.set(code);
            }
          }
          found.add(atoms);
          return false;
        });
    return found.size();
  }

  @Override
  public String toString() {
    return smarts;
  }
}
