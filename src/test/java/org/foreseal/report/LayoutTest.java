package org.foreseal.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Random;
import org.foreseal.report.TextTable.Column;
import org.junit.jupiter.api.Test;

class LayoutTest {
  @Test
  void wrapsAtBlanks() {
    assertEquals(List.of("one two", "three"), Wrap.lines("one two three", 8));
    assertEquals(List.of(""), Wrap.lines("  ", 8));
  }

  @Test
  void breaksLongWordsBehindHyphens() {
    assertEquals(List.of("2-methyl-2-", "phenyl"), Wrap.lines("2-methyl-2-phenyl", 12));
    assertEquals(List.of("abcdefgh", "ij"), Wrap.lines("abcdefghij", 8));
  }

  @Test
  void losesNoLetterWhateverTheWidth() {
    for (int seed = 0; seed < 500; seed++) {
      Random random = new Random(seed);
      StringBuilder text = new StringBuilder();
      for (int i = random.nextInt(120); i >= 0; i--) {
        text.append("abc -,()".charAt(random.nextInt(8)));
      }
      int width = 1 + random.nextInt(40);
      List<String> lines = Wrap.lines(text.toString(), width);
      assertTrue(lines.stream().allMatch(l -> l.length() <= width), "seed " + seed);
      assertEquals(
          text.toString().replace(" ", ""),
          String.join("", lines).replace(" ", ""),
          "seed " + seed);
    }
  }

  @Test
  void narrowsTheWidestColumnThatMayWrap() {
    TextTable table =
        new TextTable("", List.of(Column.number("#"), Column.text("a", 10), Column.text("b", 10)));
    table.row(List.of("1", "word ".repeat(20), "short"), "remark");
    String text = table.toString();
    assertTrue(text.lines().allMatch(l -> l.length() <= 80), text);
    assertTrue(text.endsWith("     remark\n"), text);
  }

  @Test
  void refusesRowsOfAnotherLength() {
    TextTable table = new TextTable("", List.of(Column.word("a")));
    assertThrows(IllegalArgumentException.class, () -> table.row(List.of("1", "2")));
    assertThrows(IllegalArgumentException.class, () -> new Csv(List.of("a")).line(List.of()));
  }

  @Test
  void quotesCsvAsTheStandardSays() {
    Csv csv = new Csv(List.of("a", "b"));
    csv.line(List.of("x,y", "say \"no\"")).line(List.of("line\nbreak", "plain"));
    assertEquals("a,b\n\"x,y\",\"say \"\"no\"\"\"\n\"line\nbreak\",plain\n", csv.toString());
  }

  @Test
  void writesNumbersOfFewDigits() {
    assertEquals("0.333333", Figures.json(1 / 3.0).toString());
    assertEquals("300", Figures.json(300.0).toString());
    assertEquals("0", Figures.json(-0.0).toString());
    assertEquals("0.0", Figures.tenths(-0.01));
    assertEquals("1 fault", Figures.count(1, "fault"));
    assertEquals("0 faults", Figures.count(0, "fault"));
  }
}
