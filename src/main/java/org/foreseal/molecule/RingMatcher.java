package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Finds every way to lay a ring parent over some atoms of a molecule. */
final class RingMatcher {
  private final Molecule m;
  private final RingParent parent;
  private final List<Integer> atoms;
  private final int[] image;
  private final boolean[] used;
  private final List<int[]> found = new ArrayList<>();

  private RingMatcher(Molecule m, RingParent parent, List<Integer> atoms) {
    this.m = m;
    this.parent = parent;
    this.atoms = atoms;
    image = new int[atoms.size()];
    used = new boolean[m.atomCount()];
  }

  /** Atom at each place of the parent's locants, one array for each way. */
  static List<int[]> numberings(Molecule m, RingParent parent, List<Integer> atoms) {
    if (parent.locants().size() != atoms.size()) {
      return List.of();
    }
    RingMatcher matcher = new RingMatcher(m, parent, atoms);
    matcher.place(0);
    return matcher.found;
  }

  private void place(int next) {
    if (next == image.length) {
      found.add(Arrays.copyOf(image, next));
      return;
    }
    for (int atom : atoms) {
      if (!used[atom] && fits(next, atom)) {
        used[atom] = true;
        image[next] = atom;
        place(next + 1);
        used[atom] = false;
      }
    }
  }

  private boolean fits(int next, int atom) {
    Molecule p = parent.structure();
    int model = parent.order().get(next);
    boolean alike =
        p.element(model) == m.element(atom)
            && p.charge(model) == m.charge(atom)
            && p.isAromatic(model) == m.isAromatic(atom)
            && outward(atom) + m.hydrogens(atom) == p.hydrogens(model);
    for (int i = 0; alike && i < next; i++) {
      alike = code(p, model, parent.order().get(i)) == code(m, atom, image[i]);
    }
    return alike;
  }

  /** Bonds that leave the ring; a double one takes the place of two hydrogens of the parent. */
  private int outward(int atom) {
    int total = 0;
    for (int k = 0; k < m.degree(atom); k++) {
      total += atoms.contains(m.neighbour(atom, k)) ? 0 : m.order(atom, k);
    }
    return total;
  }

  private static int code(Molecule m, int a, int b) {
    int slot = m.slotOf(a, b);
    if (slot < 0) {
      return 0;
    }
    return m.isAromaticBond(a, slot) ? MoleculeBuilder.AROMATIC : m.order(a, slot);
  }
}
