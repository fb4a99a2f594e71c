package org.foreseal.run;

import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** Finds the known words that a mistyped one may have meant. */
public final class Nearest {
  private static final int MOST = 3;

  private Nearest() {}

  /**
   * Up to three known words, nearest first: those within one edit per three letters, and those that
   * begin with the word or hold it.
   */
  public static List<String> to(String word, Collection<String> known) {
    String wanted = word.toLowerCase(Locale.ROOT).strip();
    if (wanted.isEmpty()) {
      return List.of();
    }
    return known.stream()
        .distinct()
        .filter(k -> cost(wanted, k) <= Math.max(1, wanted.length() / 3))
        .sorted(
            Comparator.<String>comparingInt(k -> cost(wanted, k))
                .thenComparing(Comparator.naturalOrder()))
        .limit(MOST)
        .toList();
  }

  /** A hint that names the nearest words, else all of them. */
  public static String hint(String word, Collection<String> known) {
    List<String> near = to(word, known);
    return near.isEmpty()
        ? "one of: " + String.join(", ", known)
        : "did you mean " + String.join(" or ", near) + "?";
  }

  private static int cost(String wanted, String known) {
    String k = known.toLowerCase(Locale.ROOT);
    boolean partOf = wanted.length() >= 3 && (k.contains(wanted) || wanted.contains(k));
    return partOf && k.length() >= 3 ? Math.min(1, edits(wanted, k)) : edits(wanted, k);
  }

  /** Edits that turn one word into the other: insert, delete, replace, swap neighbours. */
  static int edits(String a, String b) {
    int[][] d = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        d[i][j] = i == 0 || j == 0 ? i + j : best(a, b, i, j, d);
      }
    }
    return d[a.length()][b.length()];
  }

  private static int best(String a, String b, int i, int j, int[][] d) {
    boolean same = a.charAt(i - 1) == b.charAt(j - 1);
    int least = d[i - 1][j - 1] + (same ? 0 : 1);
    least = Math.min(least, Math.min(d[i - 1][j], d[i][j - 1]) + 1);
    boolean swapped =
        i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
    return swapped ? Math.min(least, d[i - 2][j - 2] + 1) : least;
  }
}
