package org.foreseal.run;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NearestTest {
  private static final List<String> KNOWN =
      List.of("temperature_C", "title", "magnetite", "hematite", "maghemite");

  // Edits counted by hand.
  @ParameterizedTest
  @CsvSource({"kitten, sitting, 3", "abc, acb, 1", "abc, abc, 0", "abc, '', 3", "form, from, 1"})
  void countsEdits(String a, String b, int edits) {
    assertEquals(edits, Nearest.edits(a, b));
  }

  @Test
  void putsTheNearestFirst() {
    assertEquals("magnetite", Nearest.to("magnetit", KNOWN).get(0));
    assertEquals(List.of("temperature_C"), Nearest.to("temprature_C", KNOWN));
    assertEquals(List.of("temperature_C"), Nearest.to("temperature", KNOWN));
    assertEquals(List.of(), Nearest.to("zirconia", KNOWN));
    assertEquals(List.of(), Nearest.to(" ", KNOWN));
  }

  @Test
  void listsAllWhenNoneIsNear() {
    assertEquals("one of: a, b", Nearest.hint("zirconia", List.of("a", "b")));
    assertEquals("did you mean title?", Nearest.hint("titel", KNOWN));
  }
}
