package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Canonical atom order of a connected graph: colour refinement by neighbourhood, then a search over
 * the members of a tied class. Every leaf of the search is encoded and the smallest encoding wins;
 * members that an already found symmetry of the graph maps onto each other are tried once. Exact,
 * not heuristic: hashes only order the classes.
 */
final class CanonicalOrder {
  private final Skeleton graph;
  private final List<int[]> symmetries = new ArrayList<>();
  private int[] bestRank = new int[0];
  private int[] bestCode = new int[0];
  private int distinct;

  private CanonicalOrder(Skeleton graph) {
    this.graph = graph;
  }

  /** {@code result[atom]} is the canonical position of that atom. */
  static int[] ranks(Skeleton graph) {
    CanonicalOrder order = new CanonicalOrder(graph);
    long[] value = new long[graph.size];
    for (int i = 0; i < graph.size; i++) {
      int atom =
          graph.element[i] << 16
              | (graph.charge[i] + 8) << 12
              | graph.hydrogens[i] << 8
              | graph.neighbours[i].length << 1
              | (graph.aromatic[i] ? 1 : 0);
      value[i] = (long) atom << 32 | order.remoteness(i);
    }
    order.search(order.refine(order.classes(value)), new ArrayList<>());
    return order.bestRank;
  }

  /**
   * Sum of the squared distances to all atoms: tells the places along a chain apart at once, where
   * refinement alone would need a round for every bond.
   */
  private int remoteness(int start) {
    int[] distance = new int[graph.size];
    Arrays.fill(distance, -1);
    int[] queue = new int[graph.size];
    int tail = 0;
    queue[tail++] = start;
    distance[start] = 0;
    int sum = 0;
    for (int head = 0; head < tail; head++) {
      int at = queue[head];
      sum += distance[at] * distance[at];
      for (int next : graph.neighbours[at]) {
        if (distance[next] < 0) {
          distance[next] = distance[at] + 1;
          queue[tail++] = next;
        }
      }
    }
    return sum;
  }

  private static long mix(long x) {
    long y = (x ^ (x >>> 32)) * 0xd6e8feb86659fd93L;
    return y ^ (y >>> 29);
  }

  /** Class of an atom = number of atoms with a smaller value. */
  private int[] classes(long[] value) {
    long[] sorted = value.clone();
    Arrays.sort(sorted);
    distinct = 0;
    long[] first = new long[value.length];
    int[] start = new int[value.length];
    for (int i = 0; i < sorted.length; i++) {
      if (i == 0 || sorted[i] != sorted[i - 1]) {
        first[distinct] = sorted[i];
        start[distinct++] = i;
      }
    }
    int[] result = new int[value.length];
    for (int i = 0; i < value.length; i++) {
      result[i] = start[Arrays.binarySearch(first, 0, distinct, value[i])];
    }
    return result;
  }

  private int[] refine(int[] begin) {
    int[] colour = begin;
    int count = distinct(begin);
    while (count < graph.size) {
      int[] next = classes(neighbourhoods(colour));
      if (distinct == count) {
        return next;
      }
      colour = next;
      count = distinct;
    }
    return colour;
  }

  private long[] neighbourhoods(int[] colour) {
    long[] value = new long[graph.size];
    for (int i = 0; i < graph.size; i++) {
      long sum = 0;
      for (int k = 0; k < graph.neighbours[i].length; k++) {
        sum += mix((colour[graph.neighbours[i][k]] + 1L) * 1048583L + graph.bondCode(i, k) * 7919L);
      }
      value[i] = ((long) colour[i] << 48) | (mix(sum) >>> 16);
    }
    return value;
  }

  private static int distinct(int[] colour) {
    long[] seen = new long[colour.length / 64 + 1];
    int count = 0;
    for (int c : colour) {
      count += (seen[c >> 6] >> c & 1) == 0 ? 1 : 0;
      seen[c >> 6] |= 1L << c;
    }
    return count;
  }

