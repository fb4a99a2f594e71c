package org.foreseal.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.foreseal.molecule.MoleculeNames;
import org.foreseal.molecule.MoleculeReader;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ExampleRunSheetsTest {
  static List<Path> sheets() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("examples"))) {
      return files.sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("sheets")
  void readsWithoutRemarks(Path file) throws IOException {
    String text = Files.readString(file);
    RunSheet sheet =
        new RunReader(new MoleculeReader(MoleculeNames.builtIn()))
            .read(new RunReader.Sheet(file.toString(), text));
    assertTrue(text.startsWith("# Brine loop 4"), "says what the chemist wants to know");
    assertTrue(text.lines().limit(3).anyMatch(l -> l.contains("?")), text);
    assertFalse(sheet.title().isEmpty());
    assertEquals(List.of(), sheet.notes());
    assertEquals(List.of(), sheet.outsideUsualRange());
  }

  @Test
  void coverTheKindsOfCompound() throws IOException {
    assertTrue(sheets().size() >= 8);
  }
}
