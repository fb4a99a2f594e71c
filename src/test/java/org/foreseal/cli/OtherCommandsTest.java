package org.foreseal.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class OtherCommandsTest {
  private static CommandRun done(String... arguments) {
    CommandRun run = CommandRun.of(arguments);
    assertEquals(ExitCode.DONE, run.code(), run.err());
    run.out().lines().forEach(l -> assertFalse(l.endsWith(" "), l));
    return run;
  }

  private static JsonNode json(String... arguments) throws IOException {
    return new ObjectMapper().readTree(done(arguments).out());
  }

  @Test
  void showsAFirstScreenOfAtMost24Lines() {
    CommandRun bare = done();
    assertEquals(bare.out(), done("--help").out());
    assertTrue(bare.out().lines().count() <= 24, bare.out());
    assertEquals(2, bare.out().lines().filter(l -> l.startsWith("  foreseal ")).count());
  }

  @ParameterizedTest
  @ValueSource(strings = {"forecast", "alpha-h", "routes", "rules"})
  void endsHelpWithExamplesUnitsAndExitCodes(String command) {
    String help = done(command, "--help").out();
    assertTrue(help.indexOf("Examples:") < help.indexOf("Units:"), help);
    assertTrue(help.indexOf("Units:") < help.indexOf("Exit codes: 0 done"), help);
    help.lines().forEach(l -> assertTrue(l.length() <= 80, l));
  }

  @Test
  void showsTheVersion() {
    assertTrue(done("--version").out().startsWith("foreseal "));
    assertTrue(done("rules", "--version").out().startsWith("foreseal "));
  }

  @Test
  void saysWhyAnAcidCannotKetonize() {
    String text = done("alpha-h", "2-methyl-2-phenylpropanoic acid", "phenylacetic acid").out();
    String flowing = text.replaceAll("\\s+", " ");
    assertTrue(text.contains("1  no   yes\n2  yes  yes\n"), text);
    assertTrue(flowing.contains("1 + 1 2-methyl-2-phenylpropanoic acid: no alpha-H"), flowing);
    assertTrue(flowing.contains("2 + 2 1,3-diphenylacetone, C15H14O:"), flowing);
    text.lines().forEach(l -> assertTrue(l.length() <= 80, l));
  }

  @Test
  void writesTheAlphaHydrogenContract() throws IOException {
    JsonNode report = json("alpha-h", "acetic acid", "benzoic acid", "--format", "json");
    JsonNode acid = report.get("acids").get(0);
    assertEquals("acetic acid", acid.get("name").asText());
    assertEquals(3, acid.get("alphaHydrogens").asInt());
    assertTrue(acid.get("canGiveEnolate").asBoolean());
    JsonNode cross = report.get("ketones").get(1);
    assertEquals("[0,1]", cross.get("acids").toString());
    assertEquals("acetophenone", cross.get("name").asText());
    JsonNode blocked = report.get("ketones").get(2);
    assertFalse(blocked.get("possible").asBoolean());
    assertTrue(blocked.get("smiles").isNull());
    assertTrue(blocked.get("name").isNull());
  }

  @Test
  void writesOneCsvLinePerPairOfAcids() {
    String csv = done("alpha-h", "acetic acid", "benzoic acid", "--format", "csv").out();
    assertEquals(4, csv.lines().count());
    assertTrue(csv.contains("acetic acid,acetic acid,3,3,true,"), csv);
  }

  @Test
  void showsTheStepsAndTheirSources() {
    String text = done("routes", "phenylacetic acid", "-T", "300C", "--to", "toluene").out();
    assertTrue(text.contains("1. decarboxylation of an arylacetic acid"), text);
    assertTrue(text.contains("dG -71 ± 3 kJ/mol"), text);
    assertTrue(text.contains("decarboxylation-alpha-aryl: gca-2020-269-597"), text);
  }

  @Test
  void saysWhyThereIsNoRoute() {
    String text = done("routes", "phenylacetic acid", "-T", "300C", "--to", "acetone").out();
    assertTrue(text.contains("none: no rule leads to it"), text);
  }

  @Test
  void writesRoutesForPrograms() throws IOException {
    String[] to = {
      "routes",
      "phenylacetic acid",
      "-T",
      "300C",
      "--solid",
      "magnetite",
      "--to",
      "toluene",
      "--format",
      "json"
    };
    JsonNode step = json(to).get("routes").get(0).get("steps").get(0);
    assertEquals("decarboxylation-alpha-aryl", step.get("rule").asText());
    assertEquals(-71.2, step.get("deltaGKJPerMol").get("value").asDouble());
    assertEquals(1, step.get("sources").size());
    to[to.length - 1] = "csv";
    assertEquals(2, done(to).out().lines().count());
  }

  @ParameterizedTest
  @CsvSource({"graphml, GRAPHML", "dot, DOT"})
  void passesDrawingsThrough(String format, String name) {
    String[] run = {"routes", "acetic acid", "-T", "300C", "--format", format};
    assertEquals(name + " all\n", done(run).out());
    CommandRun part =
        done("routes", "acetic acid", "-T", "300C", "--format", format, "--to", "acetone");
    assertEquals(name + " O=C(C)C\n", part.out());
  }

  @Test
  void listsRulesByFamily() throws IOException {
    String text = done("rules", "list").out();
    assertTrue(text.startsWith("2 rules\n\nketonization\n"), text);
    assertTrue(text.contains("250..450"), text);
    assertEquals(3, done("rules", "list", "--format", "csv").out().lines().count());
    assertEquals(2, json("rules", "list", "--format", "json").get("rules").size());
  }

  @Test
  void showsOneRule() throws IOException {
    String id = "ketonic-decarboxylation-self";
    assertTrue(done("rules", "show", id).out().contains("needs            oxide or base\n"));
    assertEquals(450, json("rules", "show", id, "--format", "json").at("/windowC/high").asInt());
    assertEquals(3, done("rules", "show", id, "--format", "csv").out().lines().count());
    assertTrue(
        json("rules", "show", "decarboxylation-alpha-aryl", "--format", "json")
            .get("windowC")
            .isNull());
  }

  @Test
  void failsTheCheckOfFaultyRules() {
    assertTrue(done("rules", "check").out().contains("6 examples and counter-examples: all pass"));
    for (String format : new String[] {"text", "csv", "json"}) {
      CommandRun bad = CommandRun.of("rules", "check", "mine", "--format", format);
      assertEquals(ExitCode.BAD_INPUT, bad.code());
      assertTrue(bad.out().contains("does not balance"), bad.out());
    }
  }
}
