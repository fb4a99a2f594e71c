package org.foreseal.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class BadRunSheetTest {
  private static final Path FOLDER = Path.of("src/test/resources/run/bad");
  private static final String GOOD =
      """
      title: plate 2
      substrates:
        - {name: phenylacetic acid, smiles: "OC(=O)Cc1ccccc1", molality: 0.5}
      solvent: water
      water_g: 0.25
      solids:
        - {name: magnetite, milligrams: 50, surface_m2_per_g: 5}
      additives:
        - {name: hydrochloric acid, molality: 0.01}
      temperature_C: 260
      pressure_bar: 300
      duration_h: 48
      hydrogen: {buffer: hematite-magnetite}
      vessel: {volume_mL: 1.2, kind: gold capsule}
      gc: {detector: FID}
      forecast: {depth: 3, seed: 1}
      """;

  static List<Path> sheets() throws IOException {
    try (Stream<Path> files = Files.list(FOLDER)) {
      return files.sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("sheets")
  void refusesWithPlaceAndReason(Path sheet) throws IOException {
    String expected = Files.readAllLines(sheet).get(0).replace("# expect: ", "");
    CommandRun run = CommandRun.of("forecast", sheet.toString());
    assertEquals(ExitCode.BAD_INPUT, run.code(), run.err());
    assertEquals("", run.out());
    assertTrue(run.err().contains(expected), run.err());
    assertTrue(run.err().matches("(?s)" + sheet + ":\\d+.*\n  hint: .*"), run.err());
    assertNoTrace(run.err());
  }

  @Test
  void keepsManyBadSheets() throws IOException {
    assertTrue(sheets().size() >= 60);
  }

  @Test
  void seededMutationsNeverShowATrace() {
    int refused = 0;
    for (int seed = 0; seed < 1500; seed++) {
      String mutated = mutated(new Random(seed));
      CommandRun run = CommandRun.reading(mutated, "forecast", "-");
      boolean isExpected = run.code() == ExitCode.DONE || run.code() == ExitCode.BAD_INPUT;
      assertTrue(isExpected, "seed " + seed + ": " + run.err());
      assertNoTrace(run.err());
      refused += run.code() == ExitCode.BAD_INPUT ? 1 : 0;
    }
    assertTrue(refused > 500, "only " + refused + " refused");
  }

  private static String mutated(Random random) {
    StringBuilder text = new StringBuilder(GOOD);
    int edits = 1 + random.nextInt(3);
    for (int i = 0; i < edits; i++) {
      int at = random.nextInt(text.length());
      switch (random.nextInt(5)) {
        case 0 -> text.deleteCharAt(at);
        case 1 -> text.insert(at, (char) (32 + random.nextInt(95)));
        case 2 -> text.setCharAt(at, ":{}[]\",-#&*!|>%@`'\n\t0".charAt(random.nextInt(21)));
        case 3 ->
            text.insert(
                at, List.of("null", "~", "-1", "1e400", "é", ".nan").get(random.nextInt(6)));
        default -> text.delete(at, Math.min(text.length(), at + random.nextInt(30)));
      }
    }
    return text.toString();
  }

  @Test
  void randomBytesNeverShowATrace() {
    for (int seed = 0; seed < 300; seed++) {
      Random random = new Random(seed);
      StringBuilder text = new StringBuilder();
      for (int i = random.nextInt(60); i >= 0; i--) {
        text.append((char) random.nextInt(random.nextBoolean() ? 128 : 0xD800));
      }
      CommandRun run = CommandRun.reading(text.toString(), "forecast", "-");
      assertEquals(ExitCode.BAD_INPUT, run.code(), "seed " + seed + ": " + run.err());
      assertNoTrace(run.err());
    }
  }

  private static void assertNoTrace(String err) {
    assertFalse(err.contains("Exception") || err.contains("\tat "), err);
    assertFalse(err.contains("fault of the tool"), err);
  }
}
