package org.foreseal.rule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.foreseal.quantity.BadInputException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Every kind of bad rule is planted once and must be found, with file and line. */
class RuleLoadingTest {
  private static final String GOOD =
      """
      family: own
      about: rules of the reader
      rules:
        - id: own-decarboxylation
          title: acid to alkane and CO2
          smirks: "[C;X4:1][C:2](=[O:3])[O:4][H:5]>>[C:1][H:5].[O:3]=[C:2]=[O:4]"
          applies-to: any saturated acid
          needs: [[water], []]
          helped-by: [metal]
          window-C: [250, 400]
          prominence: 2
          guards:
            - reason: not next to a hydroxyl
              holds: "[OX2H1][CX4]"
              stops: ["OCC(=O)O"]
          sources:
            - {key: common-practice}
          examples:
            - {from: ["CC(=O)O"], to: ["C", "O=C=O"]}
          counter-examples:
            - ["OC(=O)c1ccccc1"]
      species-limits:
        - {id: own-limit, reason: none of these, holds: "[OX2][OX2]", refuses: ["COOC"], accepts: ["COC"]}
      """;

  private static RuleLibrary library(String yaml) {
    return RuleLibrary.of(Map.of("own.yaml", yaml));
  }

  @Test
  void aGoodRuleLoadsAndPasses() {
    RuleLibrary library = library(GOOD);
    assertEquals(List.of(), RuleCheck.run(library, Set.of()));
    Rule rule = library.find("own-decarboxylation").orElseThrow();
    assertEquals("own", rule.family());
    assertEquals(4, rule.place().line());
    assertTrue(rule.standsFor().isEmpty());
    assertEquals("water, or heat alone", rule.needsInWords());
  }

  @ParameterizedTest
  @CsvSource(
      delimiterString = " -> ",
      quoteCharacter = '`',
      value = {
        "id: own-decarboxylation -> id: Own Rule -> 4 -> is not a rule id",
        "title: acid to alkane and CO2 -> titel: x -> 5 -> unknown key 'titel'",
        "title: acid to alkane and CO2 -> note: x -> 4 -> 'title' is missing",
        "[O:4][H:5]>> -> [O:4]>> -> 6 -> only among the products",
        "[C:1][H:5].[O:3] -> [C:1].[O:3] -> 6 -> only among the reactants",
        "[C;X4:1][C:2] -> [C;X4:1[C:2] -> 6 -> SMARTS not understood",
        "needs: [[water], []] -> needs: [[watter]] -> 8 -> nothing a run can offer",
        "needs: [[water], []] -> needs: [water] -> 8 -> a list is expected",
        "window-C: [250, 400] -> window-C: [400, 250] -> 10 -> ends before it begins",
        "window-C: [250, 400] -> window-C: [250] -> 10 -> two temperatures",
        "window-C: [250, 400] -> window-C: [warm, 400] -> 10 -> not a whole number",
        "prominence: 2 -> prominence: 7 -> 11 -> out of range",
        "prominence: 2 -> reactants: some -> 4 -> 'prominence' is missing",
        "holds: \"[OX2H1][CX4]\" -> holds: \"[OX2H1\" -> 14 -> SMARTS not understood",
        "holds: \"[OX2H1][CX4]\" -> at-most: 3 -> 13 -> exactly one test",
        "holds: \"[OX2H1][CX4]\" -> not-with: gold -> 14 -> nothing a run can offer",
        "holds: \"[OX2H1][CX4]\" -> partners: nobody -> 14 -> unknown word for partners",
        "- {key: common-practice} -> [] -> 4 -> the rule has no source",
        "- {key: common-practice} -> - {says: nothing} -> 17 -> 'key' is missing",
        "- {from: [\"CC(=O)O\"], to: [\"C\", \"O=C=O\"]} -> [] -> 4 -> the rule has no example",
        "family: own -> famly: own -> 1 -> unknown key 'famly'",
        "rules: -> rules: [ -> 3 -> not valid YAML",
        "about: rules of the reader -> family: twice -> 2 -> given twice"
      })
  void aPlantedFaultIsFoundWithItsLine(String good, String bad, int line, String complaint) {
    String yaml = GOOD.replace(good, bad);
    assertFalse(yaml.equals(GOOD), "the fault was not planted");
    BadInputException e = assertThrows(BadInputException.class, () -> library(yaml));
    assertTrue(e.report().contains(complaint), e::report);
    assertEquals("own.yaml", e.place().source());
    assertEquals(line, e.place().line(), e::report);
    assertFalse(e.hint().isBlank());
  }

