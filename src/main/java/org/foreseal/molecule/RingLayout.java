package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;

/**
 * One way to number a ring system. The smaller layout is the better one: principal atoms get the
 * lowest locants, then double bonds, then substituents.
 */
final class RingLayout implements Comparable<RingLayout> {
  /**
   * A place on the ring that carries something.
   *
   * @param ringAtom atom of the ring
   * @param substituent atom outside
   * @param locant of the ring atom
   * @param rank sorts locants: 1, 1', 2, 3, 3a, 4
   */
  record Site(int ringAtom, int substituent, String locant, int rank) {}

  private final RingSystem system;
  private final int[] atoms;
  private final int[] placeOf;
  private final List<Integer> principal;
  private final List<Integer> doubleBonds = new ArrayList<>();
  private final List<Site> substituents = new ArrayList<>();

  /**
   * A numbering.
   *
   * @param principalAtoms ring atoms that must have low locants, in any order
   */
  RingLayout(NameGraph g, RingSystem system, int[] atoms, List<Integer> principalAtoms) {
    this.system = system;
    this.atoms = atoms;
    placeOf = new int[g.molecule().atomCount()];
    Arrays.fill(placeOf, -1);
    for (int i = 0; i < atoms.length; i++) {
      placeOf[atoms[i]] = i;
    }
    principal =
        principalAtoms.stream()
            .map(a -> placeOf[a])
            .sorted(Comparator.comparingInt(this::rank))
            .toList();
    for (int i = 0; i < atoms.length; i++) {
      collect(g, i);
    }
  }

  private void collect(NameGraph g, int place) {
    Molecule m = g.molecule();
    int atom = atoms[place];
    for (int k = 0; k < m.degree(atom); k++) {
      int other = m.neighbour(atom, k);
      if (placeOf[other] < 0) {
        substituents.add(new Site(atom, other, locant(place), rank(place)));
      } else if (system.isCarbocycle() && m.order(atom, k) == 2 && place < placeOf[other]) {
        doubleBonds.add(placeOf[other] == place + 1 ? place : placeOf[other]);
      }
    }
    doubleBonds.sort(null);
  }

  private String locant(int place) {
    return system.parent().locants().get(place);
  }

  private int rank(int place) {
    String locant = locant(place);
    String digits = locant.replaceAll("\\D", "");
    int number = digits.isEmpty() ? 0 : Integer.parseInt(digits);
    return number * 10 + (locant.endsWith("'") ? 5 : 0) + (locant.endsWith("a") ? 6 : 0);
  }

  List<Site> substituents() {
    return substituents;
  }

  List<Integer> doubleBonds() {
    return doubleBonds;
  }

  RingSystem system() {
    return system;
  }

  String locantOf(int ringAtom) {
    return locant(placeOf[ringAtom]);
  }

  List<String> principalLocants() {
    return principal.stream().map(this::locant).toList();
  }

  /** "2-cyclohexen", "1,3-cyclohexadien". */
  String unsaturatedStem() {
    String locants =
        doubleBonds.stream().map(p -> Integer.toString(p + 1)).collect(Collectors.joining(","));
    String ending =
        doubleBonds.size() == 1 ? "en" : "a" + NameParts.multiplier(doubleBonds.size()) + "en";
    return locants + "-" + system.parent().name() + ending;
  }

  @Override
  public int compareTo(RingLayout other) {
    int byPrincipal = compare(principalRanks(), other.principalRanks());
    if (byPrincipal != 0) {
      return byPrincipal;
    }
    int byDouble = compare(doubleBonds, other.doubleBonds);
    return byDouble != 0 ? byDouble : compare(ranks(), other.ranks());
  }

  private List<Integer> principalRanks() {
    return principal.stream().map(this::rank).toList();
  }

  private List<Integer> ranks() {
    return substituents.stream().map(Site::rank).sorted().toList();
  }

  static int compare(List<Integer> a, List<Integer> b) {
    for (int i = 0; i < Math.min(a.size(), b.size()); i++) {
      if (!a.get(i).equals(b.get(i))) {
        return a.get(i) - b.get(i);
      }
    }
    return a.size() - b.size();
  }
}
