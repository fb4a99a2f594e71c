package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.foreseal.molecule.NameParts.Placed;

/** Names a molecule whose parent is a ring system. */
final class RingName {
  private static final int MOST_GROUPS = 4;

  private final NameGraph g;
  private final Substituents substituents;

  RingName(NameGraph g, Substituents substituents) {
    this.g = g;
    this.substituents = substituents;
  }

  /**
   * A ring system with the groups its suffix would name.
   *
   * @param ringAtoms ring atoms that carry them
   * @param links hetero atoms of the groups
   * @param outside atoms next to the ring that belong to the groups
   */
  private record Carried(
      RingSystem system,
      List<Integer> ringAtoms,
      List<Heteroatoms.Link> links,
      Set<Integer> outside) {}

  /** How many groups of this kind the best ring carries. */
  int count(PrincipalGroup group) {
    return best(group).map(c -> c.ringAtoms().size()).orElse(0);
  }

  private Optional<Carried> best(PrincipalGroup group) {
    return g.systems().stream()
        .filter(s -> !s.isFixed())
        .map(s -> carried(s, group))
        .max(
            Comparator.comparingInt((Carried c) -> c.ringAtoms().size())
                .thenComparingInt(c -> rank(c.system())));
  }

  /** Hetero and fused rings go before benzene, benzene before the plain carbocycles. */
  private static int rank(RingSystem system) {
    int size = system.atoms().size();
    return switch (system.parent().kind()) {
      case CARBOCYCLE -> size;
      case BENZENE -> 100 + size;
      default -> 200 + size;
    };
  }

  private Carried carried(RingSystem system, PrincipalGroup group) {
    Carried c = new Carried(system, new ArrayList<>(), new ArrayList<>(), new HashSet<>());
    Molecule m = g.molecule();
    for (int atom : system.atoms()) {
      for (int k = 0; k < m.degree(atom); k++) {
        int other = m.neighbour(atom, k);
        boolean outside = !system.atoms().contains(other);
        if (outside && group == PrincipalGroup.KETONE) {
          addKetone(c, atom, other, m.order(atom, k));
        } else if (outside && m.order(atom, k) == 1 && !g.inRing(other) && g.has(other, group)) {
          addGroup(c, atom, other, group);
        }
      }
    }
    return c;
  }

  private void addKetone(Carried c, int atom, int other, int order) {
    if (order == 2 && g.has(atom, PrincipalGroup.KETONE)) {
      c.ringAtoms().add(atom);
      c.outside().add(other);
    }
  }

  private void addGroup(Carried c, int atom, int other, PrincipalGroup group) {
    c.ringAtoms().add(atom);
    c.outside().add(other);
    if (!g.is(other, ChemicalElement.C)) {
      c.links().add(new Heteroatoms.Link(atom, other));
      return;
    }
    ChemicalElement carrier = group == PrincipalGroup.AMIDE ? ChemicalElement.N : ChemicalElement.O;
    int hetero = g.neighbour(other, carrier, 1);
    if (hetero >= 0) {
      c.links().add(new Heteroatoms.Link(other, hetero));
    }
  }

  /** Without a suffix, on the most senior ring or the one whose name is fixed. */
  Optional<Plain> plain() {
    return g.systems().stream()
        .max(
            Comparator.comparing(RingSystem::isFixed)
                .thenComparingInt(RingName::rank)
                .thenComparingInt(this::branches))
        .flatMap(s -> substituents.best(s, List.of(), Set.of()))
        .map(RingName::plainName);
  }

  private int branches(RingSystem system) {
    return system.atoms().stream().mapToInt(a -> g.molecule().degree(a)).sum();
  }

  /**
   * A name without suffix.
   *
   * @param text the name
   * @param onlySimple true when no substituent needed brackets
   */
  record Plain(String text, boolean onlySimple) {}

  private static Plain plainName(Substituents.Numbered n) {
    RingSystem system = n.layout().system();
    boolean plainRing = system.isBenzene() || system.isCarbocycle();
    int doubles = n.layout().doubleBonds().size();
    boolean withLocants = !plainRing || n.placed().size() > 1 || doubles > 0;
    String parent = system.parent().name();
    if (system.isCarbocycle()) {
      parent += doubles == 1 ? "ene" : "ane";
      parent = doubles > 1 ? n.layout().unsaturatedStem() + "e" : parent;
    }
    boolean onlySimple = n.placed().stream().noneMatch(p -> p.prefix().complex());
    return new Plain(NameParts.word(n.placed(), withLocants, parent), onlySimple);
  }

  /** With this group as the suffix. */
  Optional<String> of(PrincipalGroup group) {
    Optional<Carried> best = best(group);
    int count = best.map(c -> c.ringAtoms().size()).orElse(0);
    if (count == 0 || count > MOST_GROUPS) {
      return Optional.empty();
    }
    Carried c = best.orElseThrow();
    if (new HashSet<>(c.ringAtoms()).size() != count && group != PrincipalGroup.ALCOHOL) {
      return Optional.empty();
    }
    Heteroatoms hetero = new Heteroatoms(g, substituents);
    Optional<List<Placed>> onNitrogen = hetero.onNitrogen(c.links());
    Optional<String> alcohol =
        group == PrincipalGroup.ESTER ? hetero.alcoholPart(c.links()) : Optional.of("");
    Optional<Substituents.Numbered> numbered =
        substituents.best(c.system(), c.ringAtoms(), c.outside());
    if (onNitrogen.isEmpty() || alcohol.isEmpty() || numbered.isEmpty()) {
      return Optional.empty();
    }
    List<Placed> all = new ArrayList<>(numbered.get().placed());
    all.addAll(onNitrogen.get());
    return NameParts.tooMany(all)
        ? Optional.empty()
        : Optional.of(
            alcohol.get() + NameParts.word(all, true, parent(numbered.get().layout(), group)));
  }

  private static String parent(RingLayout layout, PrincipalGroup group) {
    RingSystem system = layout.system();
    List<String> locants = layout.principalLocants();
    int count = locants.size();
    String ending = multiplied(group.ringSuffix(), count);
    boolean elide = "aeiou".indexOf(ending.charAt(0)) >= 0;
    String at = String.join(",", locants);
    return switch (system.parent().kind()) {
      case BENZENE -> count == 1 ? benzene(group) : at + "-benzen" + (elide ? "" : "e") + ending;
      case CARBOCYCLE -> {
        if (!layout.doubleBonds().isEmpty()) {
          yield layout.unsaturatedStem() + (elide ? "" : "e") + "-" + at + "-" + ending;
        }
        String stem = system.parent().name() + "an" + (elide ? "" : "e");
        yield count == 1 ? stem + ending : at + "-" + stem + ending;
      }
      default ->
          (elide ? system.parent().stem() : system.parent().name()) + "-" + at + "-" + ending;
    };
  }

  private static String multiplied(String suffix, int count) {
    boolean vowel = "aeiou".indexOf(suffix.charAt(0)) >= 0;
    return (count == 4 && vowel ? "tetr" : NameParts.multiplier(count)) + suffix;
  }

  private static String benzene(PrincipalGroup group) {
    return switch (group) {
      case ACID -> "benzoic acid";
      case ESTER -> "benzoate";
      case AMIDE -> "benzamide";
      case NITRILE -> "benzonitrile";
      case ALDEHYDE -> "benzaldehyde";
      case ALCOHOL -> "phenol";
      case THIOL -> "benzenethiol";
      case AMINE -> "aniline";
      case KETONE -> throw new IllegalArgumentException("benzene carries no ketone");
    };
  }
}
