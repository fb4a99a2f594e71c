package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Every ring of five to seven atoms without a chord whose atoms all offer a p orbital. Unlike a
 * smallest set of rings this list does not depend on the order of the atoms, also where rings of
 * equal size overlap in a cage.
 */
final class PlanarRings {
  private static final int SMALLEST = 5;
  private static final int LARGEST = 7;

  private final int[][] ringNeighbours;
  private final boolean[] allowed;
  private final List<int[]> found = new ArrayList<>();
  private final int[] path = new int[LARGEST];
  private final boolean[] onPath;

  private PlanarRings(int[][] ringNeighbours, boolean[] allowed) {
    this.ringNeighbours = ringNeighbours;
    this.allowed = allowed;
    onPath = new boolean[allowed.length];
  }

  /** Each ring once, as atoms in cyclic order beginning with the lowest. */
  static List<int[]> of(int[][] ringNeighbours, boolean[] allowed) {
    PlanarRings search = new PlanarRings(ringNeighbours, allowed);
    for (int start = 0; start < allowed.length; start++) {
      if (allowed[start]) {
        search.extend(start, 0);
      }
    }
    return search.found;
  }

  private void extend(int atom, int length) {
    path[length] = atom;
    onPath[atom] = true;
    int size = length + 1;
    for (int next : ringNeighbours[atom]) {
      if (next == path[0] && size >= SMALLEST && path[1] < atom && !hasChord(size)) {
        found.add(Arrays.copyOf(path, size));
      } else if (size < LARGEST && next > path[0] && allowed[next] && !onPath[next]) {
        extend(next, size);
      }
    }
    onPath[atom] = false;
  }

  private boolean hasChord(int size) {
    for (int i = 0; i < size; i++) {
      int onRing = 0;
      for (int next : ringNeighbours[path[i]]) {
        onRing += onPath[next] ? 1 : 0;
      }
      if (onRing > 2) {
        return true;
      }
    }
    return false;
  }
}
