package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.List;

/** Splits a SMARTS into its pieces at the dots that stand outside brackets and parentheses. */
final class SmartsPieces {
  private SmartsPieces() {}

  static List<String> split(String smarts) {
    List<String> pieces = new ArrayList<>();
    int depth = 0;
    int start = 0;
    for (int i = 0; i < smarts.length(); i++) {
      char c = smarts.charAt(i);
      if (c == '[' || c == '(') {
        depth++;
      } else if (c == ']' || c == ')') {
        depth--;
      } else if (c == '.' && depth == 0) {
        pieces.add(smarts.substring(start, i));
        start = i + 1;
      }
    }
    pieces.add(smarts.substring(start));
    return pieces;
  }
}
