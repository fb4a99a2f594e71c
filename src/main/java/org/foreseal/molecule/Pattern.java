package org.foreseal.molecule;

import java.util.BitSet;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Predicate;

/**
 * A compiled SMARTS for asking whether and how often a molecule holds a structural feature. The
 * pieces of a pattern with dots are found on different atoms; {@code [H]} is a hydrogen atom.
 */
public final class Pattern {
  private final String smarts;
  private final List<QueryPlan> plans;

  private Pattern(String smarts, List<QueryPlan> plans) {
    this.smarts = smarts;
    this.plans = plans;
  }

  /**
   * Compiles a SMARTS.
   *
   * @throws IllegalArgumentException when it does not parse or uses an unsupported primitive
   */
  public static Pattern of(String smarts) {
    return new Pattern(
        smarts,
        SmartsPieces.split(smarts).stream()
            .map(p -> QueryPlan.of(QueryCompiler.compile(p)))
            .toList());
  }

  /** Whether the molecule holds the pattern. */
  public boolean isIn(Molecule molecule) {
    return find(molecule, 0, new BitSet(), atoms -> true);
  }

  /** In how many different sets of heavy atoms the pattern is found. */
  public int count(Molecule molecule) {
    Set<BitSet> found = new HashSet<>();
    find(
        molecule,
        0,
        new BitSet(),
        atoms -> {
          found.add(atoms);
          return false;
        });
    return found.size();
  }

  private boolean find(Molecule molecule, int piece, BitSet used, Predicate<BitSet> sink) {
    if (piece == plans.size()) {
      return sink.test(used);
    }
    return plans
        .get(piece)
        .find(
            molecule,
            match -> {
              BitSet atoms = heavyAtoms(match);
              boolean overlaps = atoms.intersects(used);
              atoms.or(used);
              return !overlaps && find(molecule, piece + 1, atoms, sink);
            });
  }

  private static BitSet heavyAtoms(int[] match) {
    BitSet atoms = new BitSet();
    for (int code : match) {
      if (code >= 0) {
        atoms.set(code);
      }
    }
    return atoms;
  }

  @Override
  public String toString() {
    return smarts;
  }
}
