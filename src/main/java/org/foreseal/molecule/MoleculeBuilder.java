package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A molecule under construction: atoms with hydrogen counts, bonds with orders, in any number of
 * pieces. {@link #build()} checks valences, finds rings and aromaticity, turns enols into ketones
 * and returns every piece as a canonical {@link Molecule}.
 */
public final class MoleculeBuilder {
  /** Bond order of an aromatic bond whose single or double character is still open. */
  public static final int AROMATIC = 4;

  private int size;
  private int[] element = new int[16];
  private int[] charge = new int[16];
  private int[] hydrogens = new int[16];
  private int[] degree = new int[16];
  private int[][] neighbours = new int[16][4];
  private int[][] orders = new int[16][4];
  private boolean[][] aromatic = new boolean[16][4];
  private boolean aromaticBondsEdited;

  /** Adds an atom and returns its index. */
  public int addAtom(int atomicNumber, int formalCharge, int hydrogenCount) {
    if (size == element.length) {
      grow();
    }
    element[size] = atomicNumber;
    charge[size] = formalCharge;
    hydrogens[size] = hydrogenCount;
    degree[size] = 0;
    return size++;
  }

  private void grow() {
    int capacity = size * 2;
    element = Arrays.copyOf(element, capacity);
    charge = Arrays.copyOf(charge, capacity);
    hydrogens = Arrays.copyOf(hydrogens, capacity);
    degree = Arrays.copyOf(degree, capacity);
    neighbours = Arrays.copyOf(neighbours, capacity);
    orders = Arrays.copyOf(orders, capacity);
    aromatic = Arrays.copyOf(aromatic, capacity);
    for (int i = size; i < capacity; i++) {
      neighbours[i] = new int[4];
      orders[i] = new int[4];
      aromatic[i] = new boolean[4];
    }
  }

  /** Adds a copy of a molecule and returns the index of its first atom. */
  public int append(Molecule molecule) {
    int offset = size;
    for (int i = 0; i < molecule.atomCount(); i++) {
      addAtom(molecule.element(i), molecule.charge(i), molecule.hydrogens(i));
    }
    for (int i = 0; i < molecule.atomCount(); i++) {
      for (int k = 0; k < molecule.degree(i); k++) {
        link(
            offset + i,
            offset + molecule.neighbour(i, k),
            molecule.order(i, k),
            molecule.isAromaticBond(i, k));
      }
    }
    return offset;
  }

  private void link(int from, int to, int order, boolean isAromatic) {
    int k = degree[from]++;
    if (k == neighbours[from].length) {
      neighbours[from] = Arrays.copyOf(neighbours[from], k * 2);
      orders[from] = Arrays.copyOf(orders[from], k * 2);
      aromatic[from] = Arrays.copyOf(aromatic[from], k * 2);
    }
    neighbours[from][k] = to;
    orders[from][k] = order;
    aromatic[from][k] = isAromatic;
  }

  /** Number of atoms, removed ones included. */
  public int atomCount() {
    return size;
  }

  /** Hydrogens on this atom now. */
  public int hydrogens(int atom) {
    return hydrogens[atom];
  }

  /** Adds hydrogens to an atom, or takes them away. */
  public void changeHydrogens(int atom, int by) {
    hydrogens[atom] += by;
  }

  /** Sets the formal charge of an atom. */
  public void setCharge(int atom, int formalCharge) {
    charge[atom] = formalCharge;
  }

  /** Takes an atom out; it must have no bonds left. */
  public void removeAtom(int atom) {
    if (degree[atom] > 0) {
      throw new IllegalStateException("atom " + atom + " still has bonds");
    }
    element[atom] = 0;
  }

  /**
   * Order of the bond between two atoms, 0 when there is none, {@link #AROMATIC} when it is open.
   */
  public int order(int a, int b) {
    int slot = slot(a, b);
    return slot < 0 ? 0 : orders[a][slot];
  }

  /** Sets the order of a bond: 0 cuts it, 1 to 3 or {@link #AROMATIC} makes or changes it. */
  public void setOrder(int a, int b, int order) {
    int slot = slot(a, b);
    boolean wasAromatic = slot >= 0 && aromatic[a][slot];
    aromaticBondsEdited |= wasAromatic != (order == AROMATIC);
    if (wasAromatic && order == AROMATIC) {
      return;
    }
    put(a, b, order);
    put(b, a, order);
  }

  private void put(int from, int to, int order) {
    int slot = slot(from, to);
    if (order == 0) {
      if (slot >= 0) {
        int last = --degree[from];
        neighbours[from][slot] = neighbours[from][last];
        orders[from][slot] = orders[from][last];
        aromatic[from][slot] = aromatic[from][last];
      }
    } else if (slot >= 0) {
      orders[from][slot] = order;
      aromatic[from][slot] = order == AROMATIC;
    } else {
      link(from, to, order, order == AROMATIC);
    }
  }

  private int slot(int from, int to) {
    for (int k = 0; k < degree[from]; k++) {
      if (neighbours[from][k] == to) {
        return k;
      }
    }
    return -1;
  }

  /**
   * Every connected piece as a molecule, in order of its first atom.
   *
   * @throws ImpossibleStructureException when an atom has a valence it cannot have or a ring takes
   *     no alternating bonds
   */
  public List<Fragment> build() throws ImpossibleStructureException {
    if (aromaticBondsEdited) {
      reopenAromaticBonds();
    }
    List<Fragment> result = new ArrayList<>();
    int[] local = new int[size];
    Arrays.fill(local, -1);
    for (int start = 0; start < size; start++) {
      if (element[start] != 0 && local[start] < 0) {
        int[] atoms = component(start, local);
        result.add(KetoForm.of(prepare(skeleton(atoms, local), atoms)));
      }
    }
    return result;
  }

  /** After an edit inside an aromatic system the alternation of the rest is found anew. */
  private void reopenAromaticBonds() {
    for (int i = 0; i < size; i++) {
      for (int k = 0; k < degree[i]; k++) {
        orders[i][k] = aromatic[i][k] ? AROMATIC : orders[i][k];
      }
    }
  }

  private int[] component(int start, int[] local) {
    int[] queue = new int[size];
    int tail = 0;
    local[start] = tail;
    queue[tail++] = start;
    for (int head = 0; head < tail; head++) {
      int at = queue[head];
      for (int k = 0; k < degree[at]; k++) {
        int next = neighbours[at][k];
        if (local[next] < 0) {
          local[next] = tail;
          queue[tail++] = next;
        }
      }
    }
    return Arrays.copyOf(queue, tail);
  }

  private Skeleton skeleton(int[] atoms, int[] local) throws ImpossibleStructureException {
    Skeleton s = new Skeleton(atoms.length);
    boolean open = false;
    for (int i = 0; i < atoms.length; i++) {
      int from = atoms[i];
      s.element[i] = element[from];
      s.charge[i] = charge[from];
      s.hydrogens[i] = hydrogens[from];
      s.neighbours[i] = new int[degree[from]];
      s.orders[i] = Arrays.copyOf(orders[from], degree[from]);
      s.aromaticBond[i] = new boolean[degree[from]];
      for (int k = 0; k < degree[from]; k++) {
        s.neighbours[i][k] = local[neighbours[from][k]];
        open |= orders[from][k] == AROMATIC;
      }
    }
    if (open) {
      Kekulization.localise(s.element, s.charge, s.hydrogens, s.neighbours, s.orders);
    }
    return s;
  }

  private static Fragment prepare(Skeleton s, int[] atoms) throws ImpossibleStructureException {
    s.checkValences();
    AromaticityPerception.mark(s);
    int[] rank = CanonicalOrder.ranks(s);
    int[] builderAtoms = new int[atoms.length];
    for (int i = 0; i < atoms.length; i++) {
      builderAtoms[rank[i]] = atoms[i];
    }
    Skeleton canonical = s.inOrder(rank);
    if (canonical.hasRings()) {
      canonical.localiseAnew();
      canonical.rings = RingPerception.rings(canonical);
    }
    return new Fragment(new Molecule(canonical, IdentityKey.of(canonical)), builderAtoms);
  }
}
