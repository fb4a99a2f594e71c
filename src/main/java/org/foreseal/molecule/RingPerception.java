package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.BitSet;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * A smallest set of smallest rings. Bonds that lie in no ring are taken out first; what remains
 * falls into ring systems. A system with as many bonds as atoms is one ring. In the others
 * candidate rings are the shortest paths from every atom closed by one bond (Horton's family, SIAM
 * J. Comput. 1987, 16, 358, from memory) and the shortest independent ones over the bonds are kept.
 * In cages the choice among equally short rings is arbitrary, as it is for every such set.
 */
final class RingPerception {
  private final Skeleton graph;
  private final int[][] ringNeighbours;
  private final List<int[]> rings = new ArrayList<>();

  private RingPerception(Skeleton graph) {
    this.graph = graph;
    this.ringNeighbours = RingBonds.of(graph);
  }

  /** The rings, each as atoms in cyclic order, shortest first. */
  static int[][] rings(Skeleton graph) {
    RingPerception perception = new RingPerception(graph);
    perception.findSystems();
    perception.rings.sort(Comparator.comparingInt(r -> r.length));
    return perception.rings.toArray(new int[0][]);
  }

  private void findSystems() {
    boolean[] seen = new boolean[graph.size];
    for (int start = 0; start < graph.size; start++) {
      if (!seen[start] && ringNeighbours[start].length > 0) {
        int[] system = system(start, seen);
        int bonds = 0;
        for (int atom : system) {
          bonds += ringNeighbours[atom].length;
        }
        int wanted = bonds / 2 - system.length + 1;
        if (wanted == 1) {
          rings.add(walk(start, system.length));
        } else {
          addSmallestSet(system, wanted);
        }
      }
    }
  }

  private int[] system(int start, boolean[] seen) {
    int[] queue = new int[graph.size];
    int tail = 0;
    queue[tail++] = start;
    seen[start] = true;
    for (int head = 0; head < tail; head++) {
      for (int next : ringNeighbours[queue[head]]) {
        if (!seen[next]) {
          seen[next] = true;
          queue[tail++] = next;
        }
      }
    }
    return Arrays.copyOf(queue, tail);
  }

  private int[] walk(int start, int length) {
    int[] ring = new int[length];
    int before = -1;
    int at = start;
    for (int i = 0; i < length; i++) {
      ring[i] = at;
      int next = ringNeighbours[at][0] == before ? ringNeighbours[at][1] : ringNeighbours[at][0];
      before = at;
      at = next;
    }
    return ring;
  }

  private void addSmallestSet(int[] system, int wanted) {
    List<int[]> candidates = new ArrayList<>();
    for (int root : system) {
      addCandidates(root, system, candidates);
    }
    candidates.sort(Comparator.comparingInt(r -> r.length));
    Map<Long, Integer> bondIndex = new HashMap<>();
    List<BitSet> basis = new ArrayList<>();
    for (int[] ring : candidates) {
      BitSet rest = bondSet(ring, bondIndex);
      for (BitSet b : basis) {
        if (rest.get(b.nextSetBit(0))) {
          rest.xor(b);
        }
      }
      if (!rest.isEmpty()) {
        basis.add(rest);
        rings.add(ring);
      }
      if (basis.size() == wanted) {
        return;
      }
    }
  }

  private void addCandidates(int root, int[] system, List<int[]> found) {
    int[] parent = new int[graph.size];
    int[] distance = breadthFirst(root, parent);
    for (int a : system) {
      for (int b : ringNeighbours[a]) {
        boolean closes = a < b && parent[a] != b && parent[b] != a;
        if (closes && Math.abs(distance[a] - distance[b]) <= 1) {
          int[] ring = join(root, a, b, parent, distance);
          if (ring.length > 2) {
            found.add(ring);
          }
        }
      }
    }
  }

  private int[] breadthFirst(int root, int[] parent) {
    int[] distance = new int[graph.size];
    Arrays.fill(distance, -1);
    Arrays.fill(parent, -1);
    int[] queue = new int[graph.size];
    int tail = 0;
    queue[tail++] = root;
    distance[root] = 0;
    for (int head = 0; head < tail; head++) {
      int at = queue[head];
      for (int next : ringNeighbours[at]) {
        if (distance[next] < 0) {
          distance[next] = distance[at] + 1;
          parent[next] = at;
          queue[tail++] = next;
        }
      }
    }
    return distance;
  }

  /**
   * The ring that reads a .. root .. b, or an empty array when the two paths share an atom besides
   * the root.
   */
  private static int[] join(int root, int a, int b, int[] parent, int[] distance) {
    int[] ring = new int[distance[a] + distance[b] + 1];
    int left = 0;
    long[] seen = new long[parent.length / 64 + 1];
    for (int at = a; at != root; at = parent[at]) {
      ring[left++] = at;
      seen[at >> 6] |= 1L << at;
    }
    ring[left] = root;
    int right = ring.length;
    for (int at = b; at != root; at = parent[at]) {
      if ((seen[at >> 6] >> at & 1) == 1) {
        return new int[0];
      }
      ring[--right] = at;
    }
    return ring;
  }

  private BitSet bondSet(int[] ring, Map<Long, Integer> bondIndex) {
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
