package org.foreseal.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.dataformat.yaml.YAMLFactory;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class RunSheetSchemaTest {
  private static final SchemaCheck SCHEMA = SchemaCheck.load("run-sheet.schema.json");

  static List<Path> examples() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("examples"))) {
      return files.sorted().toList();
    }
  }

  private static JsonNode yaml(Path file) throws IOException {
    return new ObjectMapper(new YAMLFactory()).readTree(Files.readString(file));
  }

  @ParameterizedTest
  @MethodSource("examples")
  void fitsEveryExample(Path file) throws IOException {
    assertEquals(List.of(), SCHEMA.faults(yaml(file)));
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "unknown-key",
        "unknown-key-solid",
        "unknown-key-gc",
        "empty-substrates",
        "no-substrate",
        "temperature-too-high",
        "temperature-negative",
        "temperature-word",
        "pressure-zero",
        "pressure-list",
        "molality-negative",
        "solid-role-unknown",
        "solid-roles-empty",
        "solid-without-name",
        "solvent-unknown",
        "hydrogen-empty",
        "hydrogen-two",
        "ph-too-high",
        "depth-too-deep",
        "depth-fraction",
        "gc-detector-unknown",
        "title-block",
        "range-open"
      })
  void refusesWhatTheReaderRefuses(String name) throws IOException {
    JsonNode sheet = yaml(Path.of("src/test/resources/run/bad/" + name + ".yaml"));
    assertFalse(SCHEMA.faults(sheet).isEmpty());
  }
}
