package org.foreseal.report;

import java.util.List;

/** Lists of names that may be long. */
final class Names {
  private Names() {}

  /** The first names, each once, and how many more there are. */
  static String some(List<String> names, int most) {
    List<String> distinct = names.stream().distinct().toList();
    String shown = String.join(", ", distinct.subList(0, Math.min(most, distinct.size())));
    return distinct.size() > most ? shown + " and " + (distinct.size() - most) + " more" : shown;
  }
}
