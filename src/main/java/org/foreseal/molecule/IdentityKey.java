package org.foreseal.molecule;

import java.util.Arrays;

/**
 * Writes the canonical graph as a short string: element, charge, hydrogens and aromaticity of every
 * atom in canonical order, then the bonds of each atom to lower positions. The graph can be read
 * back from it, so two different graphs can never share a key.
 */
final class IdentityKey {
  private IdentityKey() {}

  static String of(Skeleton s, int[] rank) {
    int[] atomAt = new int[s.size];
    for (int i = 0; i < s.size; i++) {
      atomAt[rank[i]] = i;
    }
    StringBuilder key = new StringBuilder(s.size * 4);
    for (int atom : atomAt) {
      key.append((char) s.element[atom]);
      key.append(
          (char) ((s.charge[atom] + 8) << 4 | s.hydrogens[atom] << 1 | (s.aromatic[atom] ? 1 : 0)));
    }
    for (int q = 1; q < s.size; q++) {
      int atom = atomAt[q];
      int[] lower = new int[s.neighbours[atom].length];
      int count = 0;
      for (int k = 0; k < lower.length; k++) {
        int other = rank[s.neighbours[atom][k]];
        if (other < q) {
          lower[count++] = other << 3 | s.bondCode(atom, k);
        }
      }
      Arrays.sort(lower, 0, count);
      key.append((char) count);
      for (int k = 0; k < count; k++) {
        key.append((char) lower[k]);
      }
    }
    return key.toString();
  }
}
