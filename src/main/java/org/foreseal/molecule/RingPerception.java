package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * A smallest set of smallest rings. Candidate rings are the shortest paths from every ring atom
 * closed by one bond (Horton's family, SIAM J. Comput. 1987, 16, 358, from memory); the shortest
 * independent ones over the bonds are kept. In cage rings the choice among equally short rings is
 * arbitrary, as it is for every such set.
 */
final class RingPerception {
  private final Skeleton graph;
  private final boolean[] inCycle;
  private final Map<Long, Integer> bondIndex = new HashMap<>();

  private RingPerception(Skeleton graph) {
    this.graph = graph;
    this.inCycle = stripBranches(graph);
  }

  /** The rings, each as atoms in cyclic order, shortest first. */
  static int[][] rings(Skeleton graph) {
    int bonds = Arrays.stream(graph.neighbours).mapToInt(n -> n.length).sum() / 2;
    int wanted = bonds - graph.size + 1;
    return wanted <= 0 ? new int[0][] : new RingPerception(graph).smallestSet(wanted);
  }

  private static boolean[] stripBranches(Skeleton g) {
    int[] degree = new int[g.size];
    boolean[] kept = new boolean[g.size];
    Arrays.fill(kept, true);
    List<Integer> leaves = new ArrayList<>();
    for (int i = 0; i < g.size; i++) {
      degree[i] = g.neighbours[i].length;
      if (degree[i] <= 1) {
        leaves.add(i);
      }
    }
    for (int next = 0; next < leaves.size(); next++) {
      int leaf = leaves.get(next);
      kept[leaf] = false;
      for (int other : g.neighbours[leaf]) {
        if (--degree[other] == 1) {
          leaves.add(other);
        }
      }
    }
    return kept;
  }

  private int[][] smallestSet(int wanted) {
    List<int[]> candidates = candidates();
    candidates.sort(Comparator.comparingInt(r -> r.length));
    List<BitSet> basis = new ArrayList<>();
    List<int[]> rings = new ArrayList<>();
    for (int[] ring : candidates) {
      if (rings.size() == wanted) {
        break;
      }
      BitSet rest = bondSet(ring);
      for (BitSet b : basis) {
        if (rest.get(b.nextSetBit(0))) {
          rest.xor(b);
        }
      }
      if (!rest.isEmpty()) {
        basis.add(rest);
        rings.add(ring);
      }
    }
    return rings.toArray(new int[0][]);
  }

  private List<int[]> candidates() {
    List<int[]> found = new ArrayList<>();
    for (int root = 0; root < graph.size; root++) {
      if (inCycle[root]) {
        int[] parent = new int[graph.size];
        int[] distance = breadthFirst(root, parent);
        addClosures(root, parent, distance, found);
      }
    }
    return found;
  }

  private int[] breadthFirst(int root, int[] parent) {
    int[] distance = new int[graph.size];
    Arrays.fill(distance, -1);
    Arrays.fill(parent, -1);
    int[] queue = new int[graph.size];
    int head = 0;
    int tail = 0;
    queue[tail++] = root;
    distance[root] = 0;
    while (head < tail) {
      int at = queue[head++];
      for (int next : graph.neighbours[at]) {
        if (inCycle[next] && distance[next] < 0) {
          distance[next] = distance[at] + 1;
          parent[next] = at;
          queue[tail++] = next;
        }
      }
    }
    return distance;
  }

  private void addClosures(int root, int[] parent, int[] distance, List<int[]> found) {
    for (int a = 0; a < graph.size; a++) {
      for (int b : graph.neighbours[a]) {
        boolean closes =
            a < b && distance[a] >= 0 && distance[b] >= 0 && parent[a] != b && parent[b] != a;
        if (closes && Math.abs(distance[a] - distance[b]) <= 1) {
          int[] ring = join(root, a, b, parent, distance);
          if (ring.length > 0) {
            found.add(ring);
          }
        }
      }
    }
  }

  /**
   * The ring root..a-b..root, or an empty array when the two paths share an atom besides the root.
   */
  private static int[] join(int root, int a, int b, int[] parent, int[] distance) {
    int[] ring = new int[distance[a] + distance[b] + 1];
    int left = 0;
    BitSet seen = new BitSet();
    for (int at = a; at != root; at = parent[at]) {
      ring[left++] = at;
      seen.set(at);
    }
    ring[left] = root;
    int right = ring.length;
    for (int at = b; at != root; at = parent[at]) {
      if (seen.get(at)) {
        return new int[0];
      }
      ring[--right] = at;
    }
    // The ring reads a .. root .. b; the bond b-a closes it.
    return ring.length < 3 ? new int[0] : ring;
  }

  private BitSet bondSet(int[] ring) {
    BitSet set = new BitSet();
    for (int k = 0; k < ring.length; k++) {
      int a = ring[k];
      int b = ring[(k + 1) % ring.length];
      long id = (long) Math.min(a, b) * graph.size + Math.max(a, b);
      set.set(bondIndex.computeIfAbsent(id, x -> bondIndex.size()));
    }
    return set;
  }
}
