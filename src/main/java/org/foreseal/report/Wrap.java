package org.foreseal.report;

import java.util.ArrayList;
import java.util.List;

/** Breaks text into lines: at blanks, else behind a hyphen or comma, else anywhere. */
final class Wrap {
  private static final String BREAK_BEHIND = "-,/)";

  private Wrap() {}

  /** Lines of at most {@code width} characters; one empty line for an empty text. */
  static List<String> lines(String text, int width) {
    List<String> result = new ArrayList<>();
    StringBuilder line = new StringBuilder();
    for (String word : text.strip().split("\\s+", -1)) {
      String rest = word;
      if (line.length() > 0 && line.length() + 1 + rest.length() > width) {
        boolean isWorthSplitting = rest.length() > width && width - line.length() > 8;
        if (!isWorthSplitting) {
          flush(line, result);
        }
      }
      while (needed(line, rest) > width) {
        int cut = cut(rest, width - (line.length() == 0 ? 0 : line.length() + 1));
        append(line, rest.substring(0, cut));
        rest = rest.substring(cut);
        flush(line, result);
      }
      append(line, rest);
    }
    flush(line, result);
    return result;
  }

  private static int needed(StringBuilder line, String word) {
    return line.length() + (line.length() == 0 ? 0 : 1) + word.length();
  }

  private static int cut(String word, int room) {
    for (int at = Math.min(room, word.length()); at > room / 2; at--) {
      if (BREAK_BEHIND.indexOf(word.charAt(at - 1)) >= 0) {
        return at;
      }
    }
    return Math.max(1, Math.min(room, word.length()));
  }

  private static void append(StringBuilder line, String word) {
    if (line.length() > 0 && !word.isEmpty()) {
      line.append(' ');
    }
    line.append(word);
  }

  private static void flush(StringBuilder line, List<String> result) {
    result.add(line.toString());
    line.setLength(0);
  }

  /** A paragraph whose first line begins with {@code head} and whose others are indented as far. */
  static String paragraph(String head, String text, int width) {
    return paragraph(head, " ".repeat(head.length()), text, width);
  }

  /** A paragraph whose first line begins with {@code head} and whose others with {@code indent}. */
  static String paragraph(String head, String indent, String text, int width) {
    StringBuilder result = new StringBuilder();
    String before = head;
    for (String line : lines(text, width - Math.max(head.length(), indent.length()))) {
      result.append((before + line).stripTrailing()).append('\n');
      before = indent;
    }
    return result.toString();
  }
}
