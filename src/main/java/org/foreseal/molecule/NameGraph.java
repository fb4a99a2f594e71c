package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * A molecule as nomenclature sees it: ring systems with known numberings and, outside them, carbons
 * and hetero atoms that carry groups. {@link #of} answers with nothing when any atom is beyond what
 * is known here, so no name can be half right.
 */
final class NameGraph {
  private final Molecule m;
  private final List<RingSystem> systems;
  private final int[] systemOf;

  /** At most one group per atom. */
  private final List<Set<PrincipalGroup>> groups = new ArrayList<>();

  private NameGraph(Molecule m, List<RingSystem> systems) {
    this.m = m;
    this.systems = systems;
    systemOf = new int[m.atomCount()];
    Arrays.fill(systemOf, -1);
    for (int s = 0; s < systems.size(); s++) {
      for (int atom : systems.get(s).atoms()) {
        systemOf[atom] = s;
      }
    }
  }

  static Optional<NameGraph> of(Molecule m, boolean fixedParents) {
    Optional<List<RingSystem>> systems = RingParents.builtIn().systems(m, fixedParents);
    if (systems.isEmpty()) {
      return Optional.empty();
    }
    NameGraph graph = new NameGraph(m, systems.get());
    return graph.classify() ? Optional.of(graph) : Optional.empty();
  }

  Molecule molecule() {
    return m;
  }

  List<RingSystem> systems() {
    return systems;
  }

  Optional<RingSystem> systemOf(int atom) {
    return systemOf[atom] < 0 ? Optional.empty() : Optional.of(systems.get(systemOf[atom]));
  }

  boolean inRing(int atom) {
    return systemOf[atom] >= 0;
  }

  boolean is(int atom, ChemicalElement e) {
    return m.element(atom) == e.atomicNumber();
  }

  boolean isChainCarbon(int atom) {
    return !inRing(atom) && is(atom, ChemicalElement.C);
  }

  /** The group of this atom: of a carbon, or of the O, S or N that carries it. */
  Optional<PrincipalGroup> group(int atom) {
    return groups.get(atom).stream().findFirst();
  }

  boolean has(int atom, PrincipalGroup group) {
    return groups.get(atom).contains(group);
  }

  /** The neighbour of this element and bond order, or -1. */
  int neighbour(int atom, ChemicalElement e, int order) {
    for (int k = 0; k < m.degree(atom); k++) {
      if (m.order(atom, k) == order && is(m.neighbour(atom, k), e)) {
        return m.neighbour(atom, k);
      }
    }
    return -1;
  }

  int order(int a, int b) {
    int slot = m.slotOf(a, b);
    return slot < 0 ? 0 : m.order(a, slot);
  }

  private boolean classify() {
    for (int i = 0; i < m.atomCount(); i++) {
      Optional<Set<PrincipalGroup>> found = inRing(i) ? ringGroup(i) : openGroup(i);
      if (found.isEmpty()) {
        return false;
      }
      groups.add(found.get());
    }
    return true;
  }

  private static Optional<Set<PrincipalGroup>> none() {
    return Optional.of(Set.of());
  }

  private static Optional<Set<PrincipalGroup>> one(PrincipalGroup g) {
    return Optional.of(Set.of(g));
  }

  /** A ring atom may carry a double bond to oxygen, to carbon or to the nitrogen of an imine. */
  private Optional<Set<PrincipalGroup>> ringGroup(int atom) {
    if (m.charge(atom) != 0) {
      return Optional.empty();
    }
    for (int k = 0; k < m.degree(atom); k++) {
      int other = m.neighbour(atom, k);
      if (systemOf[other] != systemOf[atom] && m.order(atom, k) > 1) {
        if (isCarbonylOxygen(other)) {
          return one(PrincipalGroup.KETONE);
        }
        boolean ylidene = is(other, ChemicalElement.C) || isImineOf(other);
        return ylidene ? none() : Optional.empty();
      }
    }
    return none();
  }

  private boolean isCarbonylOxygen(int atom) {
    return is(atom, ChemicalElement.O) && m.degree(atom) == 1 && m.charge(atom) == 0;
  }

  private Optional<Set<PrincipalGroup>> openGroup(int atom) {
    return switch (ChemicalElement.require(m.element(atom))) {
      case C -> carbonGroup(atom);
      case O -> oxygenGroup(atom);
      case S -> sulfurGroup(atom);
      case N -> nitrogenGroup(atom);
      case F, CL, BR, I -> m.degree(atom) == 1 && m.charge(atom) == 0 ? none() : Optional.empty();
      default -> Optional.empty();
    };
  }

  private Optional<Set<PrincipalGroup>> carbonGroup(int atom) {
    if (m.charge(atom) != 0) {
      return Optional.empty();
    }
    int single = 0;
    int singleHetero = -1;
    for (int k = 0; k < m.degree(atom); k++) {
      int other = m.neighbour(atom, k);
      boolean carbon = is(other, ChemicalElement.C);
      if (!carbon && m.order(atom, k) == 1) {
        single++;
        singleHetero = other;
      }
      if (!carbon && m.order(atom, k) == 2 && !is(other, ChemicalElement.O)) {
        return isImineOf(other) && single == 0 ? none() : Optional.empty();
      }
    }
    if (neighbour(atom, ChemicalElement.N, 3) >= 0) {
      return single == 0 ? one(PrincipalGroup.NITRILE) : Optional.empty();
    }
    int oxygen = neighbour(atom, ChemicalElement.O, 2);
    if (oxygen < 0) {
      return none();
    }
    if (m.degree(oxygen) > 1 || m.degree(atom) + m.hydrogens(atom) != 3 || single > 1) {
      return Optional.empty();
    }
    return single == 0
        ? one(m.hydrogens(atom) > 0 ? PrincipalGroup.ALDEHYDE : PrincipalGroup.KETONE)
        : acylGroup(singleHetero);
  }

  private Optional<Set<PrincipalGroup>> acylGroup(int hetero) {
    if (inRing(hetero)) {
      return Optional.empty();
    }
    if (is(hetero, ChemicalElement.O)) {
      return one(m.degree(hetero) == 1 ? PrincipalGroup.ACID : PrincipalGroup.ESTER);
    }
    return is(hetero, ChemicalElement.N) ? one(PrincipalGroup.AMIDE) : Optional.empty();
  }

  private boolean onCarbonsOnly(int atom) {
    for (int k = 0; k < m.degree(atom); k++) {
      if (!is(m.neighbour(atom, k), ChemicalElement.C)) {
        return false;
      }
    }
    return m.degree(atom) > 0;
  }

  private int acylNeighbours(int atom) {
    int count = 0;
    for (int k = 0; k < m.degree(atom); k++) {
      int c = m.neighbour(atom, k);
      boolean acyl =
          !inRing(c)
              && neighbour(c, ChemicalElement.O, 2) >= 0
              && neighbour(c, ChemicalElement.O, 2) != atom;
      count += acyl ? 1 : 0;
    }
    return count;
  }

  private Optional<Set<PrincipalGroup>> oxygenGroup(int atom) {
    boolean nitro = m.degree(atom) == 1 && isNitro(m.neighbour(atom, 0));
    if (nitro) {
      return none();
    }
    if (!onCarbonsOnly(atom) || m.charge(atom) != 0 || acylNeighbours(atom) > 1) {
      return Optional.empty();
    }
    boolean hydroxyl = m.hydrogens(atom) == 1 && acylNeighbours(atom) == 0;
    return hydroxyl ? one(PrincipalGroup.ALCOHOL) : none();
  }

  private Optional<Set<PrincipalGroup>> sulfurGroup(int atom) {
    boolean divalent = m.degree(atom) + m.hydrogens(atom) == 2 && m.charge(atom) == 0;
    if (!divalent || acylNeighbours(atom) > 0) {
      return Optional.empty();
    }
    if (!onCarbonsOnly(atom)) {
      return isDisulfideSulfur(atom) ? none() : Optional.empty();
    }
    return m.hydrogens(atom) == 1 ? one(PrincipalGroup.THIOL) : none();
  }

  private boolean isDisulfideSulfur(int atom) {
    return m.degree(atom) == 2
        && neighbour(atom, ChemicalElement.S, 1) >= 0
        && neighbour(atom, ChemicalElement.C, 1) >= 0
        && !inRing(neighbour(atom, ChemicalElement.S, 1));
  }

  private Optional<Set<PrincipalGroup>> nitrogenGroup(int atom) {
    if (isNitro(atom) || isNitrileNitrogen(atom)) {
      return none();
    }
    if (isImineOf(atom)) {
      return one(PrincipalGroup.AMINE);
    }
    boolean plain = onCarbonsOnly(atom) && m.degree(atom) + m.hydrogens(atom) == 3;
    if (!plain || m.charge(atom) != 0 || acylNeighbours(atom) > 1) {
      return Optional.empty();
    }
    return acylNeighbours(atom) == 0 ? one(PrincipalGroup.AMINE) : none();
  }

  /** C=N-C of an aldehyde or ketone with an amine: named as an amine with an ylidene group. */
  private boolean isImineOf(int atom) {
    return is(atom, ChemicalElement.N)
        && m.charge(atom) == 0
        && !inRing(atom)
        && m.degree(atom) == 2
        && onCarbonsOnly(atom)
        && neighbour(atom, ChemicalElement.C, 2) >= 0
        && neighbour(atom, ChemicalElement.C, 1) >= 0
        && acylNeighbours(atom) == 0;
  }

  private boolean isNitrileNitrogen(int atom) {
    return m.degree(atom) == 1 && m.order(atom, 0) == 3 && m.charge(atom) == 0;
  }

  /** N(+) with O(-) and =O and one carbon. */
  boolean isNitro(int atom) {
    return is(atom, ChemicalElement.N)
        && m.charge(atom) == 1
        && m.degree(atom) == 3
        && neighbour(atom, ChemicalElement.O, 2) >= 0
        && neighbour(atom, ChemicalElement.O, 1) >= 0
        && m.charge(neighbour(atom, ChemicalElement.O, 1)) == -1
        && neighbour(atom, ChemicalElement.C, 1) >= 0;
  }
}
