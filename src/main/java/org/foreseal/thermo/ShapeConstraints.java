package org.foreseal.thermo;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.foreseal.molecule.Molecule;

/**
 * Places a symmetry must leave in shape: tetrahedral carbon and pyramidal nitrogen or sulfur are
 * not turned inside out, and the ends of a double bond are not twisted. Stereocentres are
 * unspecified here, so they put no condition on a symmetry. A place is checked as the sign of the
 * permutation of its sorted neighbours.
 */
final class ShapeConstraints {
  private final SymmetryGraph graph;
  private final boolean[] centre;
  private final int[] doubleBondPartner;
  private final List<Integer> fixedCentres = new ArrayList<>();
  private final List<int[]> doubleBonds = new ArrayList<>();
  private int stereocentres;

  ShapeConstraints(TypedMolecule molecule, SymmetryGraph graph) {
    this.graph = graph;
    centre = new boolean[graph.size()];
    doubleBondPartner = new int[graph.size()];
    Arrays.fill(doubleBondPartner, -1);
    for (int i = 0; i < molecule.graph().atomCount(); i++) {
      addCentre(molecule, i);
    }
    molecule.forEachBond(
        (a, b, order, inRing) -> {
          if (order == 2 && !inRing && isRigid(molecule.type(a)) && isRigid(molecule.type(b))) {
            addDoubleBond(a, b);
          }
        });
  }

  private void addCentre(TypedMolecule molecule, int atom) {
    Molecule m = molecule.graph();
    boolean carbon = molecule.is(atom, AtomType.ALKYL) && m.degree(atom) >= 3;
    boolean pyramid =
        (molecule.is(atom, AtomType.AMINE) || molecule.is(atom, AtomType.SULFOXIDE))
            && m.degree(atom) + m.hydrogens(atom) == 3
            && !molecule.isRingAtom(atom);
    if (m.hydrogens(atom) > 1 || !(carbon || pyramid)) {
      return;
    }
    centre[atom] = true;
    if (carbon && graph.hasDistinctNeighbours(atom)) {
      stereocentres++;
    } else {
      fixedCentres.add(atom);
    }
  }

  private static boolean isRigid(AtomType type) {
    return switch (type) {
      case ALKENE, IMINE_CARBON, IMINE -> true;
      default -> false;
    };
  }

  private void addDoubleBond(int a, int b) {
    int ends = graph.neighbours(a).length + graph.neighbours(b).length;
    if (graph.neighbours(a).length > 1 && graph.neighbours(b).length > 1) {
      doubleBondPartner[a] = b;
      doubleBondPartner[b] = a;
      if (ends > 4) {
        doubleBonds.add(new int[] {a, b});
      }
    }
  }

  int stereocentres() {
    return stereocentres;
  }

  /** Groups of nodes to be mapped before the constraint of this number can be checked. */
  List<int[]> scopes() {
    List<int[]> scopes = new ArrayList<>();
    for (int c : fixedCentres) {
      scopes.add(join(graph.neighbours(c), c));
    }
    for (int[] bond : doubleBonds) {
      scopes.add(join(join(graph.neighbours(bond[0]), bond[0]), graph.neighbours(bond[1])));
    }
    return scopes;
  }

  private static int[] join(int[] some, int... more) {
    int[] all = Arrays.copyOf(some, some.length + more.length);
    System.arraycopy(more, 0, all, some.length, more.length);
    return all;
  }

  /** Whether the mapping keeps the shape of the place with this number. */
  boolean isKept(int number, int[] map) {
    if (number < fixedCentres.size()) {
      int c = fixedCentres.get(number);
      return centre[map[c]] && sign(c, -1, map) > 0;
    }
    int[] bond = doubleBonds.get(number - fixedCentres.size());
    int a = bond[0];
    int b = bond[1];
    return doubleBondPartner[map[a]] == map[b] && sign(a, b, map) * sign(b, a, map) > 0;
  }

  /** Sign of the permutation of the neighbours of a node, one of them left out. */
  private int sign(int node, int without, int[] map) {
    int[] from = graph.neighbours(node);
    int[] to = graph.neighbours(map[node]);
    int[] place = new int[from.length];
    int n = 0;
    for (int other : from) {
      if (other != without) {
        place[n++] = indexOf(to, map[other]);
      }
    }
    int sign = 1;
    for (int x = 0; x < n; x++) {
      for (int y = x + 1; y < n; y++) {
        sign = place[x] > place[y] ? -sign : sign;
      }
    }
    return sign;
  }

  private static int indexOf(int[] values, int value) {
    for (int k = 0; k < values.length; k++) {
      if (values[k] == value) {
        return k;
      }
    }
    throw new IllegalStateException("a symmetry must keep bonds");
  }
}
