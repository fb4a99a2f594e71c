package org.foreseal.report;

import java.util.List;
import java.util.stream.Collectors;

/** Comma-separated values as in RFC 4180, with a line feed at the end of each line. */
final class Csv {
  private final StringBuilder text = new StringBuilder();
  private final int columns;

  Csv(List<String> header) {
    columns = header.size();
    line(header);
  }

  Csv line(List<String> cells) {
    if (cells.size() != columns) {
      throw new IllegalArgumentException(cells.size() + " cells for " + columns + " columns");
    }
    text.append(cells.stream().map(Csv::cell).collect(Collectors.joining(","))).append('\n');
    return this;
  }

  private static String cell(String value) {
    boolean isPlain = value.chars().noneMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r');
    return isPlain ? value : '"' + value.replace("\"", "\"\"") + '"';
  }

  @Override
  public String toString() {
    return text.toString();
  }
}
