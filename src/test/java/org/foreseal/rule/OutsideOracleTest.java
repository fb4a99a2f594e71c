package org.foreseal.rule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Outcome;
import org.foreseal.molecule.Smiles;
import org.foreseal.quantity.CsvTable;
import org.junit.jupiter.api.Test;

/**
 * Every one-reactant rule on nearly a thousand molecules gives the product sets that an independent
 * general toolkit gave for the same SMIRKS, frozen in the test resources with the script that made
 * them. Structures are compared by identity, after the keto normalisation, so the toolkits'
 * different spelling does not matter.
 */
class OutsideOracleTest {
  private static final String FOLDER = "/oracle/";

  private final RuleLibrary library = RuleLibrary.builtIn();

  @Test
  void productSetsEqualThoseOfAnIndependentToolkit() throws IOException {
    Map<String, Set<String>> oracle = oracle();
    Set<String> explained = new TreeSet<>();
    for (List<String> row : rows("known-differences.csv")) {
      explained.add(row.get(0) + " " + row.get(1));
    }
    List<String> differences = new ArrayList<>();
    Set<String> explainedAndSeen = new TreeSet<>();
    int compared = 0;
    for (String line : lines("molecules.smi")) {
      String smiles = line.substring(0, line.indexOf(' '));
      Molecule molecule = Smiles.read(smiles);
      for (Rule rule : oneReactantRules()) {
        compared++;
        String id = smiles + " " + rule.id();
        Set<String> expected = oracle.getOrDefault(id, Set.of());
        Set<String> ours = ours(rule, molecule);
        if (!ours.equals(expected) && !explained.contains(id)) {
          differences.add(id + "\n    toolkit " + expected + "\n    ours    " + ours);
        } else if (!ours.equals(expected)) {
          explainedAndSeen.add(id);
        }
      }
    }
    assertTrue(compared > 500 * 70, "only " + compared + " pairs compared");
    assertEquals(List.of(), differences, () -> String.join("\n", differences));
    assertEquals(explained, explainedAndSeen, "explained differences that no longer exist");
  }

  @Test
  void theOracleWasMadeWithTheseRules() throws Exception {
    Map<String, String> frozen = new HashMap<>();
    for (List<String> row : rows("rules-used.csv")) {
      frozen.put(row.get(0), row.get(1));
    }
    Map<String, String> now = new HashMap<>();
    for (Rule rule : oneReactantRules()) {
      byte[] text = rule.transformation().toString().getBytes(StandardCharsets.UTF_8);
      now.put(
          rule.id(), HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(text)));
    }
    assertEquals(frozen, now, "run make_oracle.py again after changing a one-reactant rule");
  }

  private List<Rule> oneReactantRules() {
    return library.rules().stream().filter(r -> r.transformation().reactantCount() == 1).toList();
  }

  private static Set<String> ours(Rule rule, Molecule molecule) {
    Set<String> result = new TreeSet<>();
    for (Outcome outcome : rule.transformation().apply(List.of(molecule))) {
      addUnlessUnchanged(result, outcome.products(), molecule);
    }
    return result;
  }

  private static void addUnlessUnchanged(
      Set<String> result, List<Molecule> products, Molecule reactant) {
    if (!products.equals(List.of(reactant))) {
      result.add(products.stream().sorted().map(Molecule::smiles).collect(Collectors.joining(".")));
    }
  }

  private static Map<String, Set<String>> oracle() throws IOException {
    Map<String, Set<String>> oracle = new HashMap<>();
    for (List<String> row : rows("one-reactant.csv")) {
      Set<String> outcomes = new TreeSet<>();
      for (String outcome : row.get(2).split("\\|", -1)) {
        addUnlessUnchanged(
            outcomes, Smiles.readAll(outcome).stream().sorted().toList(), Smiles.read(row.get(0)));
      }
      oracle.put(row.get(0) + " " + row.get(1), outcomes);
    }
    return oracle;
  }

  private static List<List<String>> rows(String name) {
    return CsvTable.read(FOLDER + name).rows();
  }

  private static List<String> lines(String name) throws IOException {
    try (InputStream in = OutsideOracleTest.class.getResourceAsStream(FOLDER + name)) {
      return new String(in.readAllBytes(), StandardCharsets.UTF_8)
          .lines()
          .filter(l -> !l.isBlank())
          .toList();
    }
  }
}
