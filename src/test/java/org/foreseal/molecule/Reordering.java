package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;

/** Builds a molecule again from its atoms in a random order. */
final class Reordering {
  private final Random random;

  Reordering(Random random) {
    this.random = random;
  }

  /** Aromatic bonds are handed over as open or as the localised ones, by chance. */
  Molecule of(Molecule m) throws ImpossibleStructureException {
    List<Integer> order = new ArrayList<>();
    for (int i = 0; i < m.atomCount(); i++) {
      order.add(i);
    }
    Collections.shuffle(order, random);
    boolean open = random.nextBoolean();
    MoleculeBuilder builder = new MoleculeBuilder();
    int[] index = new int[m.atomCount()];
    for (int atom : order) {
      index[atom] = builder.addAtom(m.element(atom), m.charge(atom), m.hydrogens(atom));
    }
    Collections.shuffle(order, random);
    for (int atom : order) {
      for (int k = 0; k < m.degree(atom); k++) {
        int bond = open && m.isAromaticBond(atom, k) ? MoleculeBuilder.AROMATIC : m.order(atom, k);
        builder.setOrder(index[atom], index[m.neighbour(atom, k)], bond);
      }
    }
    return builder.build().get(0).molecule();
  }
}
