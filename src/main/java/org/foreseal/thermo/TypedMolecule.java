package org.foreseal.thermo;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import org.foreseal.molecule.Molecule;

/**
 * A molecule with its aromatic rings, its other rings and the type of every atom.
 *
 * <p>Aromatic here is a rule of the group method's own, so that the terms do not depend on any
 * toolkit: a six-membered ring of C and N whose atoms all carry a double bond of some ring and none
 * out of the rings; or a five-membered ring with exactly one atom without a ring double bond, that
 * atom N, O or S, and no double bond out of the rings.
 */
final class TypedMolecule {
  private static final int CARBON = 6;
  private static final int NITROGEN = 7;
  private static final int OXYGEN = 8;
  private static final int SULFUR = 16;

  private final Molecule graph;
  private final List<Ring> rings;
  private final List<Ring> aromaticRings = new ArrayList<>();
  private final List<Ring> otherRings = new ArrayList<>();
  private final BitSet ringAtoms = new BitSet();
  private final BitSet ringDouble = new BitSet();
  private final BitSet outerDouble = new BitSet();
  private final AtomType[] types;

  /** Types a molecule that passed {@link TypeCheck}. */
  TypedMolecule(Molecule graph) {
    this.graph = graph;
    rings = RingFamily.of(graph);
    rings.forEach(r -> ringAtoms.or(r.members()));
    markDoubleBonds();
    for (Ring ring : rings) {
      (isAromatic(ring) ? aromaticRings : otherRings).add(ring);
    }
    types = new AtomType[graph.atomCount()];
    for (int i = 0; i < types.length; i++) {
      types[i] = typeOf(i);
    }
  }

  private void markDoubleBonds() {
    for (int i = 0; i < graph.atomCount(); i++) {
      for (int k = 0; k < graph.degree(i); k++) {
        if (graph.order(i, k) == 2) {
          (graph.isRingBond(i, k) ? ringDouble : outerDouble).set(i);
        }
      }
    }
  }

  private boolean isAromatic(Ring ring) {
    if (ring.members().intersects(outerDouble)) {
      return false;
    }
    BitSet without = (BitSet) ring.members().clone();
    without.andNot(ringDouble);
    if (ring.size() == 6) {
      return without.isEmpty() && ring.members().stream().allMatch(this::fitsSixRing);
    }
    return ring.size() == 5
        && without.cardinality() == 1
        && graph.element(without.nextSetBit(0)) != CARBON;
  }

  private boolean fitsSixRing(int atom) {
    int e = graph.element(atom);
    return (e == CARBON || e == NITROGEN) && graph.degree(atom) + graph.hydrogens(atom) <= 3;
  }

  private AtomType typeOf(int atom) {
    long aromatic = aromaticRings.stream().filter(r -> r.holds(atom)).count();
    if (aromatic > 0) {
      return aromaticType(atom, aromatic > 1);
    }
    return switch (graph.element(atom)) {
      case CARBON -> carbonType(atom);
      case NITROGEN ->
          partner(atom, 3) > 0
              ? AtomType.NITRILE_NITROGEN
              : partner(atom, 2) > 0 ? AtomType.IMINE : AtomType.AMINE;
      case OXYGEN -> partner(atom, 2) > 0 ? AtomType.OXO : AtomType.OXYGEN;
      case SULFUR -> sulfurType(atom);
      default -> throw new IllegalArgumentException("no atom type for " + graph.element(atom));
    };
  }

  private AtomType aromaticType(int atom, boolean fused) {
    boolean inFive = aromaticRings.stream().anyMatch(r -> r.size() == 5 && r.holds(atom));
    return switch (graph.element(atom)) {
      case CARBON ->
          fused
              ? (inFive ? AtomType.FUSED_FIVE_RING : AtomType.FUSED)
              : (inFive ? AtomType.FIVE_RING : AtomType.AROMATIC);
      case NITROGEN -> ringDouble.get(atom) ? AtomType.PYRIDINE : AtomType.PYRROLE;
      case OXYGEN -> AtomType.FURAN;
      default -> AtomType.THIOPHENE;
    };
  }

  private AtomType carbonType(int atom) {
    int triple = partner(atom, 3);
    if (triple > 0) {
      return triple == NITROGEN ? AtomType.NITRILE : AtomType.ALKYNE;
    }
    if (doubleBonds(atom) == 2) {
      return AtomType.CUMULENE;
    }
    return switch (partner(atom, 2)) {
      case CARBON -> AtomType.ALKENE;
      case NITROGEN -> AtomType.IMINE_CARBON;
      case OXYGEN -> AtomType.CARBONYL;
      case SULFUR -> AtomType.THIOCARBONYL;
      default -> AtomType.ALKYL;
    };
  }

  private AtomType sulfurType(int atom) {
    int bonds = doubleBonds(atom);
    if (bonds == 0) {
      return AtomType.SULFIDE;
    }
    if (partner(atom, 2) == CARBON) {
      return AtomType.THIOXO;
    }
    return bonds == 1 ? AtomType.SULFOXIDE : AtomType.SULFONE;
  }

  /** Element at the other end of the first bond of this order, 0 when there is none. */
  private int partner(int atom, int order) {
    for (int k = 0; k < graph.degree(atom); k++) {
      if (graph.order(atom, k) == order) {
        return graph.element(graph.neighbour(atom, k));
      }
    }
    return 0;
  }

  private int doubleBonds(int atom) {
    int count = 0;
    for (int k = 0; k < graph.degree(atom); k++) {
      count += graph.order(atom, k) == 2 ? 1 : 0;
    }
    return count;
  }

  Molecule graph() {
    return graph;
  }

  AtomType type(int atom) {
    return types[atom];
  }

  boolean is(int atom, AtomType type) {
    return types[atom] == type;
  }

  boolean isCarbon(int atom) {
    return graph.element(atom) == CARBON;
  }

  boolean isRingAtom(int atom) {
    return ringAtoms.get(atom);
  }

  List<Ring> rings() {
    return rings;
  }

  List<Ring> aromaticRings() {
    return aromaticRings;
  }

  List<Ring> otherRings() {
    return otherRings;
  }

  /** Whether one aromatic ring holds both atoms. */
  boolean shareAromaticRing(int a, int b) {
    return aromaticRings.stream().anyMatch(r -> r.holds(a) && r.holds(b));
  }

  /** Neighbours in ascending order. */
  int[] neighbours(int atom) {
    int[] result = new int[graph.degree(atom)];
    for (int k = 0; k < result.length; k++) {
      result[k] = graph.neighbour(atom, k);
    }
    return result;
  }

  /** The first neighbour outside the aromatic rings of this atom, or -1. */
  int substituent(int atom) {
    for (int other : neighbours(atom)) {
      if (!shareAromaticRing(atom, other)) {
        return other;
      }
    }
    return -1;
  }

  /** Hands every bond once to {@code visitor}. */
  void forEachBond(BondVisitor visitor) {
    for (int i = 0; i < graph.atomCount(); i++) {
      for (int k = 0; k < graph.degree(i); k++) {
        if (graph.neighbour(i, k) > i) {
          visitor.visit(i, graph.neighbour(i, k), graph.order(i, k), graph.isRingBond(i, k));
        }
      }
    }
  }

  /** Takes one bond. */
  interface BondVisitor {
    void visit(int a, int b, int order, boolean inRing);
  }
}
