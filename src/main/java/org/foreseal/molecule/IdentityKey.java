package org.foreseal.molecule;

/**
 * Writes the canonical graph as a short string: element, charge, hydrogens and aromaticity of every
 * atom in canonical order, then the bonds of each atom to lower positions. The graph can be read
 * back from it, so two different graphs can never share a key.
 */
final class IdentityKey {
  private IdentityKey() {}

  static String of(Skeleton canonical) {
    StringBuilder key = new StringBuilder(canonical.size * 4);
    for (int i = 0; i < canonical.size; i++) {
      key.append((char) canonical.element[i]);
      key.append(
          (char)
              ((canonical.charge[i] + 8) << 4
                  | canonical.hydrogens[i] << 1
                  | (canonical.aromatic[i] ? 1 : 0)));
    }
    for (int i = 1; i < canonical.size; i++) {
      int lower = 0;
      while (lower < canonical.neighbours[i].length && canonical.neighbours[i][lower] < i) {
        lower++;
      }
      key.append((char) lower);
      for (int k = 0; k < lower; k++) {
        key.append((char) (canonical.neighbours[i][k] << 3 | canonical.bondCode(i, k)));
      }
    }
    return key.toString();
  }
}
