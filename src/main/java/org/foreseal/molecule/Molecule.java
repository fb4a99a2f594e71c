package org.foreseal.molecule;

import java.util.Arrays;

/**
 * An immutable molecule in canonical atom order: hydrogens are counts on heavy atoms, double bonds
 * are localised the same way for every equal molecule, stereochemistry is not part of it. H2 and
 * the proton are one hydrogen atom with or without one hydrogen on it. Two molecules are equal
 * exactly when their {@link #key()} is equal, whatever order the atoms came in.
 *
 * <p>Atom indices run from 0 to {@link #atomCount()} - 1 in canonical order; slots of an atom run
 * over its neighbours.
 */
public final class Molecule implements Comparable<Molecule> {
  private final byte[] element;
  private final byte[] charge;
  private final byte[] hydrogens;
  private final int[][] neighbours;
  private final byte[][] orders;
  private final boolean[] aromatic;
  private final boolean[][] aromaticBond;
  private final int[][] rings;
  private final boolean[][] ringBond;
  private final String key;
  private final int features;

  /** Takes over a prepared skeleton whose atoms are in canonical order. */
  Molecule(Skeleton from, String key) {
    int n = from.size;
    element = bytes(from.element);
    charge = bytes(from.charge);
    hydrogens = bytes(from.hydrogens);
    neighbours = from.neighbours;
    orders = new byte[n][];
    aromatic = from.aromatic;
    aromaticBond = from.aromaticBond;
    ringBond = new boolean[n][];
    for (int i = 0; i < n; i++) {
      orders[i] = bytes(from.orders[i]);
      ringBond[i] = new boolean[neighbours[i].length];
    }
    rings = from.rings;
    for (int[] ring : rings) {
      markRingBonds(ring);
    }
    this.key = key;
    features = Features.of(from);
  }

  private static byte[] bytes(int[] values) {
    byte[] result = new byte[values.length];
    for (int i = 0; i < values.length; i++) {
      result[i] = (byte) values[i];
    }
    return result;
  }

  private void markRingBonds(int[] ring) {
    for (int k = 0; k < ring.length; k++) {
      int a = ring[k];
      int b = ring[(k + 1) % ring.length];
      ringBond[a][slotOf(a, b)] = true;
      ringBond[b][slotOf(b, a)] = true;
    }
  }

  /** Bits of {@link Features}. */
  int features() {
    return features;
  }

  /** Number of atoms in the graph: heavy atoms, or the one hydrogen of H2 and H+. */
  public int atomCount() {
    return element.length;
  }

  /** Number of atoms other than hydrogen. */
  public int heavyAtomCount() {
    return element[0] == 1 ? 0 : element.length;
  }

  /** Atomic number. */
  public int element(int atom) {
    return element[atom];
  }

  /** Formal charge. */
  public int charge(int atom) {
    return charge[atom];
  }

  /** Hydrogens on this atom. */
  public int hydrogens(int atom) {
    return hydrogens[atom];
  }

  /** Number of neighbours in the graph (hydrogens not counted). */
  public int degree(int atom) {
    return neighbours[atom].length;
  }

  /** The neighbour in this slot, 0 to degree - 1, in ascending order. */
  public int neighbour(int atom, int slot) {
    return neighbours[atom][slot];
  }

  /** Localised bond order 1, 2 or 3 of the bond in this slot. */
  public int order(int atom, int slot) {
    return orders[atom][slot];
  }

  /** Whether the bond in this slot is aromatic. */
  public boolean isAromaticBond(int atom, int slot) {
    return aromaticBond[atom][slot];
  }

  /** Whether the bond in this slot lies in a ring. */
  public boolean isRingBond(int atom, int slot) {
    return ringBond[atom][slot];
  }

  /** Whether the atom is aromatic. */
  public boolean isAromatic(int atom) {
    return aromatic[atom];
  }

  /** The slot of {@code atom} that leads to {@code other}, or -1 when they are not bonded. */
  public int slotOf(int atom, int other) {
    return Arrays.binarySearch(neighbours[atom], other);
  }

  /** Number of rings of the smallest set. */
  public int ringCount() {
    return rings.length;
  }

  /** Atoms of one ring of the smallest set, in cyclic order. */
  public int[] ring(int index) {
    return rings[index].clone();
  }

  /** How many rings of the smallest set hold this atom. */
  public int ringsHolding(int atom) {
    int count = 0;
    for (int[] ring : rings) {
      for (int member : ring) {
        count += member == atom ? 1 : 0;
      }
    }
    return count;
  }

  /** Size of the smallest ring that holds this atom, 0 when none does. */
  public int smallestRing(int atom) {
    int best = 0;
    for (int[] ring : rings) {
      for (int member : ring) {
        if (member == atom && (best == 0 || ring.length < best)) {
          best = ring.length;
        }
      }
    }
    return best;
  }

  /** Sum of the formal charges. */
  public int netCharge() {
    int total = 0;
    for (byte c : charge) {
      total += c;
    }
    return total;
  }

  /** Elements and their counts. */
  public Formula formula() {
    return Formula.of(this);
  }

  /**
   * The identity: equal for equal structures, whatever their atom order. Not for people to read.
   */
  public String key() {
    return key;
  }

  /** Canonical SMILES without stereochemistry. */
  public String smiles() {
    return SmilesWriter.write(this);
  }

  @Override
  public int compareTo(Molecule other) {
    int bySize = Integer.compare(atomCount(), other.atomCount());
    return bySize != 0 ? bySize : key.compareTo(other.key);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Molecule m && m.key.equals(key);
  }

  @Override
  public int hashCode() {
    return key.hashCode();
  }

  @Override
  public String toString() {
    return smiles();
  }
}
