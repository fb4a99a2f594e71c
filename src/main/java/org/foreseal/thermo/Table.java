package org.foreseal.thermo;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * A comma-separated table of this room's resources: remarks start with {@code #}, the first other
 * line names the columns, quotes keep commas.
 */
final class Table {
  private final List<String> header;
  private final List<List<String>> rows;

  private Table(List<List<String>> lines) {
    header = lines.get(0);
    rows = lines.subList(1, lines.size());
  }

  /** Reads {@code thermo/NAME} from the jar. */
  static Table read(String name) {
    String text = new String(bytes(name), StandardCharsets.UTF_8);
    return new Table(
        text.lines().filter(l -> !l.isBlank() && !l.startsWith("#")).map(Table::cells).toList());
  }

  /** The whole of {@code thermo/NAME} in the jar. */
  static byte[] bytes(String name) {
    try (InputStream in = Table.class.getResourceAsStream("/thermo/" + name)) {
      if (in == null) {
        throw new IllegalStateException("the program lacks its table thermo/" + name);
      }
      return in.readAllBytes();
    } catch (IOException e) {
      throw new UncheckedIOException("cannot read the table thermo/" + name, e);
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

  int size() {
    return rows.size();
  }

  String text(int row, String column) {
    int at = header.indexOf(column);
    if (at < 0) {
      throw new IllegalArgumentException("no column " + column + " among " + header);
    }
    return rows.get(row).get(at);
  }

  boolean isEmpty(int row, String column) {
    return text(row, column).isEmpty();
  }

  double number(int row, String column) {
    return Double.parseDouble(text(row, column));
  }

  /** The heat capacity in the columns cp300 to cp800. */
  HeatCapacity heatCapacity(int row) {
    return new HeatCapacity(
        number(row, "cp300"),
        number(row, "cp400"),
        number(row, "cp500"),
        number(row, "cp600"),
        number(row, "cp800"));
  }
}
