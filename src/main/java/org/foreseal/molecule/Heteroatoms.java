package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.foreseal.molecule.NameParts.Placed;
import org.foreseal.molecule.NameParts.Prefix;

/** What hangs on the hetero atoms of a suffix: N-alkyl groups and the alcohol part of esters. */
final class Heteroatoms {
  /**
   * A hetero atom of the suffix.
   *
   * @param carbon the atom of the parent (or of the group) that carries it
   * @param hetero the hetero atom
   */
  record Link(int carbon, int hetero) {}

  private final NameGraph g;
  private final Substituents substituents;

  Heteroatoms(NameGraph g, Substituents substituents) {
    this.g = g;
    this.substituents = substituents;
  }

  /** Prefixes with the locant N; nothing when one has no name or several nitrogens carry some. */
  Optional<List<Placed>> onNitrogen(List<Link> links) {
    List<Placed> result = new ArrayList<>();
    long nitrogens = links.stream().filter(l -> g.is(l.hetero(), ChemicalElement.N)).count();
    for (Link link : links) {
      if (g.is(link.hetero(), ChemicalElement.N)) {
        Optional<List<Prefix>> parts = beyond(link);
        if (parts.isEmpty() || (nitrogens > 1 && !parts.get().isEmpty())) {
          return Optional.empty();
        }
        parts.get().forEach(p -> result.add(new Placed(p, "N", -1)));
      }
    }
    return Optional.of(result);
  }

  /** "methyl ", "dimethyl " or "bis(2-phenylethyl) "; nothing when the parts differ. */
  Optional<String> alcoholPart(List<Link> links) {
    List<Prefix> parts = new ArrayList<>();
    for (Link link : links) {
      Optional<List<Prefix>> beyond = beyond(link);
      if (beyond.isEmpty()) {
        return Optional.empty();
      }
      parts.addAll(beyond.get());
    }
    return sameParts(parts);
  }

  private static Optional<String> sameParts(List<Prefix> parts) {
    if (parts.isEmpty()
        || parts.size() > NameParts.MOST_EQUAL
        || parts.stream().distinct().count() > 1) {
      return Optional.empty();
    }
    Prefix part = parts.get(0);
    return Optional.of(
        (parts.size() == 1 ? part.text() : NameParts.times(part, parts.size())) + " ");
  }

  /** The parts a hetero atom carries besides its carbon. */
  Optional<List<Prefix>> beyond(Link link) {
    Molecule m = g.molecule();
    List<Prefix> result = new ArrayList<>();
    for (int k = 0; k < m.degree(link.hetero()); k++) {
      int other = m.neighbour(link.hetero(), k);
      if (other != link.carbon()) {
        Optional<Prefix> p = substituents.prefix(other, link.hetero());
        if (p.isEmpty()) {
          return Optional.empty();
        }
        result.add(p.get());
      }
    }
    return Optional.of(result);
  }
}
