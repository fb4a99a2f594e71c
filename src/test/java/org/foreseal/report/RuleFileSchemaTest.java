package org.foreseal.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.dataformat.yaml.YAMLFactory;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** The schema describes every rule file, and the loader and the schema refuse the same slips. */
class RuleFileSchemaTest {
  private static final SchemaCheck SCHEMA = SchemaCheck.load("rules.schema.json");
  private static final ObjectMapper YAML = new ObjectMapper(new YAMLFactory());

  static List<Path> files() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("rules"))) {
      return files.filter(f -> f.toString().endsWith(".yaml")).sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("files")
  void fitsEveryRuleFile(Path file) throws IOException {
    assertEquals(List.of(), SCHEMA.faults(YAML.readTree(Files.readString(file))));
  }

  @ParameterizedTest
  @CsvSource(
      delimiterString = " -> ",
      value = {"prominence: -> prominense:", "title: -> titel:", "needs: [[ -> needs: [[gold, "})
  void refusesWhatTheLoaderRefuses(String good, String bad) throws IOException {
    String text = Files.readString(Path.of("rules", "decarboxylation.yaml"));
    assertFalse(SCHEMA.faults(YAML.readTree(text.replace(good, bad))).isEmpty());
  }
}
