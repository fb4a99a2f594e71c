package org.foreseal.rule;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Function;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Pattern;
import org.foreseal.molecule.Smiles;
import org.foreseal.molecule.Transformation;
import org.foreseal.yaml.YamlValue;

/**
 * Reads one rule file. Refuses, with line and column, what does not parse, does not balance or
 * lacks a source.
 */
final class RuleReader {
  private static final Set<String> FILE_KEYS = Set.of("family", "about", "rules", "species-limits");
  private static final Set<String> RULE_KEYS =
      Set.of(
          "id",
          "title",
          "smirks",
          "applies-to",
          "needs",
          "marginal-needs",
          "helped-by",
          "window-C",
          "window",
          "prominence",
          "reverse",
          "stands-for",
          "reactants",
          "guards",
          "near-misses",
          "sources",
          "examples",
          "counter-examples",
          "note");

  private final String family;
  private final List<Rule> rules = new ArrayList<>();
  private final List<SpeciesLimit> limits = new ArrayList<>();

  private RuleReader(String family) {
    this.family = family;
  }

  /** What one file holds. */
  record Contents(String family, String about, List<Rule> rules, List<SpeciesLimit> limits) {}

  static Contents read(String source, String yaml) {
    YamlValue file = YamlValue.parse(source, yaml).mapOf(FILE_KEYS);
    RuleReader reader = new RuleReader(file.require("family").text());
    Set<String> ids = new HashSet<>();
    for (YamlValue node : file.itemsOf("rules")) {
      Rule rule = reader.rule(node.mapOf(RULE_KEYS));
      if (!ids.add(rule.id())) {
        throw node.complaint(
            "rule '" + rule.id() + "' stands twice in this file", "give every rule its own id");
      }
      reader.rules.add(rule);
    }
    for (YamlValue node : file.itemsOf("species-limits")) {
      reader.limits.add(limit(node.mapOf(Set.of("id", "reason", "holds", "refuses", "accepts"))));
    }
    return new Contents(reader.family, file.textOr("about", ""), reader.rules, reader.limits);
  }

  private Rule rule(YamlValue n) {
    Transformation transformation = compiled(n.require("smirks"), Transformation::of);
    return new Rule(
        id(n.require("id")),
        n.require("title").text(),
        family,
        n.require("applies-to").text(),
        transformation,
        needs(n, "needs"),
        needs(n, "marginal-needs"),
        provisions(n.itemsOf("helped-by")),
        window(n),
        n.require("prominence").integer(1, 3),
        n.get("reverse").map(YamlValue::text),
        n.get("stands-for").map(RuleReader::texts),
        pairing(n),
        n.itemsOf("guards").stream()
            .map(g -> GuardReader.read(g, transformation.reactantCount()))
            .toList(),
        n.itemsOf("near-misses").stream().map(RuleReader::nearMiss).toList(),
        sources(n),
        examples(n),
        n.itemsOf("counter-examples").stream().map(RuleReader::texts).toList(),
        n.textOr("note", ""),
        n.place());
  }

  private static String id(YamlValue n) {
    String id = n.text();
    if (!id.matches("[a-z0-9]+([-,.'][a-z0-9]+)*")) {
      throw n.complaint(
          "'" + id + "' is not a rule id", "write lower-case words joined by hyphens");
    }
    return id;
  }

  static <T> T compiled(YamlValue n, Function<String, T> compiler) {
    try {
      return compiler.apply(n.text());
    } catch (IllegalArgumentException e) {
      throw n.complaint(
          String.valueOf(e.getMessage()),
          "check the pattern; every moving hydrogen is written [H:n]");
    }
  }

  private static List<Set<Provision>> needs(YamlValue n, String key) {
    return n.itemsOf(key).stream().map(alternative -> provisions(alternative.items())).toList();
  }

  private static Set<Provision> provisions(List<YamlValue> words) {
    Set<Provision> result = new TreeSet<>();
    words.forEach(w -> result.add(provision(w)));
    return result;
  }

  static Provision provision(YamlValue n) {
    return Provision.of(n.text())
        .orElseThrow(
            () ->
                n.complaint(
                    "'" + n.text() + "' is nothing a run can offer",
                    "one of "
                        + String.join(
                            ", ",
                            Arrays.stream(Provision.values()).map(Provision::word).toList())));
  }

  private static Window window(YamlValue n) {
    YamlValue range = n.require("window-C");
    List<YamlValue> ends = range.items();
    String kind = n.textOr("window", "soft");
    if (ends.size() != 2 || !Set.of("soft", "hard").contains(kind)) {
      throw range.complaint(
          "a window has two temperatures in C and is soft or hard", "write window-C: [220, 400]");
    }
    int low = ends.get(0).integer(-50, 1000);
    int high = ends.get(1).integer(-50, 1000);
    if (low > high) {
      throw range.complaint(
          "the window ends before it begins", "write the lower temperature first");
    }
    return new Window(low, high, kind.equals("hard"));
  }

  private static Rule.Pairing pairing(YamlValue n) {
    Optional<YamlValue> given = n.get("reactants");
    if (given.isEmpty()) {
      return Rule.Pairing.ANY;
    }
    return switch (given.get().text()) {
      case "identical" -> Rule.Pairing.IDENTICAL;
      case "distinct" -> Rule.Pairing.DISTINCT;
      default ->
          throw given
              .get()
              .complaint(
                  "reactants are 'identical' or 'distinct'", "leave it out for no condition");
    };
  }

  private static NearMiss nearMiss(YamlValue n) {
    n.mapOf(Set.of("reason", "smirks", "from", "to"));
    return new NearMiss(
        n.require("reason").text(), compiled(n.require("smirks"), Transformation::of), example(n));
  }

  private static List<Citation> sources(YamlValue n) {
    List<Citation> sources =
        n.itemsOf("sources").stream()
            .map(s -> s.mapOf(Set.of("key", "says")))
            .map(s -> new Citation(s.require("key").text(), s.textOr("says", "")))
            .toList();
    if (sources.isEmpty()) {
      throw n.complaint(
          "the rule has no source", "add sources: [{key: ...}]; 'common-practice' is a key too");
    }
    return sources;
  }

  private static List<Example> examples(YamlValue n) {
    List<Example> examples =
        n.itemsOf("examples").stream().map(e -> example(e.mapOf(Set.of("from", "to")))).toList();
    if (examples.isEmpty()) {
      throw n.complaint(
          "the rule has no example", "add examples: [{from: [SMILES], to: [SMILES]}]");
    }
    return examples;
  }

  private static Example example(YamlValue n) {
    return new Example(texts(n.require("from")), texts(n.require("to")));
  }

  static List<String> texts(YamlValue n) {
    return n.items().stream().map(YamlValue::text).toList();
  }

  static Set<Molecule> molecules(YamlValue n) {
    Set<Molecule> result = new HashSet<>();
    for (YamlValue item : n.items()) {
      result.addAll(Smiles.readAll(item.text(), item.place()));
    }
    return result;
  }

  private static SpeciesLimit limit(YamlValue n) {
    return new SpeciesLimit(
        id(n.require("id")),
        n.require("reason").text(),
        compiled(n.require("holds"), Pattern::of),
        texts(n.require("refuses")),
        texts(n.require("accepts")),
        n.place());
  }
}
