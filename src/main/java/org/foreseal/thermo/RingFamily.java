package org.foreseal.thermo;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.foreseal.molecule.Molecule;

/**
 * The rings the group method counts: the smallest set, completed with every ring that is a sum of
 * some of them and no larger than the largest of those, so that cages have all their equal faces
 * (three rings in bicyclo[2.2.2]octane, four in adamantane, six in cubane) whichever the smallest
 * set happened to leave out.
 */
final class RingFamily {
  /** More rings than this are left as the smallest set has them; they are out of scope anyway. */
  private static final int MOST_RINGS = 10;

  private final Molecule graph;
  private final List<Ring> basis = new ArrayList<>();
  private final List<BitSet> basisBonds = new ArrayList<>();

  private RingFamily(Molecule graph) {
    this.graph = graph;
    for (int r = 0; r < graph.ringCount(); r++) {
      int[] atoms = graph.ring(r);
      basis.add(new Ring(atoms));
      BitSet bonds = new BitSet();
      for (int k = 0; k < atoms.length; k++) {
        bonds.set(bond(atoms[k], atoms[(k + 1) % atoms.length]));
      }
      basisBonds.add(bonds);
    }
  }

  static List<Ring> of(Molecule graph) {
    RingFamily family = new RingFamily(graph);
    return family.mayBeIncomplete() ? family.completed() : family.basis;
  }

  private int bond(int a, int b) {
    return Math.min(a, b) * graph.atomCount() + Math.max(a, b);
  }

  /** Rings that share one bond at most form a further ring as small as themselves only in cages. */
  private boolean mayBeIncomplete() {
    if (basis.size() < 2 || basis.size() > MOST_RINGS) {
      return false;
    }
    for (int r = 0; r < basis.size(); r++) {
      for (int q = r + 1; q < basis.size(); q++) {
        if (basis.get(r).shared(basis.get(q)) > 2) {
          return true;
        }
      }
    }
    return basis.size() >= 5;
  }

  private List<Ring> completed() {
    List<Ring> all = new ArrayList<>(basis);
    Set<BitSet> known = new HashSet<>(basisBonds);
    for (int choice = 3; choice < 1 << basis.size(); choice++) {
      BitSet sum = new BitSet();
      int largest = 0;
      for (int r = 0; r < basis.size(); r++) {
        if ((choice >> r & 1) == 1) {
          sum.xor(basisBonds.get(r));
          largest = Math.max(largest, basis.get(r).size());
        }
      }
      if (sum.cardinality() <= largest && known.add(sum)) {
        addIfRing(sum, all);
      }
    }
    return all;
  }

  private void addIfRing(BitSet bonds, List<Ring> all) {
    int n = graph.atomCount();
    int first = bonds.nextSetBit(0);
    if (first < 0) {
      return;
    }
    List<Integer> walk = new ArrayList<>();
    BitSet left = (BitSet) bonds.clone();
    int start = first / n;
    int at = start;
    do {
      walk.add(at);
      int next = nextBond(left, at, n);
      if (next < 0) {
        return;
      }
      left.clear(next);
      at = next / n == at ? next % n : next / n;
    } while (at != start);
    if (left.isEmpty()) {
      all.add(new Ring(walk.stream().mapToInt(Integer::intValue).toArray()));
    }
  }

  private static int nextBond(BitSet bonds, int atom, int n) {
    for (int b = bonds.nextSetBit(0); b >= 0; b = bonds.nextSetBit(b + 1)) {
      if (b / n == atom || b % n == atom) {
        return b;
      }
    }
    return -1;
  }
}
