package org.foreseal.rule;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Outcome;
import org.foreseal.molecule.Pattern;
import org.foreseal.molecule.Smiles;
import org.foreseal.molecule.Transformation;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;

/**
 * Runs the self-tests that rules carry: examples give their products, counter-examples give
 * nothing, every guard refuses its own case and would be needed for it, species limits refuse and
 * accept what they say, references to other rules resolve.
 */
public final class RuleCheck {
  private static final double ROOM_TEMPERATURE = 25;

  private RuleCheck() {}

  /**
   * One failed self-test.
   *
   * @param rule rule id or limit id
   * @param place file and line
   * @param problem what is wrong
   */
  public record Failure(String rule, Place place, String problem) {}

  /**
   * All failures of a library; {@code known} are ids that its rules may refer to besides its own.
   */
  public static List<Failure> run(RuleLibrary library, Set<String> known) {
    List<Failure> failures = new ArrayList<>();
    Set<String> ids = new HashSet<>(known);
    library.rules().forEach(r -> ids.add(r.id()));
    for (Rule rule : library.rules()) {
      for (String problem : problems(rule, ids)) {
        failures.add(new Failure(rule.id(), rule.place(), problem));
      }
    }
    for (SpeciesLimit limit : library.speciesLimits()) {
      for (String problem : problems(limit)) {
        failures.add(new Failure(limit.id(), limit.place(), problem));
      }
    }
    return failures;
  }

  /** The number of self-tests a library holds. */
  public static int count(RuleLibrary library) {
    int rules =
        library.rules().stream()
            .mapToInt(
                r ->
                    r.examples().size()
                        + r.counterExamples().size()
                        + r.guards().size()
                        + r.nearMisses().size())
            .sum();
    return rules
        + library.speciesLimits().stream()
            .mapToInt(l -> l.refuses().size() + l.accepts().size())
            .sum();
  }

  private static List<String> problems(Rule rule, Set<String> ids) {
    List<String> problems = new ArrayList<>();
    try {
      rule.examples().forEach(e -> checkExample(rule.transformation(), e, problems));
      rule.counterExamples().forEach(c -> checkCounterExample(rule.transformation(), c, problems));
      rule.guards().forEach(g -> checkGuard(rule, g, problems));
      rule.nearMisses().forEach(m -> checkNearMiss(rule, m, problems));
    } catch (BadInputException e) {
      problems.add(e.getMessage() + " in '" + e.place().text() + "'");
    }
    rule.reverse()
        .filter(r -> !ids.contains(r))
        .ifPresent(r -> problems.add("reverse '" + r + "' is no rule"));
    rule.standsFor().orElse(List.of()).stream()
        .filter(r -> !ids.contains(r))
        .forEach(r -> problems.add("stands-for '" + r + "' is no rule"));
    return problems;
  }

  private static void checkExample(Transformation t, Example example, List<String> problems) {
    if (example.from().size() != t.reactantCount()) {
      problems.add("example " + example.from() + " has not " + t.reactantCount() + " reactants");
      return;
    }
    List<Molecule> wanted = molecules(example.to());
    List<Outcome> outcomes = t.apply(molecules(example.from()));
    if (outcomes.stream().noneMatch(o -> o.products().containsAll(wanted))) {
      problems.add(
          "example "
              + example.from()
              + " should give "
              + example.to()
              + " but gives "
              + outcomes.stream().map(Outcome::products).toList());
    }
  }

  private static void checkCounterExample(
      Transformation t, List<String> from, List<String> problems) {
    List<Outcome> outcomes = outcomes(t, from);
    if (!outcomes.isEmpty()) {
      problems.add("counter-example " + from + " gives " + outcomes.get(0).products());
    }
  }

  private static List<Outcome> outcomes(Transformation t, List<String> from) {
    return from.size() == t.reactantCount() ? t.apply(molecules(from)) : List.of();
  }

  private static void checkGuard(Rule rule, Guard guard, List<String> problems) {
    List<Outcome> outcomes = outcomes(rule.transformation(), guard.stops());
    if (outcomes.isEmpty()) {
      problems.add(
          "guard case "
              + guard.stops()
              + " does not need the guard: the pattern takes nothing there");
      return;
    }
    Set<Provision> offered = guard instanceof Guard.NotWith n ? Set.of(n.provision()) : Set.of();
    Surroundings bare = new Surroundings(offered, Set.of(), ROOM_TEMPERATURE, ROOM_TEMPERATURE);
    List<Molecule> reactants = molecules(guard.stops());
    boolean refuses =
        outcomes.stream()
            .anyMatch(o -> guard.refuses(new Guard.Attempt(reactants, o.products(), bare)));
    if (!refuses) {
      problems.add("guard '" + guard.reason() + "' does not refuse its own case " + guard.stops());
    }
  }

  private static void checkNearMiss(Rule rule, NearMiss miss, List<String> problems) {
    checkExample(miss.transformation(), miss.example(), problems);
    List<Molecule> wanted = molecules(miss.example().to());
    boolean made =
        outcomes(rule.transformation(), miss.example().from()).stream()
            .anyMatch(o -> o.products().containsAll(wanted));
    if (made) {
      problems.add("near miss " + miss.example().from() + " is made by the rule itself");
    }
  }

  private static List<String> problems(SpeciesLimit limit) {
    List<String> problems = new ArrayList<>();
    Pattern pattern = limit.pattern();
    for (String smiles : limit.refuses()) {
      if (!pattern.isIn(Smiles.read(smiles))) {
        problems.add("does not refuse " + smiles);
      }
    }
    for (String smiles : limit.accepts()) {
      if (pattern.isIn(Smiles.read(smiles))) {
        problems.add("refuses " + smiles);
      }
    }
    return problems;
  }

  private static List<Molecule> molecules(List<String> smiles) {
    return smiles.stream().map(Smiles::read).toList();
  }
}
