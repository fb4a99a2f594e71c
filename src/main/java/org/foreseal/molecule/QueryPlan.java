package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Predicate;

/**
 * The order in which the atoms of one connected query are placed: an anchor first, then every atom
 * next to one already placed, with the ring closures to check. Hydrogens on one atom are alike, so
 * a hydrogen of the query is placed on an atom at most once per match instead of once per hydrogen.
 */
final class QueryPlan {
  private static final int UNPLACED = Integer.MIN_VALUE;

  private final QueryGraph graph;
  private final int demanded;
  private final int[] sequence;
  private final int[] parent;
  private final QueryGraph.Bond[] parentBond;
  private final List<List<QueryGraph.Bond>> closures = new ArrayList<>();

  private QueryPlan(QueryGraph graph, int anchor) {
    this.graph = graph;
    demanded = Features.demandedBy(graph);
    int n = graph.atoms().size();
    sequence = new int[n];
    parent = new int[n];
    parentBond = new QueryGraph.Bond[n];
    order(anchor);
  }

  static QueryPlan anchoredAtFirst(QueryGraph graph) {
    return new QueryPlan(graph, 0);
  }

  /** Starts at the rarest atom: a heavy heteroatom if there is one, else any heavy atom. */
  static QueryPlan of(QueryGraph graph) {
    int best = 0;
    for (int i = 1; i < graph.atoms().size(); i++) {
      if (rarity(graph.atoms().get(i)) > rarity(graph.atoms().get(best))) {
        best = i;
      }
    }
    return new QueryPlan(graph, best);
  }

  private static int rarity(QueryGraph.Atom atom) {
    if (atom.element().isEmpty()) {
      return 1;
    }
    return switch (atom.element().getAsInt()) {
      case 1 -> 0;
      case 6 -> 2;
      default -> 3;
    };
  }

  private void order(int anchor) {
    int[] placedAt = new int[sequence.length];
    Arrays.fill(placedAt, -1);
    int count = 0;
    sequence[count] = anchor;
    placedAt[anchor] = count++;
    parent[anchor] = -1;
    closures.add(List.of());
    while (count < sequence.length) {
      QueryGraph.Bond bond = nextBond(placedAt);
      int next = placedAt[bond.from()] >= 0 ? bond.to() : bond.from();
      parent[next] = next == bond.to() ? bond.from() : bond.to();
      parentBond[next] = bond;
      closures.add(closing(next, bond, placedAt));
      sequence[count] = next;
      placedAt[next] = count++;
    }
  }

  /** A bond from a placed to an unplaced atom; bonds to heavy atoms first. */
  private QueryGraph.Bond nextBond(int[] placedAt) {
    QueryGraph.Bond hydrogenBond = null;
    for (QueryGraph.Bond bond : graph.bonds()) {
      if (placedAt[bond.from()] >= 0 != placedAt[bond.to()] >= 0) {
        int next = placedAt[bond.from()] >= 0 ? bond.to() : bond.from();
        if (!graph.atoms().get(next).isHydrogen()) {
          return bond;
        }
        hydrogenBond = bond;
      }
    }
    if (hydrogenBond == null) {
      throw new IllegalArgumentException("the pattern is in several pieces");
    }
    return hydrogenBond;
  }

  private List<QueryGraph.Bond> closing(int next, QueryGraph.Bond used, int[] placedAt) {
    return graph.bonds().stream()
        .filter(b -> !b.equals(used))
        .filter(
            b ->
                (b.from() == next && placedAt[b.to()] >= 0)
                    || (b.to() == next && placedAt[b.from()] >= 0))
        .toList();
  }

  boolean matchesAt(Molecule m, int code) {
    int[] placed = new int[sequence.length];
    Arrays.fill(placed, UNPLACED);
    return place(m, placed, 0, code, match -> true);
  }

  /** Calls {@code sink} with the codes of every match, in query order, until it answers true. */
  boolean find(Molecule m, Predicate<int[]> sink) {
    if ((demanded & ~m.features()) != 0) {
      return false;
    }
    int[] placed = new int[sequence.length];
    Arrays.fill(placed, UNPLACED);
    for (int i = 0; i < m.atomCount(); i++) {
      if (place(m, placed, 0, i, sink)) {
        return true;
      }
    }
    return false;
  }

  private boolean place(Molecule m, int[] placed, int step, int code, Predicate<int[]> sink) {
    int atom = sequence[step];
    if (!graph.atoms().get(atom).test().accepts(m, code)) {
      return false;
    }
    placed[atom] = code;
    boolean stop = closuresHold(m, placed, step) && extend(m, placed, step + 1, sink);
    placed[atom] = UNPLACED;
    return stop;
  }

  private boolean closuresHold(Molecule m, int[] placed, int step) {
    for (QueryGraph.Bond bond : closures.get(step)) {
      int a = placed[bond.from()];
      int b = placed[bond.to()];
      int slot = a < 0 || b < 0 ? -1 : m.slotOf(a, b);
      if (slot < 0 || !accepts(m, bond.test(), a, slot)) {
        return false;
      }
    }
    return true;
  }

  private static boolean accepts(Molecule m, BondTest test, int atom, int slot) {
    return test.accepts(
        m.order(atom, slot), m.isAromaticBond(atom, slot), m.isRingBond(atom, slot));
  }

  private boolean extend(Molecule m, int[] placed, int step, Predicate<int[]> sink) {
    if (step == sequence.length) {
      return sink.test(placed.clone());
    }
    int atom = sequence[step];
    int at = placed[parent[atom]];
    BondTest test = parentBond[atom].test();
    if (at < 0) {
      // A hydrogen's only neighbour is the atom it sits on; it can be reached only from an anchor
      // hydrogen.
      return !isPlaced(placed, ~at)
          && test.accepts(1, false, false)
          && place(m, placed, step, ~at, sink);
    }
    for (int k = 0; k < m.degree(at); k++) {
      int next = m.neighbour(at, k);
      if (!isPlaced(placed, next)
          && accepts(m, test, at, k)
          && place(m, placed, step, next, sink)) {
        return true;
      }
    }
    return hasFreeHydrogen(m, placed, at)
        && test.accepts(1, false, false)
        && place(m, placed, step, ~at, sink);
  }

  private static boolean isPlaced(int[] placed, int code) {
    for (int p : placed) {
      if (p == code) {
        return true;
      }
    }
    return false;
  }

  private static boolean hasFreeHydrogen(Molecule m, int[] placed, int atom) {
    int used = 0;
    for (int p : placed) {
      used += p == ~atom ? 1 : 0;
    }
    return m.hydrogens(atom) > used;
  }
}
