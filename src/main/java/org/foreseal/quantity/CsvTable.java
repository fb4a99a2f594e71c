package org.foreseal.quantity;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/**
 * A comma-separated table shipped in the jar: lines that start with {@code #} are remarks, the
 * first other line names the columns, quotes keep commas. For our own tables, which hold no quotes
 * and no line breaks within a cell.
 */
public final class CsvTable {
  private final String resource;
  private final List<String> columns;
  private final List<List<String>> rows;

  private CsvTable(String resource, List<List<String>> lines) {
    this.resource = resource;
    columns = lines.get(0);
    rows = List.copyOf(lines.subList(1, lines.size()));
    for (List<String> row : rows) {
      if (row.size() != columns.size()) {
        throw new IllegalStateException(resource + ": " + row.size() + " cells in " + row);
      }
    }
  }

  /**
   * Reads a table of the jar.
   *
   * @param resource absolute name, such as {@code /thermo/elements.csv}
   */
  public static CsvTable read(String resource) {
    String text = new String(bytes(resource), StandardCharsets.UTF_8);
    return new CsvTable(
        resource,
        text.lines()
            .filter(line -> !line.isBlank() && !line.startsWith("#"))
            .map(CsvTable::cells)
            .toList());
  }

  /** The whole of a resource of the jar. */
  public static byte[] bytes(String resource) {
    try (InputStream in = CsvTable.class.getResourceAsStream(resource)) {
      if (in == null) {
        throw new IllegalStateException("the jar lacks " + resource);
      }
      return in.readAllBytes();
    } catch (IOException e) {
      throw new UncheckedIOException("cannot read " + resource, e);
    }
  }

  private static List<String> cells(String line) {
    List<String> cells = new ArrayList<>();
    StringBuilder cell = new StringBuilder();
    boolean quoted = false;
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      if (c == '"') {
        quoted = !quoted;
      } else if (c == ',' && !quoted) {
        cells.add(cell.toString().strip());
        cell.setLength(0);
      } else {
        cell.append(c);
      }
    }
    cells.add(cell.toString().strip());
    return List.copyOf(cells);
  }

  /** The rows below the names of the columns, each with a cell for every column. */
  public List<List<String>> rows() {
    return rows;
  }

  /** Number of rows. */
  public int size() {
    return rows.size();
  }

  /** The cell in this row, counted from 0, and this column. */
  public String text(int row, String column) {
    int at = columns.indexOf(column);
    if (at < 0) {
      throw new IllegalArgumentException("no column " + column + " in " + resource);
    }
    return rows.get(row).get(at);
  }

  /** Whether the cell is empty. */
  public boolean isEmpty(int row, String column) {
    return text(row, column).isEmpty();
  }

  /** The cell as a number. */
  public double number(int row, String column) {
    return Double.parseDouble(text(row, column));
  }
}
