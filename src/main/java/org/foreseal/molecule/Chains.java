package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.foreseal.molecule.NameParts.Placed;
import org.foreseal.molecule.NameParts.Prefix;

/** Finds chains of carbons outside rings. */
final class Chains {
  private final NameGraph g;
  private final Substituents substituents;
  private final Set<PrincipalGroup> group;

  /**
   * Chains in which the carbon of this group may stand.
   *
   * @param group the group to be named as suffix, or none
   */
  Chains(NameGraph g, Substituents substituents, Set<PrincipalGroup> group) {
    this.g = g;
    this.substituents = substituents;
    this.group = group;
  }

  /**
   * A chain numbered and its prefixes named.
   *
   * @param layout the chain
   * @param placed the prefixes
   */
  record Numbered(ChainLayout layout, List<Placed> placed) {}

  /** The best of all chains of the molecule. */
  Optional<Numbered> bestOfAll() {
    return best(all());
  }

  /** How many groups the best chain carries as suffix. */
  int count() {
    return all().stream().mapToInt(l -> l.principal().size()).max().orElse(0);
  }

  private List<ChainLayout> all() {
    List<ChainLayout> layouts = new ArrayList<>();
    for (int i = 0; i < g.molecule().atomCount(); i++) {
      if (mayStand(i) && chainNeighbours(i) <= 1) {
        addPaths(new ArrayList<>(List.of(i)), -1, layouts);
      }
    }
    return layouts;
  }

  /** The best chain that begins at this atom and leads away from another. */
  Optional<Numbered> bestFrom(int atom, int on) {
    List<ChainLayout> layouts = new ArrayList<>();
    if (mayStand(atom)) {
      addPaths(new ArrayList<>(List.of(atom)), on, layouts);
    }
    return best(layouts);
  }

  private boolean mayStand(int atom) {
    return g.isChainCarbon(atom)
        && g.group(atom).map(x -> x.staysInChainAsPrefix() || group.contains(x)).orElse(true);
  }

  private int chainNeighbours(int atom) {
    int count = 0;
    for (int k = 0; k < g.molecule().degree(atom); k++) {
      count += mayStand(g.molecule().neighbour(atom, k)) ? 1 : 0;
    }
    return count;
  }

  /** Only paths that cannot be lengthened: a longer one is never the worse parent. */
  private void addPaths(List<Integer> path, int on, List<ChainLayout> found) {
    Molecule m = g.molecule();
    int end = path.get(path.size() - 1);
    boolean last = true;
    for (int k = 0; k < m.degree(end); k++) {
      int next = m.neighbour(end, k);
      if (next != on && mayStand(next) && !path.contains(next)) {
        last = false;
        path.add(next);
        addPaths(path, on, found);
        path.remove(path.size() - 1);
      }
    }
    if (last) {
      found.add(new ChainLayout(g, path, on, group));
    }
  }

  private Optional<Numbered> best(List<ChainLayout> layouts) {
    if (layouts.isEmpty()) {
      return Optional.empty();
    }
    ChainLayout lowest = Collections.min(layouts);
    return layouts.stream()
        .filter(l -> l.compareTo(lowest) == 0 && l.isNameable())
        .flatMap(l -> placed(l).map(p -> new Numbered(l, p)).stream())
        .min(Comparator.comparing(Numbered::placed, NameParts.ALPHABETICALLY))
        .filter(n -> !NameParts.tooMany(n.placed()));
  }

  private Optional<List<Placed>> placed(ChainLayout layout) {
    List<Placed> result = new ArrayList<>();
    for (ChainLayout.Site site : layout.sites()) {
      Optional<Prefix> p = substituents.prefix(site.substituent(), site.chainAtom());
      if (p.isEmpty()) {
        return Optional.empty();
      }
      result.add(new Placed(p.get(), Integer.toString(site.locant()), site.locant()));
    }
    return Optional.of(result);
  }
}
