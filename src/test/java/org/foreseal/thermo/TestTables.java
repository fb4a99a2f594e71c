package org.foreseal.thermo;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** Reads the check values of this room: remarks and the line of column names are skipped. */
final class TestTables {
  private TestTables() {}

  static List<List<String>> rows(String name) {
    try (InputStream in = TestTables.class.getResourceAsStream("/thermo/" + name)) {
      if (in == null) {
        throw new IllegalStateException("no test table " + name);
      }
      String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      return text.lines().filter(l -> !l.startsWith("#")).skip(1).map(TestTables::cells).toList();
    } catch (IOException e) {
      throw new IllegalStateException("cannot read " + name, e);
    }
  }

  private static List<String> cells(String line) {
    List<String> cells = new ArrayList<>();
    StringBuilder cell = new StringBuilder();
    boolean quoted = false;
    for (int k = 0; k < line.length(); k++) {
      char c = line.charAt(k);
      if (c == '"') {
        quoted = !quoted;
      } else if (c == ',' && !quoted) {
        cells.add(cell.toString());
        cell.setLength(0);
      } else {
        cell.append(c);
      }
    }
    cells.add(cell.toString());
    return cells;
  }
}
