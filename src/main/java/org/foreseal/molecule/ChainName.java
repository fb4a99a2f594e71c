package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.foreseal.molecule.NameParts.Placed;

/** Names a molecule whose parent is a chain. */
final class ChainName {
  private static final int MOST_GROUPS = 4;

  private final NameGraph g;
  private final Substituents substituents;

  ChainName(NameGraph g, Substituents substituents) {
    this.g = g;
    this.substituents = substituents;
  }

  /** How many groups of this kind the best chain carries. */
  int count(PrincipalGroup group) {
    return new Chains(g, substituents, Set.of(group)).count();
  }

  /** Without a suffix; not for a lone carbon on one ring, where the ring is the parent. */
  Optional<String> plain() {
    return new Chains(g, substituents, Set.of())
        .bestOfAll()
        .filter(n -> n.layout().length() > 1 || n.placed().size() > 1 || g.systems().isEmpty())
        .map(
            n -> {
              ChainLayout chain = n.layout();
              boolean onePlace =
                  chain.length() == 1 || (chain.length() == 2 && n.placed().size() == 1);
              return chain.stereo()
                  + NameParts.word(n.placed(), !onePlace, chain.stemWithBonds() + "e");
            });
  }

  /** With this group as the suffix. */
  Optional<String> of(PrincipalGroup group) {
    Optional<Chains.Numbered> best = new Chains(g, substituents, Set.of(group)).bestOfAll();
    int count = best.map(n -> n.layout().principal().size()).orElse(0);
    if (count == 0 || count > MOST_GROUPS) {
      return Optional.empty();
    }
    ChainLayout chain = best.orElseThrow().layout();
    if (chain.length() == 1 && group.isTerminal() && !chain.sites().isEmpty()) {
      // The carbon of an acid or aldehyde on a ring: formic acid takes no such prefix.
      return Optional.empty();
    }
    Heteroatoms hetero = new Heteroatoms(g, substituents);
    Optional<List<Placed>> onHetero = hetero.onNitrogen(chain.suffixLinks());
    Optional<String> esterAlcohol =
        group == PrincipalGroup.ESTER ? hetero.alcoholPart(chain.suffixLinks()) : Optional.of("");
    if (onHetero.isEmpty() || esterAlcohol.isEmpty()) {
      return Optional.empty();
    }
    List<Placed> all = new ArrayList<>(best.orElseThrow().placed());
    all.addAll(onHetero.get());
    if (NameParts.tooMany(all)) {
      return Optional.empty();
    }
    boolean withLocants = needsLocants(chain, group) || !onHetero.get().isEmpty();
    return Optional.of(
        esterAlcohol.get()
            + chain.stereo()
            + NameParts.word(all, withLocants, parent(chain, group)));
  }

  /** Where only one place is left for prefixes, they need no number: phenylacetic acid. */
  private static boolean needsLocants(ChainLayout chain, PrincipalGroup group) {
    return chain.length() > 2 || (chain.length() == 2 && !group.isTerminal());
  }

  private static String parent(ChainLayout chain, PrincipalGroup group) {
    int count = chain.principal().size();
    Optional<String> retained = retained(chain, group);
    if (retained.isPresent()) {
      return retained.get();
    }
    String times = NameParts.multiplier(count);
    String suffix = group.chainSuffix();
    boolean vowelMeetsVowel = count == 4 && "aeiou".indexOf(suffix.charAt(0)) >= 0;
    String ending = (vowelMeetsVowel ? "tetr" : times) + suffix;
    boolean elide = "aeiou".indexOf(ending.charAt(0)) >= 0;
    String stem = chain.stemWithBonds() + (elide ? "" : "e");
    String locants = suffixLocants(chain, group);
    if (locants.isEmpty()) {
      return stem + ending;
    }
    return chain.isSaturated() || chain.length() == 2
        ? locants + "-" + stem + ending
        : stem + "-" + locants + "-" + ending;
  }

  private static String suffixLocants(ChainLayout chain, PrincipalGroup group) {
    boolean obvious =
        group.isTerminal()
            || chain.length() == 1
            || (chain.length() == 2 && chain.principal().size() == 1);
    return obvious
        ? ""
        : chain.principal().stream().map(String::valueOf).collect(Collectors.joining(","));
  }

  private static Optional<String> retained(ChainLayout chain, PrincipalGroup group) {
    if (chain.length() > 2 || !chain.isSaturated() || chain.principal().size() != 1) {
      return Optional.empty();
    }
    String stem = chain.length() == 1 ? "form" : "acet";
    return switch (group) {
      case ACID -> Optional.of(stem + "ic acid");
      case ESTER -> Optional.of(stem + "ate");
      case AMIDE -> Optional.of(stem + "amide");
      case ALDEHYDE -> Optional.of(stem + "aldehyde");
      case NITRILE -> Optional.of(stem + "onitrile");
      default -> Optional.empty();
    };
  }
}
