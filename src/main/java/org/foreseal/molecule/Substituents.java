package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;
import org.foreseal.molecule.NameParts.Placed;
import org.foreseal.molecule.NameParts.Prefix;

/** Names what hangs on a parent. */
final class Substituents {
  private static final Pattern SHORT_OXY = Pattern.compile("(meth|eth|prop|but|phen)yl$");

  private final NameGraph g;
  private final Molecule m;

  /** Parts named before: many equally good chains carry the same ones. */
  private final Map<Long, Optional<Prefix>> named = new HashMap<>();

  Substituents(NameGraph g) {
    this.g = g;
    this.m = g.molecule();
  }

  /** The prefix of the part that begins with {@code atom} and hangs on {@code on}. */
  Optional<Prefix> prefix(int atom, int on) {
    long part = (long) atom * m.atomCount() + on;
    Optional<Prefix> known = named.get(part);
    if (known == null) {
      known = named(atom, on);
      named.put(part, known);
    }
    return known;
  }

  private Optional<Prefix> named(int atom, int on) {
    int order = g.order(atom, on);
    if (order == 2 && g.is(atom, ChemicalElement.O)) {
      return Optional.of(Prefix.simple("oxo"));
    }
    if (order == 2 && g.is(atom, ChemicalElement.C)) {
      return g.inRing(atom)
          ? ringPrefix(atom, on).map(p -> new Prefix(p.text() + "idene", p.complex()))
          : SideChain.ylidene(g, this, atom, on);
    }
    if (order != 1) {
      return Optional.empty();
    }
    if (g.inRing(atom)) {
      return ringPrefix(atom, on);
    }
    return switch (ChemicalElement.require(m.element(atom))) {
      case F -> Optional.of(Prefix.simple("fluoro"));
      case CL -> Optional.of(Prefix.simple("chloro"));
      case BR -> Optional.of(Prefix.simple("bromo"));
      case I -> Optional.of(Prefix.simple("iodo"));
      case O -> oxygenPrefix(atom, on);
      case S -> sulfurPrefix(atom, on);
      case N -> nitrogenPrefix(atom, on);
      case C -> carbonPrefix(atom, on);
      default -> Optional.empty();
    };
  }

  private int otherThan(int atom, int on) {
    return m.neighbour(atom, 0) == on ? m.neighbour(atom, 1) : m.neighbour(atom, 0);
  }

  private Optional<Prefix> oxygenPrefix(int atom, int on) {
    if (m.degree(atom) == 1) {
      return Optional.of(Prefix.simple("hydroxy"));
    }
    return prefix(otherThan(atom, on), atom).map(Substituents::oxy);
  }

  /** Methyl gives methoxy, 2-hydroxyethyl 2-hydroxyethoxy, pentyl pentyloxy. */
  private static Prefix oxy(Prefix carbonPart) {
    String shortened = SHORT_OXY.matcher(carbonPart.text()).replaceFirst("$1oxy");
    return shortened.equals(carbonPart.text())
        ? Prefix.complex(carbonPart.bracketed() + "oxy")
        : new Prefix(shortened, carbonPart.complex());
  }

  private Optional<Prefix> sulfurPrefix(int atom, int on) {
    if (m.degree(atom) == 1) {
      // Complex, so that two of them are bis(sulfanyl): disulfanyl is another group.
      return Optional.of(Prefix.complex("sulfanyl"));
    }
    int other = otherThan(atom, on);
    return g.is(other, ChemicalElement.C)
        ? prefix(other, atom).map(r -> Prefix.complex(r.bracketed() + "sulfanyl"))
        : Optional.empty();
  }

  private Optional<Prefix> nitrogenPrefix(int atom, int on) {
    if (g.isNitro(atom)) {
      return Optional.of(Prefix.simple("nitro"));
    }
    return new Heteroatoms(g, this)
        .beyond(new Heteroatoms.Link(on, atom))
        .map(parts -> unnumbered(parts, "amino"));
  }

  /** "methylamino", "cyclohexyl(methyl)amino". */
  private static Prefix unnumbered(List<Prefix> parts, String base) {
    List<Placed> placed = parts.stream().map(p -> new Placed(p, "", 0)).toList();
    return parts.isEmpty()
        ? Prefix.simple(base)
        : Prefix.complex(NameParts.join(placed, false) + base);
  }

