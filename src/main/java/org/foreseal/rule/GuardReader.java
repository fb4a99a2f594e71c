package org.foreseal.rule;

import java.util.List;
import java.util.Set;
import org.foreseal.molecule.Pattern;

/** Reads one guard of a rule. */
final class GuardReader {
  private static final Set<String> TESTS =
      Set.of("holds", "products-hold", "partners", "only-if-charged", "not-with", "charge-lacks");
  private static final Set<String> KEYS =
      Set.of(
          "reason",
          "stops",
          "reactant",
          "at-most",
          "unless",
          "holds",
          "products-hold",
          "partners",
          "only-if-charged",
          "not-with",
          "charge-lacks");

  private GuardReader() {}

  static Guard read(YamlNode n, int reactantCount) {
    n.mapOf(KEYS);
    List<String> tests = n.keys().stream().filter(TESTS::contains).toList();
    if (tests.size() != 1) {
      throw n.complaint(
          "a guard has exactly one test",
          "one of " + String.join(", ", TESTS.stream().sorted().toList()));
    }
    String reason = n.require("reason").text();
    List<String> stops = RuleReader.texts(n.require("stops"));
    YamlNode test = n.require(tests.get(0));
    return switch (tests.get(0)) {
      case "holds" -> holds(n, reason, stops, reactantCount);
      case "products-hold" ->
          new Guard.ProductHolds(reason, stops, RuleReader.compiled(test, Pattern::of));
      case "partners" -> new Guard.PartnersAre(reason, stops, partners(test));
      case "only-if-charged" -> new Guard.OnlyIfCharged(reason, stops, RuleReader.molecules(test));
      case "not-with" -> new Guard.NotWith(reason, stops, RuleReader.provision(test));
      default -> new Guard.ChargeLacks(reason, stops, RuleReader.molecules(test));
    };
  }

  private static Guard holds(YamlNode n, String reason, List<String> stops, int reactantCount) {
    int reactant =
        n.textOr("reactant", "any").equals("any")
            ? -1
            : n.require("reactant").integer(1, reactantCount) - 1;
    int atMost = n.has("at-most") ? n.require("at-most").integer(0, 60) : 0;
    Pattern pattern = RuleReader.compiled(n.require("holds"), Pattern::of);
    return new Guard.ReactantHolds(reason, stops, reactant, pattern, atMost, unless(n));
  }

  private static Guard.Unless unless(YamlNode n) {
    if (!n.has("unless")) {
      return Guard.Unless.NEVER;
    }
    YamlNode word = n.require("unless");
    return switch (word.text()) {
      case "charged" -> Guard.Unless.CHARGED;
      case "all-charged" -> Guard.Unless.ALL_CHARGED;
      case "any-charged" -> Guard.Unless.ANY_CHARGED;
      default ->
          throw word.complaint(
              "a guard is lifted unless: charged, any-charged or all-charged", "use one of them");
    };
  }

  private static Guard.Partners partners(YamlNode n) {
    return switch (n.text()) {
      case "all-charged" -> Guard.Partners.ALL_CHARGED;
      case "one-charged" -> Guard.Partners.ONE_CHARGED;
      case "same-or-charged" -> Guard.Partners.SAME_OR_CHARGED;
      default ->
          throw n.complaint(
              "unknown word for partners", "all-charged, one-charged or same-or-charged");
    };
  }
}
