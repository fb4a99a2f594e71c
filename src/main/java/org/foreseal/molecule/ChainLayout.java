package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * One chain in one direction. The smaller layout is the better parent: more principal groups, more
 * multiple bonds, longer, more substituents; then lower locants of groups, of multiple bonds, of
 * substituents.
 */
final class ChainLayout implements Comparable<ChainLayout> {
  /**
   * A place on the chain that carries something.
   *
   * @param chainAtom atom of the chain
   * @param substituent atom outside
   * @param locant from 1
   */
  record Site(int chainAtom, int substituent, int locant) {}

  private final NameGraph g;
  private final List<Integer> path;
  private final List<Integer> principal = new ArrayList<>();
  private final List<Heteroatoms.Link> suffixLinks = new ArrayList<>();
  private final List<Integer> doubleBonds = new ArrayList<>();
  private final List<Integer> tripleBonds = new ArrayList<>();
  private final List<Site> sites = new ArrayList<>();
  private final Set<PrincipalGroup> group;

  /**
   * A chain.
   *
   * @param path its atoms from number one on
   * @param on the atom the chain hangs on, -1 when it is the parent
   * @param group the group to be named as suffix, or none
   */
  ChainLayout(NameGraph g, List<Integer> path, int on, Set<PrincipalGroup> group) {
    this.g = g;
    this.path = List.copyOf(path);
    this.group = group;
    for (int i = 0; i < path.size(); i++) {
      collect(i, on);
      if (i + 1 < path.size()) {
        collectBond(i);
      }
    }
  }

  private void collectBond(int place) {
    int order = g.order(path.get(place), path.get(place + 1));
    if (order == 2) {
      doubleBonds.add(place + 1);
    } else if (order == 3) {
      tripleBonds.add(place + 1);
    }
  }

  private void collect(int place, int on) {
    Molecule m = g.molecule();
    int atom = path.get(place);
    boolean carriesSuffix = g.group(atom).filter(group::contains).isPresent();
    if (carriesSuffix) {
      principal.add(place + 1);
    }
    for (int k = 0; k < m.degree(atom); k++) {
      int other = m.neighbour(atom, k);
      if (other == on || path.contains(other)) {
        continue;
      }
      boolean hetero = !g.is(other, ChemicalElement.C);
      if (hetero && (carriesSuffix && isPartOfSuffix(atom, other, m.order(atom, k)))) {
        suffixLinks.add(new Heteroatoms.Link(atom, other));
      } else if (hetero && m.order(atom, k) == 1 && carriesItself(other)) {
        suffixLinks.add(new Heteroatoms.Link(atom, other));
        principal.add(place + 1);
      } else {
        sites.add(new Site(atom, other, place + 1));
      }
    }
  }

  private boolean carriesItself(int hetero) {
    return !g.inRing(hetero) && g.group(hetero).filter(group::contains).isPresent();
  }

  /** All hetero atoms of an acid, ester, amide or nitrile carbon; of a carbonyl the oxygen. */
  private boolean isPartOfSuffix(int carbon, int hetero, int order) {
    return order > 1
        || g.has(carbon, PrincipalGroup.ACID)
        || g.has(carbon, PrincipalGroup.ESTER)
        || (g.has(carbon, PrincipalGroup.AMIDE) && g.is(hetero, ChemicalElement.N));
  }

  int length() {
    return path.size();
  }

  /** Locants of the suffix, ascending. */
  List<Integer> principal() {
    return principal;
  }

  /** The hetero atoms that the suffix names. */
  List<Heteroatoms.Link> suffixLinks() {
    return suffixLinks;
  }

  List<Integer> doubleBonds() {
    return doubleBonds;
  }

  List<Integer> tripleBonds() {
    return tripleBonds;
  }

  List<Site> sites() {
    return sites;
  }

  boolean isSaturated() {
    return doubleBonds.isEmpty() && tripleBonds.isEmpty();
  }

  /**
   * "(E)-" or "(2E,4E)-" for the double bonds with one hydrogen at each end, empty without them.
   */
  String stereo() {
    List<Integer> trans =
        doubleBonds.stream()
            .filter(
                p ->
                    g.molecule().hydrogens(path.get(p - 1)) == 1
                        && g.molecule().hydrogens(path.get(p)) == 1)
            .toList();
    if (trans.isEmpty()) {
      return "";
    }
    return doubleBonds.size() == 1
        ? "(E)-"
        : trans.stream().map(p -> p + "E").collect(Collectors.joining(",", "(", ")-"));
  }

  /** "hex-an", with the locants of multiple bonds in front: "2,4-hexadien". */
  String stemWithBonds() {
    String stem = NameParts.stem(length());
    if (isSaturated()) {
      return stem + "an";
    }
    List<Integer> bonds = doubleBonds.isEmpty() ? tripleBonds : doubleBonds;
    String ending = doubleBonds.isEmpty() ? "yn" : "en";
    String locants =
        length() < 3
            ? ""
            : bonds.stream().map(String::valueOf).collect(Collectors.joining(",")) + "-";
    String times = bonds.size() == 1 ? "" : "a" + NameParts.multiplier(bonds.size());
    return locants + stem + times + ending;
  }

  /** False for chains whose unsaturation has no name here. */
  boolean isNameable() {
    int most = Math.max(doubleBonds.size(), tripleBonds.size());
    return length() <= NameParts.LONGEST_CHAIN
        && (doubleBonds.isEmpty() || tripleBonds.isEmpty())
        && most <= NameParts.MOST_EQUAL;
  }

  @Override
  public int compareTo(ChainLayout other) {
    int[] differences = {
      other.principal.size() - principal.size(),
      other.bondCount() - bondCount(),
      other.length() - length(),
      other.sites.size() - sites.size(),
      RingLayout.compare(principal, other.principal),
      RingLayout.compare(bonds(), other.bonds()),
      RingLayout.compare(doubleBonds, other.doubleBonds),
      RingLayout.compare(locants(), other.locants())
    };
    for (int difference : differences) {
      if (difference != 0) {
        return difference;
      }
    }
    return 0;
  }

  private int bondCount() {
    return doubleBonds.size() + tripleBonds.size();
  }

  private List<Integer> bonds() {
    List<Integer> all = new ArrayList<>(doubleBonds);
    all.addAll(tripleBonds);
    all.sort(null);
    return all;
  }

  private List<Integer> locants() {
    return sites.stream().map(Site::locant).toList();
  }
}
