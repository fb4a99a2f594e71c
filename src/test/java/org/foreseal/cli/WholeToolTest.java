package org.foreseal.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.foreseal.molecule.MoleculeNames;
import org.foreseal.report.SchemaCheck;
import org.foreseal.run.Forecaster;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The commands with the real calculations behind them. */
class WholeToolTest {
  private static CommandRun run(String... arguments) {
    CommandRun run =
        CommandRun.with(
            () -> Forecaster.standard(MoleculeNames.builtIn()::display, "test"), arguments);
    assertEquals(ExitCode.DONE, run.code(), run.err());
    return run;
  }

  static List<Path> examples() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("examples"))) {
      return files.sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("examples")
  void forecastsEveryExample(Path sheet) {
    String text = run("forecast", sheet.toString(), "--depth", "2").out();
    List<String> tooLong = text.lines().filter(l -> l.length() > 80).toList();
    assertEquals(List.of(), tooLong);
    assertTrue(text.contains("Sealed hot vessel"), text);
    assertTrue(text.contains("gas-phase Gibbs energies"), text);
  }

  @Test
  void keepsTheJsonContractAndTheBytes() throws IOException {
    String[] readme = {
      "forecast", "phenylacetic acid", "--solid", "magnetite", "-T", "300C", "--format", "json"
    };
    String out = run(readme).out();
    JsonNode forecast = new ObjectMapper().readTree(out);
    assertEquals(List.of(), SchemaCheck.load("forecast.schema.json").faults(forecast));
    List<String> names = new ArrayList<>();
    forecast.get("candidates").forEach(c -> names.add(c.get("name").asText()));
    // Common practice: toluene, the symmetric ketone and the acid with one carbon less.
    assertTrue(names.containsAll(List.of("toluene", "1,3-diphenylacetone", "benzoic acid")));
    assertEquals(out, run(readme).out());
  }

  /**
   * The output printed in the README is what the command prints, up to the place where it is cut.
   */
  @Test
  void printsWhatTheReadmeShows() throws IOException {
    String readme = Files.readString(Path.of("README.md"));
    String shown = readme.split("\n```\n", -1)[3];
    String kept = shown.substring(0, shown.indexOf("\n ..."));
    assertTrue(kept.startsWith("Forecast: phenylacetic acid with magnetite"), kept);
    assertTrue(kept.lines().count() > 30, kept);
    assertEquals(
        kept, run("forecast", "examples/phenylacetic-acid.yaml").out().substring(0, kept.length()));
  }

  @Test
  void tellsIronOxideFromCorundum() throws IOException {
    JsonNode both =
        new ObjectMapper()
            .readTree(
                run(
                        "forecast",
                        "phenylacetic acid",
                        "-T",
                        "300C",
                        "--solid",
                        "magnetite",
                        "--solid",
                        "corundum",
                        "--format",
                        "json")
                    .out());
    assertEquals(List.of(), SchemaCheck.load("forecast.schema.json").faults(both));
    for (JsonNode difference : both.get("differences")) {
      if ("benzoic acid".equals(difference.get("name").asText())) {
        assertEquals("corundum", difference.at("/missing/0/label").asText());
        assertTrue(difference.at("/missing/0/reason").asText().contains("iron-bearing"));
        return;
      }
    }
    throw new AssertionError("benzoic acid does not tell the minerals apart");
  }

  @Test
  void showsRoutesAndWhyThereAreNone() {
    String ketone =
        run(
                "routes",
                "phenylacetic acid",
                "-T",
                "300C",
                "--solid",
                "magnetite",
                "--to",
                "1,3-diphenylacetone")
            .out();
    assertTrue(ketone.contains("ketonic-decarboxylation-self"), ketone);
    String blocked =
        run("routes", "phenylacetic acid", "-T", "300C", "--to", "1,3-diphenylacetone").out();
    assertTrue(blocked.contains("none: needs oxide"), blocked);
  }

  @Test
  void showsARuleOfTheLibrary() {
    String rule = run("rules", "show", "ketonic-decarboxylation-self").out();
    assertTrue(rule.contains("source"), rule);
    assertTrue(rule.lines().allMatch(l -> l.length() <= 80), rule);
  }
}
