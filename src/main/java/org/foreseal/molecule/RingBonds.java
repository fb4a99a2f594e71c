package org.foreseal.molecule;

import java.util.Arrays;

/**
 * Finds the bonds that lie in a ring: those whose removal leaves the structure in one piece
 * (low-link search).
 */
final class RingBonds {
  private final Skeleton graph;
  private final int[] entered;
  private final int[] low;
  private final int[][] ringNeighbours;
  private final int[] count;
  private int clock;

  private RingBonds(Skeleton graph) {
    this.graph = graph;
    entered = new int[graph.size];
    low = new int[graph.size];
    count = new int[graph.size];
    ringNeighbours = new int[graph.size][];
    for (int i = 0; i < graph.size; i++) {
      ringNeighbours[i] = new int[graph.neighbours[i].length];
    }
  }

  /** For every atom its neighbours over ring bonds. */
  static int[][] of(Skeleton graph) {
    RingBonds search = new RingBonds(graph);
    search.visit(0, -1);
    for (int i = 0; i < graph.size; i++) {
      search.ringNeighbours[i] = Arrays.copyOf(search.ringNeighbours[i], search.count[i]);
    }
    return search.ringNeighbours;
  }

  private void visit(int atom, int from) {
    entered[atom] = ++clock;
    low[atom] = clock;
    for (int next : graph.neighbours[atom]) {
      if (next == from) {
        continue;
      }
      if (entered[next] == 0) {
        visit(next, atom);
        low[atom] = Math.min(low[atom], low[next]);
        if (low[next] <= entered[atom]) {
          add(atom, next);
        }
      } else if (entered[next] < entered[atom]) {
        low[atom] = Math.min(low[atom], entered[next]);
        add(atom, next);
      }
    }
  }

  private void add(int a, int b) {
    ringNeighbours[a][count[a]++] = b;
    ringNeighbours[b][count[b]++] = a;
  }
}
