package org.foreseal.quantity;

/**
 * A place in something the user wrote.
 *
 * @param source what it was read from: a file name, "command line", ...
 * @param line line number from 1
 * @param column column from 1; 0 when only the line is known
 * @param text the text of that line
 */
public record Place(String source, int line, int column, String text) {
  /** A place in a text that has one line and stands on the command line. */
  public static Place onCommandLine(String text, int column) {
    return new Place("command line", 1, column, text);
  }

  /** {@code source:line:column}. */
  public String label() {
    return source + ":" + line + (column > 0 ? ":" + column : "");
  }
}