  @ParameterizedTest
  @CsvSource(
      delimiterString = " -> ",
      quoteCharacter = '`',
      value = {
        "to: [\"C\", \"O=C=O\"] -> to: [\"CC\", \"O=C=O\"] -> should give",
        "from: [\"CC(=O)O\"] -> from: [\"CC(=O)O\", \"O\"] -> has not 1 reactants",
        "from: [\"CC(=O)O\"] -> from: [\"CC(=O)Q\"] -> SMILES not understood",
        "- [\"OC(=O)c1ccccc1\"] -> - [\"CCC(=O)O\"] -> counter-example",
        "stops: [\"OCC(=O)O\"] -> stops: [\"CC(=O)O\"] -> does not refuse its own case",
        "stops: [\"OCC(=O)O\"] -> stops: [\"CCO\"] -> does not need the guard",
        "prominence: 2 -> reverse: no-such-rule\\n    prominence: 2 -> is no rule",
        "prominence: 2 -> stands-for: [no-such-rule]\\n    prominence: 2 -> is no rule",
        "refuses: [\"COOC\"] -> refuses: [\"COC\"] -> does not refuse COC",
        "accepts: [\"COC\"] -> accepts: [\"COOC\"] -> refuses COOC"
      })
  void aRuleThatFailsItsOwnSelfTestsIsNamed(String good, String bad, String complaint) {
    String yaml = GOOD.replace(good, bad.replace("\\n", "\n"));
    assertFalse(yaml.equals(GOOD), "the fault was not planted");
    String failures =
        RuleCheck.run(library(yaml), Set.of()).stream()
            .map(Object::toString)
            .collect(Collectors.joining("\n"));
    assertTrue(failures.contains(complaint), failures);
  }

  @Test
  void aRuleStandsOnceInALibrary() {
    BadInputException e =
        assertThrows(
            BadInputException.class, () -> RuleLibrary.of(Map.of("a.yaml", GOOD, "b.yaml", GOOD)));
    assertTrue(e.report().contains("stands also at a.yaml:4"), e::report);
  }

  @Test
  void anOwnFolderAddsAndReplaces(@TempDir Path folder) throws IOException {
    Files.writeString(
        folder.resolve("own.yaml"), GOOD.replace("own-decarboxylation", "decarboxylation-alkyl"));
    Files.writeString(folder.resolve("more.yaml"), GOOD.replace("own-limit", "other-limit"));
    Files.writeString(folder.resolve("notes.txt"), "not a rule file");
    RuleLibrary builtIn = RuleLibrary.builtIn();
    RuleLibrary both = builtIn.with(RuleLibrary.folder(folder));
    assertEquals(builtIn.rules().size() + 1, both.rules().size());
    assertEquals("own", both.find("decarboxylation-alkyl").orElseThrow().family());
    assertFalse(builtIn.digest().equals(both.digest()));
  }

  @Test
  void everyBuiltInFileIsInTheIndexAndEverySourceKeyResolves() throws IOException {
    Path folder = Path.of("rules");
    try (var files = Files.list(folder)) {
      assertEquals(
          files
              .map(f -> f.getFileName().toString())
              .filter(f -> f.endsWith(".yaml"))
              .sorted()
              .toList(),
          Files.readAllLines(folder.resolve("index.txt")));
    }
    Set<String> keys = new TreeSet<>(Bibliography.builtIn().keys());
    Set<String> used =
        RuleLibrary.builtIn().rules().stream()
            .flatMap(r -> r.sources().stream())
            .map(Citation::key)
            .collect(Collectors.toSet());
    assertTrue(
        keys.containsAll(used),
        () -> "unresolved: " + used.stream().filter(k -> !keys.contains(k)).toList());
    keys.removeAll(used);
    assertEquals(Set.of(), keys, "references nothing cites");
  }

  @Test
  void damagedRuleFilesEndInAComplaintOrLoad() {
    long seed = Long.getLong("tests.seed", 20261201L);
    Random random = new Random(seed);
    int refused = 0;
    for (int i = 0; i < 2000; i++) {
      StringBuilder yaml = new StringBuilder(GOOD);
      for (int k = 0; k <= random.nextInt(4); k++) {
        int at = random.nextInt(yaml.length());
        switch (random.nextInt(4)) {
          case 0 -> yaml.deleteCharAt(at);
          case 1 -> yaml.insert(at, "[]{}:-\"'>#\n\t%&*!|".charAt(random.nextInt(17)));
          case 2 -> yaml.setLength(Math.max(1, at));
          default -> yaml.setCharAt(at, (char) (32 + random.nextInt(95)));
        }
      }
      try {
        RuleCheck.run(library(yaml.toString()), Set.of());
      } catch (BadInputException e) {
        refused++;
        assertFalse(e.hint().isBlank(), "seed " + seed + " case " + i);
      }
    }
    assertTrue(refused > 200, "seed " + seed + ": only " + refused + " refused");
  }
}