  private void search(int[] colour, List<Integer> fixed) {
    List<Integer> cell = firstTiedCell(colour);
    if (cell.isEmpty()) {
      leaf(colour);
      return;
    }
    List<Integer> tried = new ArrayList<>();
    for (int member : cell) {
      if (!mapsOntoTried(member, tried, fixed)) {
        tried.add(member);
        fixed.add(member);
        search(refine(individualise(colour, member)), fixed);
        fixed.remove(fixed.size() - 1);
      }
    }
  }

  private List<Integer> firstTiedCell(int[] colour) {
    int[] first = new int[colour.length];
    Arrays.fill(first, -1);
    int tied = Integer.MAX_VALUE;
    for (int i = 0; i < colour.length; i++) {
      if (first[colour[i]] >= 0) {
        tied = Math.min(tied, colour[i]);
      }
      first[colour[i]] = i;
    }
    List<Integer> cell = new ArrayList<>();
    for (int i = 0; i < colour.length && tied < colour.length; i++) {
      if (colour[i] == tied) {
        cell.add(i);
      }
    }
    return cell;
  }

  /** The chosen atom keeps its class number, the others of its class move up by one. */
  private static int[] individualise(int[] colour, int chosen) {
    int[] result = colour.clone();
    for (int i = 0; i < colour.length; i++) {
      result[i] += i != chosen && colour[i] == colour[chosen] ? 1 : 0;
    }
    return result;
  }

  private boolean mapsOntoTried(int member, List<Integer> tried, List<Integer> fixed) {
    if (tried.isEmpty()) {
      return false;
    }
    int[] orbit = new int[graph.size];
    Arrays.setAll(orbit, i -> i);
    for (int[] symmetry : symmetries) {
      if (fixed.stream().allMatch(f -> symmetry[f] == f)) {
        for (int i = 0; i < symmetry.length; i++) {
          unite(orbit, i, symmetry[i]);
        }
      }
    }
    return tried.stream().anyMatch(t -> root(orbit, t) == root(orbit, member));
  }

  private static int root(int[] orbit, int i) {
    int at = i;
    while (orbit[at] != at) {
      at = orbit[at];
    }
    return at;
  }

  private static void unite(int[] orbit, int a, int b) {
    orbit[root(orbit, a)] = root(orbit, b);
  }

  private void leaf(int[] rank) {
    int[] code = encode(rank);
    int order = bestCode.length == 0 ? -1 : Arrays.compare(code, bestCode);
    if (order == 0) {
      int[] inverse = new int[rank.length];
      for (int i = 0; i < rank.length; i++) {
        inverse[bestRank[i]] = i;
      }
      int[] symmetry = new int[rank.length];
      Arrays.setAll(symmetry, i -> inverse[rank[i]]);
      symmetries.add(symmetry);
    } else if (order < 0) {
      bestCode = code;
      bestRank = rank;
    }
  }

  /**
   * Bonds of the atoms in rank order, each to lower ranks only; enough to tell two labellings
   * apart.
   */
  private int[] encode(int[] rank) {
    int[] atomAt = new int[rank.length];
    for (int i = 0; i < rank.length; i++) {
      atomAt[rank[i]] = i;
    }
    int[] code =
        new int[rank.length + Arrays.stream(graph.neighbours).mapToInt(n -> n.length).sum()];
    int p = 0;
    for (int q = 0; q < rank.length; q++) {
      int atom = atomAt[q];
      int start = p;
      for (int k = 0; k < graph.neighbours[atom].length; k++) {
        int other = rank[graph.neighbours[atom][k]];
        if (other < q) {
          code[p++] = other << 3 | graph.bondCode(atom, k);
        }
      }
      Arrays.sort(code, start, p);
      code[p++] = Integer.MAX_VALUE;
    }
    return Arrays.copyOf(code, p);
  }
}
