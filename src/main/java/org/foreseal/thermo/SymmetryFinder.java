package org.foreseal.thermo;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * Total symmetry number: 3 for every methyl times the number of graph symmetries that keep the
 * shape of every place. Non-aromatic rings count as planar on time average (cyclohexane 12).
 *
 * <p>The symmetries form a group, so their number is the product over the nodes of how many places
 * a node can go to while the earlier nodes stay (orbit and stabiliser, textbook group theory); each
 * such place needs one symmetry found by backtracking, never all of them.
 */
final class SymmetryFinder {
  private static final int MOST_TRIALS = 2_000_000;

  private final SymmetryGraph graph;
  private final ShapeConstraints shape;
  private final int[] order;
  private final int[] parent;
  private final List<List<Integer>> checksAt = new ArrayList<>();
  private final int[] map;
  private final boolean[] used;
  private int trials;

  private SymmetryFinder(SymmetryGraph graph, ShapeConstraints shape) {
    this.graph = graph;
    this.shape = shape;
    order = new int[graph.size()];
    parent = new int[graph.size()];
    map = new int[graph.size()];
    used = new boolean[graph.size()];
    walk();
    placeChecks();
  }

  /**
   * Symmetry of a molecule; empty when the search grows out of bounds, which no molecule of
   * ordinary size does.
   */
  static Optional<Symmetry> of(TypedMolecule molecule) {
    SymmetryGraph graph = new SymmetryGraph(molecule);
    ShapeConstraints shape = new ShapeConstraints(molecule, graph);
    SymmetryFinder finder = new SymmetryFinder(graph, shape);
    double number = finder.groupOrder();
    for (int i = 0; i < molecule.graph().atomCount(); i++) {
      number *= molecule.isCarbon(i) && molecule.graph().hydrogens(i) == 3 ? 3 : 1;
    }
    return finder.trials > MOST_TRIALS
        ? Optional.empty()
        : Optional.of(new Symmetry(number, 1 << shape.stereocentres()));
  }

  /** Depth-first order, so that side groups are finished before the next begins. */
  private void walk() {
    boolean[] seen = new boolean[order.length];
    int[] stack = new int[order.length * 8];
    int[] from = new int[order.length * 8];
    int top = 0;
    stack[top] = 0;
    from[top++] = -1;
    int n = 0;
    while (top > 0) {
      int at = stack[--top];
      if (!seen[at]) {
        seen[at] = true;
        parent[n] = from[top];
        order[n++] = at;
        for (int next : graph.neighbours(at)) {
          if (!seen[next]) {
            stack[top] = next;
            from[top++] = at;
          }
        }
      }
    }
  }

  private void placeChecks() {
    int[] position = new int[order.length];
    for (int p = 0; p < order.length; p++) {
      position[order[p]] = p;
      checksAt.add(new ArrayList<>());
    }
    List<int[]> scopes = shape.scopes();
    for (int c = 0; c < scopes.size(); c++) {
      int last = 0;
      for (int node : scopes.get(c)) {
        last = Math.max(last, position[node]);
      }
      checksAt.get(last).add(c);
    }
  }

  private double groupOrder() {
    double product = 1;
    for (int p = 0; p < order.length; p++) {
      product *= orbit(p);
    }
    return product;
  }

  /** How many places the node at {@code p} can go to while all earlier nodes stay. */
  private int orbit(int p) {
    int count = 1;
    for (int target = 0; target < order.length; target++) {
      if (target != order[p] && graph.classOf(target) == graph.classOf(order[p])) {
        Arrays.fill(used, false);
        for (int q = 0; q < p; q++) {
          map[order[q]] = order[q];
          used[order[q]] = true;
        }
        count += place(p, target) ? 1 : 0;
      }
    }
    return count;
  }

  /**
   * Maps the node at {@code p} to {@code target} and all later ones somewhere, if it can be done.
   */
  private boolean place(int p, int target) {
    if (used[target] || ++trials > MOST_TRIALS || !fits(p, target)) {
      return false;
    }
    map[order[p]] = target;
    used[target] = true;
    boolean possible = isShapeKept(p) && placeRest(p + 1);
    used[target] = false;
    return possible;
  }

  private boolean placeRest(int p) {
    if (p == order.length) {
      return true;
    }
    for (int target : graph.neighbours(map[parent[p]])) {
      if (graph.classOf(target) == graph.classOf(order[p]) && place(p, target)) {
        return true;
      }
    }
    return false;
  }

  private boolean fits(int p, int target) {
    int node = order[p];
    for (int q = 0; q < p; q++) {
      if (graph.bond(node, order[q]) != graph.bond(target, map[order[q]])) {
        return false;
      }
    }
    return true;
  }

  private boolean isShapeKept(int p) {
    for (int check : checksAt.get(p)) {
      if (!shape.isKept(check, map)) {
        return false;
      }
    }
    return true;
  }
}