  private Optional<Prefix> carbonPrefix(int atom, int on) {
    Optional<PrincipalGroup> group = g.group(atom);
    if (group.isPresent() && group.get().isTerminal()) {
      return groupPrefix(atom, on, group.get());
    }
    return group.filter(x -> x == PrincipalGroup.KETONE).isPresent()
        ? Acyl.prefix(g, this, atom, on).or(() -> SideChain.prefix(g, this, atom, on))
        : SideChain.prefix(g, this, atom, on);
  }

  private Optional<Prefix> groupPrefix(int atom, int on, PrincipalGroup group) {
    return switch (group) {
      case ACID -> Optional.of(Prefix.simple("carboxy"));
      case NITRILE -> Optional.of(Prefix.simple("cyano"));
      case ALDEHYDE -> Optional.of(Prefix.simple("formyl"));
      case ESTER -> carbonylOxy(atom, on);
      case AMIDE -> carbamoyl(atom, on);
      default -> Optional.empty();
    };
  }

  /** Empty when the part hangs on by the alcohol side of the ester or by the amide nitrogen. */
  private Optional<Prefix> carbonylOxy(int atom, int on) {
    int oxygen = g.neighbour(atom, ChemicalElement.O, 1);
    if (oxygen == on) {
      return Acyl.prefix(g, this, atom, on);
    }
    return prefix(otherThan(oxygen, atom), oxygen)
        .map(
            r ->
                switch (r.text()) {
                  case "methyl", "ethyl" ->
                      Prefix.complex(r.text().substring(0, r.text().length() - 2) + "oxycarbonyl");
                  default -> Prefix.complex(r.bracketed() + "oxycarbonyl");
                });
  }

  private Optional<Prefix> carbamoyl(int atom, int on) {
    int nitrogen = g.neighbour(atom, ChemicalElement.N, 1);
    if (nitrogen == on) {
      return Acyl.prefix(g, this, atom, on);
    }
    return new Heteroatoms(g, this)
        .beyond(new Heteroatoms.Link(atom, nitrogen))
        .map(parts -> unnumbered(parts, "carbamoyl"));
  }

  private Optional<Prefix> ringPrefix(int atom, int on) {
    RingSystem system = g.systemOf(atom).orElseThrow();
    if (system.isFixed()) {
      return Optional.empty();
    }
    return best(system, List.of(atom), Set.of(on))
        .map(
            n -> {
              String base = radical(n.layout(), atom);
              boolean bare = n.placed().isEmpty() && base.matches("[a-z]+");
              return new Prefix(NameParts.word(n.placed(), true, base), !bare);
            });
  }

  /**
   * A ring numbered and its prefixes named.
   *
   * @param layout the numbering
   * @param placed the prefixes
   */
  record Numbered(RingLayout layout, List<Placed> placed) {}

  /** The best numbering, or nothing when a substituent has no name. */
  Optional<Numbered> best(RingSystem system, List<Integer> principal, Set<Integer> except) {
    List<RingLayout> layouts =
        system.numberings().stream().map(n -> new RingLayout(g, system, n, principal)).toList();
    RingLayout lowest = Collections.min(layouts);
    return layouts.stream()
        .filter(l -> l.compareTo(lowest) == 0)
        .flatMap(l -> placed(l, except).map(p -> new Numbered(l, p)).stream())
        .min(Comparator.comparing(Numbered::placed, NameParts.ALPHABETICALLY))
        .filter(n -> !NameParts.tooMany(n.placed()));
  }

  /** The prefixes on a ring, but for what stands at {@code except}. */
  private Optional<List<Placed>> placed(RingLayout layout, Set<Integer> except) {
    List<Placed> result = new ArrayList<>();
    for (RingLayout.Site site : layout.substituents()) {
      if (!except.contains(site.substituent())) {
        Optional<Prefix> p = prefix(site.substituent(), site.ringAtom());
        if (p.isEmpty()) {
          return Optional.empty();
        }
        result.add(new Placed(p.get(), site.locant(), site.rank()));
      }
    }
    return Optional.of(result);
  }

  private static String radical(RingLayout layout, int atom) {
    RingSystem system = layout.system();
    String locant = layout.locantOf(atom);
    return switch (system.parent().kind()) {
      case BENZENE -> "phenyl";
      case CARBOCYCLE ->
          layout.doubleBonds().isEmpty()
              ? system.parent().name() + "yl"
              : layout.unsaturatedStem() + "-" + locant + "-yl";
      default -> system.parent().stem() + "-" + locant + "-yl";
    };
  }
}
