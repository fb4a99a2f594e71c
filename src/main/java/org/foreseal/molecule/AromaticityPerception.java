package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * Marks aromatic atoms and bonds: a ring of five to seven atoms (or the rim of two fused ones, as
 * in azulene) in which every atom offers a p orbital and the electrons number 4n + 2.
 *
 * <p>An atom with a double bond in any ring gives one electron, a carbon doubly bonded to O, N or S
 * outside the rings gives none, and a neutral singly bonded N, O or S gives its lone pair. A carbon
 * with C=C pointing out of the ring system (fulvene, quinone methide, xylylene) is not aromatic,
 * and rings of three or four atoms never are: both differ on purpose from the widespread toolkit
 * model, which calls p-xylylene and cyclopropenone aromatic.
 */
final class AromaticityPerception {
  private static final int NONE = -1;

  private final Skeleton graph;
  private final int[][] ringNeighbours;
  private final int[] electrons;

  private AromaticityPerception(Skeleton graph) {
    this.graph = graph;
    ringNeighbours = RingBonds.of(graph);
    electrons = new int[graph.size];
    for (int i = 0; i < graph.size; i++) {
      electrons[i] = ringNeighbours[i].length == 0 ? NONE : electronsOf(i);
    }
  }

  static void mark(Skeleton graph) {
    if (graph.hasRings()) {
      new AromaticityPerception(graph).run();
    }
  }

  private void run() {
    boolean[] allowed = new boolean[graph.size];
    for (int i = 0; i < graph.size; i++) {
      allowed[i] = electrons[i] != NONE;
    }
    List<int[]> rings = PlanarRings.of(ringNeighbours, allowed);
    List<int[]> others = new ArrayList<>();
    for (int[] ring : rings) {
      if (isHueckel(sum(ring))) {
        markRing(ring);
      } else {
        others.add(ring);
      }
    }
    for (int r = 0; r < others.size(); r++) {
      for (int q = r + 1; q < others.size(); q++) {
        markFusedRim(others.get(r), others.get(q));
      }
    }
  }

  private static boolean isHueckel(int count) {
    return count >= 2 && count % 4 == 2;
  }

  private int sum(int[] atoms) {
    int total = 0;
    for (int atom : atoms) {
      total += electrons[atom];
    }
    return total;
  }

  private void markRing(int[] ring) {
    for (int k = 0; k < ring.length; k++) {
      graph.aromatic[ring[k]] = true;
      graph.markAromatic(ring[k], ring[(k + 1) % ring.length]);
    }
  }

  private void markFusedRim(int[] one, int[] other) {
    Set<Integer> union = new HashSet<>();
    for (int a : one) {
      union.add(a);
    }
    int shared = 0;
    for (int a : other) {
      shared += union.add(a) ? 0 : 1;
    }
    int[] rim = union.stream().mapToInt(Integer::intValue).toArray();
    if (shared == 2 && isHueckel(sum(rim))) {
      markRimBonds(one, other);
      markRimBonds(other, one);
    }
  }

  private void markRimBonds(int[] ring, int[] without) {
    Set<Integer> shared = new HashSet<>();
    for (int a : without) {
      shared.add(a);
    }
    for (int k = 0; k < ring.length; k++) {
      int a = ring[k];
      int b = ring[(k + 1) % ring.length];
      graph.aromatic[a] = true;
      if (!(shared.contains(a) && shared.contains(b))) {
        graph.markAromatic(a, b);
      }
    }
  }

  private boolean isRingBond(int atom, int other) {
    for (int next : ringNeighbours[atom]) {
      if (next == other) {
        return true;
      }
    }
    return false;
  }

  private int electronsOf(int atom) {
    int ringDouble = 0;
    int outer = 0;
    for (int k = 0; k < graph.neighbours[atom].length; k++) {
      int other = graph.neighbours[atom][k];
      if (graph.orders[atom][k] > 2) {
        return NONE;
      }
      if (graph.orders[atom][k] == 2) {
        if (isRingBond(atom, other)) {
          ringDouble++;
        } else {
          outer = graph.element[other];
        }
      }
    }
    ChemicalElement e = ChemicalElement.require(graph.element[atom]);
    int connections = graph.neighbours[atom].length + graph.hydrogens[atom];
    return outer > 0
        ? outerElectrons(e, ringDouble, outer)
        : ringElectrons(e, graph.charge[atom], ringDouble, connections);
  }

  private static int outerElectrons(ChemicalElement e, int ringDouble, int outer) {
    boolean drawsAway =
        outer == ChemicalElement.O.atomicNumber()
            || outer == ChemicalElement.N.atomicNumber()
            || outer == ChemicalElement.S.atomicNumber();
    return e == ChemicalElement.C && ringDouble == 0 && drawsAway ? 0 : NONE;
  }

  private static int ringElectrons(ChemicalElement e, int charge, int ringDouble, int connections) {
    if (ringDouble == 1) {
      return connections <= 3 ? 1 : NONE;
    }
    if (ringDouble > 1) {
      return NONE;
    }
    return switch (e) {
      case C -> carbonIonElectrons(charge, connections);
      case N -> lonePair((charge == 0 && connections == 3) || (charge == -1 && connections == 2));
      case O, S -> lonePair(charge == 0 && connections == 2);
      default -> NONE;
    };
  }

  private static int carbonIonElectrons(int charge, int connections) {
    if (connections != 3 || charge == 0) {
      return NONE;
    }
    return charge < 0 ? 2 : 0;
  }

  private static int lonePair(boolean offered) {
    return offered ? 2 : NONE;
  }
}
