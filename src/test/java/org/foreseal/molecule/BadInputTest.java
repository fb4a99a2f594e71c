package org.foreseal.molecule;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Random;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Whatever a user types ends in a molecule or in a message that says where and what to do. */
class BadInputTest {
  private static final long SEED = Long.getLong("foreseal.seed", 20261201L);
  private static final int MUTANTS = 4000;
  private static final int PROMISED_CASES = 60;
  private static final Duration NO_HANG = Duration.ofMinutes(2);

  /** Letters and signs of SMILES and names, and some that belong in neither. */
  private static final String POOL =
      "CcNnOoSsPFIBrl[]()=#-+:/\\.@%0123456789H*>$~,;'\"{}^ aeitydxq\t\u03b1\u00e9\u2032\u4e2d\0";

  private final MoleculeReader reader = new MoleculeReader(MoleculeNames.builtIn());

  private static List<String> lines(String resource) {
    InputStream in = Objects.requireNonNull(BadInputTest.class.getResourceAsStream(resource));
    try (BufferedReader r = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
      return r.lines().filter(line -> !line.isBlank()).toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Empty when the text is refused with a place and a hint, else what is wrong with that. */
  private String faultOfRefusal(String text) {
    Place place = new Place("run.yaml", 7, 3, "  " + text);
    try {
      return text + " was read as " + reader.read(text, place).molecule();
    } catch (BadInputException e) {
      boolean complete =
          !e.hint().isBlank()
              && e.place().label().startsWith("run.yaml:7:")
              && e.place().column() >= 3
              && e.place().column() <= 3 + text.length()
              && e.report().contains("hint: ");
      return complete ? "" : "incomplete: " + e.report();
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"/molecule/bad-smiles.txt", "/molecule/bad-names.txt"})
  void everyKeptBadCaseIsRefusedWithPlaceAndHint(String resource) {
    List<String> cases = lines(resource);
    assertTrue(cases.size() >= PROMISED_CASES, cases.size() + " cases");
    List<String> faults =
        cases.stream().map(this::faultOfRefusal).filter(f -> !f.isEmpty()).toList();
    assertEquals(List.of(), faults);
  }

  @ParameterizedTest
  @ValueSource(strings = {"", " ", "\t", "\n", "a\nb", "C\0C", "\u0007"})
  void blanksAndControlCharactersAreRefused(String text) {
    assertEquals("", faultOfRefusal(text));
  }

  @Test
  void endlessTextsAreRefused() {
    assertEquals("", faultOfRefusal("C(".repeat(900) + "C" + ")".repeat(900)));
    assertEquals("", faultOfRefusal("C".repeat(1999)));
    assertEquals("", faultOfRefusal("C".repeat(100_000)));
    assertEquals("", faultOfRefusal("[H]".repeat(600)));
    assertEquals("", faultOfRefusal("methyl".repeat(300)));
    assertEquals("", faultOfRefusal("((((((((".repeat(30)));
    assertEquals("", faultOfRefusal("1-(".repeat(90) + "methyl" + ")".repeat(90)));
  }

  @ParameterizedTest
  @CsvSource({
    "'acetic acid; benzene', molecules in one text",
    "acetic acid and benzene, molecules in one text",
    "CCO ethanol, text after the SMILES",
    "C8H8O2, which isomer",
    "64-17-5, registry",
    "NO2, nitrogen dioxide",
    "C=, joins nothing",
    "cc, outside a ring",
    "sodium chloride, inorganic salt",
    "ferrocene, metal-carbon"
  })
  void saysWhatIsWrong(String text, String problem) {
    try {
      reader.read(text);
    } catch (BadInputException e) {
      assertTrue(e.report().contains(problem), e.report());
      return;
    }
    throw new AssertionError(text + " was read");
  }

  private static List<String> seeds() {
    List<String> seeds = new ArrayList<>();
    new CommonNames().all().forEach(e -> seeds.add(e.name()));
    lines("/molecule/structures.smi")
        .forEach(line -> seeds.add(line.substring(0, line.indexOf('\t'))));
    seeds.addAll(lines("/molecule/bad-smiles.txt"));
    return seeds;
  }

  private static String mutant(String text, Random random) {
    StringBuilder s = new StringBuilder(text);
    int changes = 1 + random.nextInt(4);
    for (int i = 0; i < changes; i++) {
      int at = random.nextInt(s.length() + 1);
      int to = Math.min(s.length(), at + random.nextInt(6));
      String letter = String.valueOf(POOL.charAt(random.nextInt(POOL.length())));
      switch (random.nextInt(5)) {
        case 0 -> s.delete(at, to);
        case 1 -> s.insert(at, letter);
        case 2 -> s.replace(at, to, letter);
        case 3 -> s.insert(at, s.substring(at, to));
        default -> s.append(s, at, to);
      }
    }
    return s.toString();
  }

  @Test
  void mutantsAreReadOrRefusedButNeverCrashOrHang() {
    Random random = new Random(SEED);
    List<String> seeds = seeds();
    List<String> refused = new ArrayList<>();
    String[] current = {""};
    assertTimeoutPreemptively(
        NO_HANG,
        () -> {
          for (int i = 0; i < MUTANTS; i++) {
            current[0] = mutant(seeds.get(random.nextInt(seeds.size())), random);
            readOrRefuse(current[0], refused);
          }
        },
        () -> "seed " + SEED + ", last text: " + current[0]);
    assertTrue(refused.size() > MUTANTS / 4, "too few were bad: " + refused.size());
    assertTrue(refused.size() < MUTANTS, "none was read");
  }

  private void readOrRefuse(String text, List<String> refused) {
    try {
      ReadMolecule read = reader.read(text);
      assertEquals(0, read.molecule().netCharge(), text);
      assertFalse(read.name().isBlank(), text);
    } catch (BadInputException e) {
      assertFalse(e.hint().isBlank(), text);
      refused.add(text);
    }
  }
}
