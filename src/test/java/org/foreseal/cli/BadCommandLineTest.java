package org.foreseal.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

class BadCommandLineTest {
  private static final List<String> WORDS =
      List.of(
          "forecast",
          "routes",
          "alpha-h",
          "rules",
          "list",
          "show",
          "check",
          "--solid",
          "--additive",
          "--temperature",
          "-T",
          "300C",
          "300",
          "260..300C",
          "..",
          "magnetite",
          "none",
          "=",
          "=5mg",
          "C=O",
          "OC(=O)Cc1ccccc1",
          "OC(=O",
          "phenylacetic acid",
          "--format",
          "json",
          "xml",
          "--out=/",
          "-q",
          "--strict",
          "--all",
          "--depth",
          "9",
          "-1",
          "--seed",
          "--rules",
          "--limit-time",
          "--limit-species",
          "0",
          "--to",
          "toluene",
          "--most",
          "--ph",
          "99",
          "",
          "--",
          "-",
          "\u0000",
          "magnetite[oxide]=5mg,2m2/g",
          "x[]",
          "+",
          "--hydrogen",
          "2bar",
          "--water",
          "no-such-file.yaml",
          "@x",
          "--help",
          "1e999C",
          "NaN",
          "é",
          "--time",
          "1h");

  /** Arguments are separated by blanks; an underscore stands for a blank inside one. */
  @ParameterizedTest
  @CsvFileSource(resources = "/run/bad-command-lines.csv", numLinesToSkip = 1)
  void refusesWithAClearMessage(String arguments, int code, String words) {
    String[] given =
        arguments.isBlank() ? new String[0] : arguments.replace("~", "").split(" ", -1);
    for (int i = 0; i < given.length; i++) {
      given[i] = given[i].replace('_', ' ');
    }
    CommandRun run = CommandRun.of(given);
    assertEquals(code, run.code(), run.err());
    assertTrue(run.err().contains(words), run.err());
    assertEquals("", run.out());
    assertNoTrace(run.err());
    assertTrue(run.err().contains(code == ExitCode.WRONG_USAGE ? "--help" : "\n"), run.err());
  }

  @Test
  void seededWordSaladNeverShowsATrace() {
    int refused = 0;
    for (int seed = 0; seed < 1500; seed++) {
      Random random = new Random(seed);
      List<String> given = new ArrayList<>(List.of(WORDS.get(random.nextInt(4))));
      for (int i = random.nextInt(7); i > 0; i--) {
        given.add(WORDS.get(random.nextInt(WORDS.size())));
      }
      CommandRun run = CommandRun.of(given.toArray(String[]::new));
      assertFalse(run.code() == ExitCode.FAULT_OF_THE_TOOL, given + ": " + run.err());
      assertNoTrace(run.err());
      refused += run.code() == ExitCode.DONE ? 0 : 1;
    }
    assertTrue(refused > 700, "only " + refused + " refused");
  }

  private static void assertNoTrace(String err) {
    assertFalse(err.contains("Exception") || err.contains("\tat "), err);
  }
}
