package org.foreseal.rule;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Transformation;
import org.foreseal.quantity.Place;

/**
 * One reaction of the library.
 *
 * @param id unique id in kebab case
 * @param title what it does, in words
 * @param family name of its family
 * @param appliesTo which structures it takes, in words
 * @param transformation the reaction
 * @param needs alternatives, each a set that must be offered completely; none means no need
 * @param marginalNeeds further alternatives that count as marginal
 * @param helpedBy what speeds it up
 * @param window temperatures
 * @param prominence 1 core, 2 usual, 3 marginal
 * @param reverse id of the rule that runs backwards
 * @param standsFor given for a net rule: the chain of rules it sums up, empty when its steps have
 *     none; never add the rates of both
 * @param pairing whether its reactants must be the same or different molecules
 * @param guards conditions that refuse a site
 * @param nearMisses products one might expect in vain
 * @param sources where it comes from
 * @param examples cases that must work
 * @param counterExamples reactants, as SMILES, it must not take
 * @param note remark
 * @param place where it stands in its file
 */
public record Rule(
    String id,
    String title,
    String family,
    String appliesTo,
    Transformation transformation,
    List<Set<Provision>> needs,
    List<Set<Provision>> marginalNeeds,
    Set<Provision> helpedBy,
    Window window,
    int prominence,
    Optional<String> reverse,
    Optional<List<String>> standsFor,
    Pairing pairing,
    List<Guard> guards,
    List<NearMiss> nearMisses,
    List<Citation> sources,
    List<Example> examples,
    List<List<String>> counterExamples,
    String note,
    Place place) {
  private static final int MARGINAL = 3;

  /** Whether the reactants must be the same or different. */
  public enum Pairing {
    /** No condition. */
    ANY,
    /** All reactants are the same molecule. */
    IDENTICAL,
    /** All reactants differ. */
    DISTINCT
  }

  /** Keeps unmodifiable copies. */
  public Rule {
    needs = List.copyOf(needs);
    marginalNeeds = List.copyOf(marginalNeeds);
    helpedBy = Set.copyOf(helpedBy);
    standsFor = standsFor.map(List::copyOf);
    guards = List.copyOf(guards);
    nearMisses = List.copyOf(nearMisses);
    sources = List.copyOf(sources);
    examples = List.copyOf(examples);
    counterExamples = List.copyOf(counterExamples);
  }

  /**
   * The first alternative of the needs that the run meets, the usual ones before the marginal ones.
   */
  public Optional<Set<Provision>> metNeed(Surroundings run) {
    if (needs.isEmpty()) {
      return Optional.of(Set.of());
    }
    Optional<Set<Provision>> usual = firstMet(needs, run);
    return usual.isPresent() ? usual : firstMet(marginalNeeds, run);
  }

  private static Optional<Set<Provision>> firstMet(
      List<Set<Provision>> alternatives, Surroundings run) {
    return alternatives.stream().filter(run.offered()::containsAll).findFirst();
  }

  /** Prominence in this run: marginal when only a marginal need is met. */
  public int prominenceIn(Surroundings run) {
    return needs.isEmpty() || firstMet(needs, run).isPresent() ? prominence : MARGINAL;
  }

  /** Why the whole rule is closed in this run, if it is. */
  public Optional<String> closedBecause(Surroundings run) {
    if (metNeed(run).isEmpty()) {
      return Optional.of("needs " + needsInWords());
    }
    if (window.forbids(run)) {
      return Optional.of(
          String.format(
              Locale.ROOT,
              "only between %.0f and %.0f C",
              window.lowCelsius(),
              window.highCelsius()));
    }
    return Optional.empty();
  }

  /** The needs as text: {@code oxide, or acid with hydrogen}. */
  public String needsInWords() {
    return String.join(", or ", needs.stream().map(Rule::inWords).toList());
  }

  private static String inWords(Set<Provision> all) {
    if (all.isEmpty()) {
      return "heat alone";
    }
    return String.join(" with ", all.stream().sorted().map(Provision::word).toList());
  }

  /** Whether these reactants satisfy the pairing. */
  public boolean pairs(List<Molecule> reactants) {
    long different = reactants.stream().distinct().count();
    return switch (pairing) {
      case ANY -> true;
      case IDENTICAL -> different == 1;
      case DISTINCT -> different == reactants.size();
    };
  }

  /** Whether a guard refuses these reactants whatever the products would be. */
  public boolean refusesReactants(List<Molecule> reactants, Surroundings run) {
    Guard.Attempt attempt = new Guard.Attempt(reactants, List.of(), run);
    return guards.stream().anyMatch(g -> g.refuses(attempt));
  }

  /** The first guard that refuses the attempt. */
  public Optional<Guard> refusedBy(Guard.Attempt attempt) {
    return guards.stream().filter(g -> g.refuses(attempt)).findFirst();
  }
}
