package org.foreseal.thermo;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.foreseal.molecule.Molecule;

/**
 * The graph whose symmetries count: the heavy atoms and the two hydrogens of every terminal =CH2,
 * with classes of atoms that no symmetry can exchange, and the places whose shape a symmetry must
 * keep. Neighbours are sorted by class, then by index, so that like places are oriented alike.
 */
final class SymmetryGraph {
  private final TypedMolecule molecule;
  private final int size;
  private final int[][] neighbours;
  private final int[][] bonds;
  private int[] classes;

  SymmetryGraph(TypedMolecule molecule) {
    this.molecule = molecule;
    Molecule graph = molecule.graph();
    List<Integer> ends = new ArrayList<>();
    for (int i = 0; i < graph.atomCount(); i++) {
      if (graph.hydrogens(i) == 2 && isDoublyBondedCarbon(molecule.type(i))) {
        ends.add(i);
      }
    }
    size = graph.atomCount() + 2 * ends.size();
    neighbours = new int[size][];
    bonds = new int[size][];
    copyBonds(graph);
    for (int e = 0; e < ends.size(); e++) {
      addHydrogen(ends.get(e), graph.atomCount() + 2 * e);
      addHydrogen(ends.get(e), graph.atomCount() + 2 * e + 1);
    }
    classes = refine(firstClasses(graph));
    sortNeighbours();
  }

  private static boolean isDoublyBondedCarbon(AtomType type) {
    return switch (type) {
      case ALKENE, CARBONYL, THIOCARBONYL, IMINE_CARBON -> true;
      default -> false;
    };
  }

  private void copyBonds(Molecule graph) {
    for (int i = 0; i < graph.atomCount(); i++) {
      neighbours[i] = molecule.neighbours(i);
      bonds[i] = new int[neighbours[i].length];
      for (int k = 0; k < bonds[i].length; k++) {
        bonds[i][k] = graph.isAromaticBond(i, k) ? 4 : graph.order(i, k);
      }
    }
  }

  private void addHydrogen(int carbon, int hydrogen) {
    int d = neighbours[carbon].length;
    neighbours[carbon] = Arrays.copyOf(neighbours[carbon], d + 1);
    bonds[carbon] = Arrays.copyOf(bonds[carbon], d + 1);
    neighbours[carbon][d] = hydrogen;
    bonds[carbon][d] = 1;
    neighbours[hydrogen] = new int[] {carbon};
    bonds[hydrogen] = new int[] {1};
  }

  private int[] firstClasses(Molecule graph) {
    long[] keys = new long[size];
    for (int i = 0; i < size; i++) {
      keys[i] =
          i < graph.atomCount()
              ? graph.element(i) * 1000L + graph.hydrogens(i) * 10L + graph.degree(i)
              : 0;
    }
    return ranks(keys);
  }

  private static int[] ranks(long[] keys) {
    long[] sorted = Arrays.stream(keys).distinct().sorted().toArray();
    return Arrays.stream(keys).mapToInt(k -> Arrays.binarySearch(sorted, k)).toArray();
  }

  /** Splits classes by the classes around, until nothing changes. */
  private int[] refine(int[] start) {
    int[] now = start;
    int count = distinct(now);
    while (true) {
      int[] old = now;
      List<List<Integer>> keys = new ArrayList<>();
      for (int i = 0; i < size; i++) {
        keys.add(signature(i, old));
      }
      List<List<Integer>> sorted = keys.stream().distinct().sorted(SymmetryGraph::compare).toList();
      now = keys.stream().mapToInt(sorted::indexOf).toArray();
      if (sorted.size() == count) {
        return now;
      }
      count = sorted.size();
    }
  }

  private List<Integer> signature(int atom, int[] old) {
    List<Integer> key = new ArrayList<>();
    key.add(old[atom]);
    IntStream.range(0, neighbours[atom].length)
        .map(k -> old[neighbours[atom][k]] * 8 + bonds[atom][k])
        .sorted()
        .forEach(key::add);
    return key;
  }

  private static int compare(List<Integer> a, List<Integer> b) {
    for (int k = 0; k < Math.min(a.size(), b.size()); k++) {
      int difference = Integer.compare(a.get(k), b.get(k));
      if (difference != 0) {
        return difference;
      }
    }
    return Integer.compare(a.size(), b.size());
  }

  private static int distinct(int[] values) {
    return (int) Arrays.stream(values).distinct().count();
  }

  private void sortNeighbours() {
    for (int i = 0; i < size; i++) {
      int atom = i;
      int[] order =
          IntStream.range(0, neighbours[i].length)
              .boxed()
              .sorted(
                  (x, y) -> {
                    int byClass =
                        Integer.compare(classes[neighbours[atom][x]], classes[neighbours[atom][y]]);
                    return byClass != 0
                        ? byClass
                        : Integer.compare(neighbours[atom][x], neighbours[atom][y]);
                  })
              .mapToInt(Integer::intValue)
              .toArray();
      neighbours[i] = Arrays.stream(order).map(k -> neighbours[atom][k]).toArray();
      bonds[i] = Arrays.stream(order).map(k -> bonds[atom][k]).toArray();
    }
  }

  int size() {
    return size;
  }

  int classOf(int node) {
    return classes[node];
  }

  int[] neighbours(int node) {
    return neighbours[node];
  }

  /** Kind of the bond between two nodes, 0 when there is none. */
  int bond(int a, int b) {
    for (int k = 0; k < neighbours[a].length; k++) {
      if (neighbours[a][k] == b) {
        return bonds[a][k];
      }
    }
    return 0;
  }

  /** Whether all neighbours of a node are of different classes. */
  boolean hasDistinctNeighbours(int node) {
    return Arrays.stream(neighbours[node]).map(n -> classes[n]).distinct().count()
        == neighbours[node].length;
  }
}
