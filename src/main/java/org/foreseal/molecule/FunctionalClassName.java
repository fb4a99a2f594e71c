package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.foreseal.molecule.NameParts.Prefix;

/**
 * Names of the form "hexyl methyl ether", "dihexyl sulfide", "dihexyl disulfide", "hexylamine" for
 * molecules with that one group and no other hetero atom.
 */
final class FunctionalClassName {
  private final NameGraph g;
  private final Substituents substituents;

  FunctionalClassName(NameGraph g, Substituents substituents) {
    this.g = g;
    this.substituents = substituents;
  }

  Optional<String> name() {
    Molecule m = g.molecule();
    List<Integer> hetero = new ArrayList<>();
    for (int i = 0; i < m.atomCount(); i++) {
      if (!g.is(i, ChemicalElement.C)) {
        hetero.add(i);
      }
    }
    boolean open = hetero.stream().noneMatch(g::inRing);
    if (open && hetero.size() == 1) {
      return ofOne(hetero.get(0));
    }
    boolean disulfide =
        open
            && hetero.size() == 2
            && hetero.stream().allMatch(a -> g.is(a, ChemicalElement.S))
            && m.slotOf(hetero.get(0), hetero.get(1)) >= 0;
    return disulfide
        ? parts(hetero.get(0), hetero.get(1))
            .flatMap(a -> parts(hetero.get(1), hetero.get(0)).map(b -> List.of(a.get(0), b.get(0))))
            .map(p -> words(p, "disulfide"))
        : Optional.empty();
  }

  private Optional<String> ofOne(int atom) {
    if (g.is(atom, ChemicalElement.N)) {
      return parts(atom, -1).flatMap(FunctionalClassName::amine);
    }
    boolean between = g.molecule().degree(atom) == 2;
    if (between && g.is(atom, ChemicalElement.O)) {
      return parts(atom, -1).filter(p -> !hasArylBetterAsParent(p)).map(p -> words(p, "ether"));
    }
    return between && g.is(atom, ChemicalElement.S)
        ? parts(atom, -1).filter(p -> !hasArylBetterAsParent(p)).map(p -> words(p, "sulfide"))
        : Optional.empty();
  }

  /** "1-methoxy-4-propylbenzene" reads better than "methyl 4-propylphenyl ether". */
  private static boolean hasArylBetterAsParent(List<Prefix> parts) {
    boolean differ = parts.stream().distinct().count() > 1;
    return differ && parts.stream().anyMatch(p -> p.complex() && p.text().endsWith("phenyl"));
  }

  private Optional<List<Prefix>> parts(int atom, int except) {
    Optional<List<Prefix>> found =
        new Heteroatoms(g, substituents).beyond(new Heteroatoms.Link(except, atom));
    return found.filter(p -> !p.isEmpty());
  }

  /** Only equal parts, or one simple part; mixed amines are named as N-substituted. */
  private static Optional<String> amine(List<Prefix> parts) {
    boolean equal = parts.stream().distinct().count() == 1;
    boolean fits = equal && (parts.size() > 1 || !parts.get(0).complex());
    return fits
        ? Optional.of(NameParts.times(parts.get(0), parts.size()) + "amine")
        : Optional.empty();
  }

  private static String words(List<Prefix> parts, String kind) {
    List<Prefix> sorted = new ArrayList<>(parts);
    sorted.sort(Comparator.comparing(Prefix::sortKey).thenComparing(Prefix::text));
    return sorted.get(0).equals(sorted.get(1))
        ? NameParts.times(sorted.get(0), 2) + " " + kind
        : sorted.get(0).text() + " " + sorted.get(1).text() + " " + kind;
  }
}
