package org.foreseal.report;

import java.util.ArrayList;
import java.util.List;

/**
 * A table of at most 80 columns: numbers to the right, words to the left; where the words are too
 * long the columns that may wrap give way.
 */
final class TextTable {
  static final int WIDTH = 80;

  private final List<Column> columns;
  private final List<Row> rows = new ArrayList<>();
  private final String indent;

  /**
   * A column.
   *
   * @param heading its heading
   * @param isNumber whether its cells stand to the right
   * @param leastWidth characters it keeps when columns give way; 0 for a column that never wraps
   */
  record Column(String heading, boolean isNumber, int leastWidth) {
    static Column number(String heading) {
      return new Column(heading, true, 0);
    }

    static Column word(String heading) {
      return new Column(heading, false, 0);
    }

    static Column text(String heading, int leastWidth) {
      return new Column(heading, false, leastWidth);
    }
  }

  /**
   * A row.
   *
   * @param remark stands below the cells, indented; may be empty
   */
  private record Row(List<String> cells, String remark) {}

  TextTable(String indent, List<Column> columns) {
    this.indent = indent;
    this.columns = List.copyOf(columns);
  }

  TextTable row(List<String> cells) {
    return row(cells, "");
  }

  TextTable row(List<String> cells, String remark) {
    if (cells.size() != columns.size()) {
      throw new IllegalArgumentException(cells.size() + " cells for " + columns.size());
    }
    rows.add(new Row(List.copyOf(cells), remark));
    return this;
  }

  @Override
  public String toString() {
    int[] widths = widths();
    StringBuilder text = new StringBuilder();
    append(text, columns.stream().map(Column::heading).toList(), widths);
    String remarkIndent = indent + " ".repeat(widths[0] + 4);
    for (Row row : rows) {
      append(text, row.cells(), widths);
      if (!row.remark().isEmpty()) {
        text.append(Wrap.paragraph(remarkIndent, row.remark(), WIDTH));
      }
    }
    return text.toString();
  }

  private int[] widths() {
    int[] widths = new int[columns.size()];
    for (int c = 0; c < widths.length; c++) {
      widths[c] = columns.get(c).heading().length();
      for (Row row : rows) {
        widths[c] = Math.max(widths[c], row.cells().get(c).length());
      }
    }
    while (total(widths) > WIDTH) {
      int widest = widestThatGives(widths);
      if (widest < 0) {
        return widths;
      }
      widths[widest]--;
    }
    return widths;
  }

  private int total(int[] widths) {
    int total = indent.length() + 2 * (widths.length - 1);
    for (int width : widths) {
      total += width;
    }
    return total;
  }

  private int widestThatGives(int[] widths) {
    int widest = -1;
    for (int c = 0; c < widths.length; c++) {
      int least = columns.get(c).leastWidth();
      if (least > 0 && widths[c] > least && (widest < 0 || widths[c] > widths[widest])) {
        widest = c;
      }
    }
    return widest;
  }

  private void append(StringBuilder text, List<String> cells, int[] widths) {
    List<List<String>> wrapped = new ArrayList<>();
    int height = 1;
    for (int c = 0; c < widths.length; c++) {
      List<String> lines =
          columns.get(c).leastWidth() > 0
              ? Wrap.lines(cells.get(c), widths[c])
              : List.of(cells.get(c));
      wrapped.add(lines);
      height = Math.max(height, lines.size());
    }
    for (int line = 0; line < height; line++) {
      StringBuilder out = new StringBuilder(indent);
      for (int c = 0; c < widths.length; c++) {
        String cell = line < wrapped.get(c).size() ? wrapped.get(c).get(line) : "";
        String padding = " ".repeat(Math.max(0, widths[c] - cell.length()));
        out.append(c == 0 ? "" : "  ");
        out.append(columns.get(c).isNumber() ? padding + cell : cell + padding);
      }
      text.append(out.toString().stripTrailing()).append('\n');
    }
  }
}
