package org.foreseal.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.foreseal.rule.Bibliography;
import org.foreseal.rule.Citation;
import org.foreseal.rule.Guard;
import org.foreseal.rule.Provision;
import org.foreseal.rule.Rule;

/** Shows a rule to people. */
final class RuleWords {
  private RuleWords() {}

  static RuleSummary summary(Rule rule, Bibliography references) {
    return new RuleSummary(
        rule.id(),
        rule.family(),
        rule.title(),
        rule.needs().stream().map(RuleWords::joined).toList(),
        Optional.of(
            new RuleSummary.Window(rule.window().lowCelsius(), rule.window().highCelsius())),
        rule.prominence(),
        facts(rule, references));
  }

  private static String joined(Set<Provision> all) {
    return all.isEmpty()
        ? "heat"
        : String.join(" + ", all.stream().sorted().map(Provision::word).toList());
  }

  private static List<RuleSummary.Fact> facts(Rule rule, Bibliography references) {
    List<RuleSummary.Fact> facts = new ArrayList<>();
    add(facts, "applies to", rule.appliesTo());
    add(facts, "reaction", rule.transformation().toString());
    add(facts, "window", rule.window().isHard() ? "hard: closed more than 20 C outside" : "");
    add(facts, "helped by", joinedOrNothing(rule.helpedBy()));
    add(facts, "reverse", rule.reverse().orElse(""));
    rule.standsFor()
        .ifPresent(
            chain ->
                add(
                    facts,
                    "net rule of",
                    chain.isEmpty() ? "a chain without rules" : String.join(", ", chain)));
    for (Guard guard : rule.guards()) {
      add(facts, "guard", guard.reason());
    }
    rule.nearMisses().forEach(m -> add(facts, "near miss", m.reason()));
    for (Citation source : rule.sources()) {
      add(facts, "source", words(source, references));
    }
    rule.examples()
        .forEach(
            e ->
                add(
                    facts,
                    "example",
                    String.join(" + ", e.from()) + " = " + String.join(" + ", e.to())));
    rule.counterExamples().forEach(c -> add(facts, "takes not", String.join(" + ", c)));
    add(facts, "note", rule.note());
    add(facts, "from", rule.place().label());
    return facts;
  }

  /** The reference where the key resolves, the key itself for a reader's own. */
  private static String words(Citation source, Bibliography references) {
    String reference = references.find(source.key()).orElse(source.key());
    return reference + (source.says().isEmpty() ? "" : ": " + source.says());
  }

  private static String joinedOrNothing(Set<Provision> all) {
    return all.isEmpty() ? "" : joined(all);
  }

  private static void add(List<RuleSummary.Fact> facts, String label, String text) {
    if (!text.isBlank()) {
      facts.add(new RuleSummary.Fact(label, text));
    }
  }
}
