package org.foreseal.thermo;

import java.util.BitSet;

/** Atoms of one ring in cyclic order, with fast membership. Not changed after it is made. */
final class Ring {
  private final int[] atoms;
  private final BitSet members = new BitSet();

  Ring(int[] atoms) {
    this.atoms = atoms.clone();
    for (int atom : atoms) {
      members.set(atom);
    }
  }

  int size() {
    return atoms.length;
  }

  /** Atom at this place, counted around the ring. */
  int atom(int place) {
    return atoms[place % atoms.length];
  }

  boolean holds(int atom) {
    return members.get(atom);
  }

  BitSet members() {
    return members;
  }

  int shared(Ring other) {
    BitSet both = (BitSet) members.clone();
    both.and(other.members);
    return both.cardinality();
  }
}
