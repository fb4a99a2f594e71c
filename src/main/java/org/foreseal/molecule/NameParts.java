package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;

/** Stems, multipliers and the order of prefixes in systematic names. */
final class NameParts {
  private static final List<String> STEMS =
      List.of(
          "",
          "meth",
          "eth",
          "prop",
          "but",
          "pent",
          "hex",
          "hept",
          "oct",
          "non",
          "dec",
          "undec",
          "dodec",
          "tridec",
          "tetradec",
          "pentadec",
          "hexadec",
          "heptadec",
          "octadec",
          "nonadec",
          "icos",
          "henicos",
          "docos",
          "tricos",
          "tetracos",
          "pentacos",
          "hexacos",
          "heptacos",
          "octacos",
          "nonacos",
          "triacont",
          "hentriacont",
          "dotriacont",
          "tritriacont",
          "tetratriacont",
          "pentatriacont");
  private static final List<String> SIMPLE = List.of("", "", "di", "tri", "tetra", "penta", "hexa");
  private static final List<String> COMPLEX =
      List.of("", "", "bis", "tris", "tetrakis", "pentakis", "hexakis");

  /** The most carbons in a chain that has a stem here. */
  static final int LONGEST_CHAIN = STEMS.size() - 1;

  /** The most equal prefixes that have a multiplier here. */
  static final int MOST_EQUAL = SIMPLE.size() - 1;

  private NameParts() {}

  /**
   * The name of a substituent.
   *
   * @param text without brackets
   * @param complex true when it must stand in brackets
   */
  record Prefix(String text, boolean complex) {
    static Prefix simple(String text) {
      return new Prefix(text, false);
    }

    static Prefix complex(String text) {
      return new Prefix(text, true);
    }

    String bracketed() {
      return complex ? bracket(text) : text;
    }

    /** Letters that count in the alphabet: locants and tert-, sec- do not. */
    String sortKey() {
      return text.replaceAll("^(\\([0-9EZ,]*\\)-)?", "")
          .replaceAll("tert-|sec-|N-|N,N-", "")
          .replaceAll("[^A-Za-z]", "")
          .toLowerCase(Locale.ROOT);
    }
  }

  /**
   * A prefix at its place.
   *
   * @param rank place of the locant in the numbering; before all numbers for N
   */
  record Placed(Prefix prefix, String locant, int rank) {}

  static String stem(int carbons) {
    return STEMS.get(carbons);
  }

  static String multiplier(int count) {
    return SIMPLE.get(count);
  }

  /** Round, then square, then curly brackets, whichever the text does not hold yet. */
  static String bracket(String text) {
    if (text.indexOf('[') >= 0) {
      return "{" + text + "}";
    }
    return text.indexOf('(') >= 0 ? "[" + text + "]" : "(" + text + ")";
  }

  /** Prefixes in the order of the alphabet. */
  static List<Placed> sorted(List<Placed> prefixes) {
    List<Placed> list = new ArrayList<>(prefixes);
    list.sort(
        Comparator.comparing((Placed p) -> p.prefix().sortKey())
            .thenComparing(p -> p.prefix().text())
            .thenComparingInt(Placed::rank));
    return list;
  }

  /** All prefixes as one text, ready to stand before the parent. */
  static String join(List<Placed> prefixes, boolean withLocants) {
    Map<String, List<Placed>> byText = new TreeMap<>();
    List<String> order = new ArrayList<>();
    for (Placed p : sorted(prefixes)) {
      if (!byText.containsKey(p.prefix().text())) {
        order.add(p.prefix().text());
      }
      byText.computeIfAbsent(p.prefix().text(), x -> new ArrayList<>()).add(p);
    }
    StringBuilder text = new StringBuilder();
    for (String key : order) {
      String part = group(byText.getOrDefault(key, List.of()), withLocants);
      // Without numbers "chlorosulfanylmethyl" could be one prefix on another.
      boolean apart = !withLocants && text.length() > 0 && Character.isLetter(part.charAt(0));
      glue(text, apart ? bracket(part) : part);
    }
    return text.toString();
  }

  private static String group(List<Placed> equal, boolean withLocants) {
    String locants = equal.stream().map(Placed::locant).collect(Collectors.joining(","));
    return (withLocants ? locants + "-" : "") + times(equal.get(0).prefix(), equal.size());
  }

  /** "methyl", "dimethyl", "di-tert-butyl", "bis(2-phenylethyl)", "(hydroxymethyl)". */
  static String times(Prefix prefix, int count) {
    if (count == 1) {
      return prefix.bracketed();
    }
    boolean italicStart = prefix.text().startsWith("tert-") || prefix.text().startsWith("sec-");
    return prefix.complex()
        ? COMPLEX.get(count) + prefix.bracketed()
        : SIMPLE.get(count) + (italicStart ? "-" : "") + prefix.text();
  }

  /** Adds a part with a hyphen where two locants or a letter and a locant would meet. */
  static void glue(StringBuilder text, String part) {
    boolean locantNext = !part.isEmpty() && part.matches("(\\d|N[-,]|tert-|sec-).*");
    if (text.length() > 0 && locantNext) {
      text.append('-');
    }
    text.append(part);
  }

  /** Prefixes and parent as one word. */
  static String word(List<Placed> prefixes, boolean withLocants, String parent) {
    StringBuilder text = new StringBuilder(join(prefixes, withLocants));
    glue(text, parent);
    return text.toString();
  }

  /**
   * Of numberings that are equally low, the one that gives the first prefix in the alphabet the
   * lower locant.
   */
  static final Comparator<List<Placed>> ALPHABETICALLY =
      (a, b) ->
          RingLayout.compare(
              sorted(a).stream().map(Placed::rank).toList(),
              sorted(b).stream().map(Placed::rank).toList());

  /** More equal prefixes than there are multipliers for. */
  static boolean tooMany(List<Placed> prefixes) {
    return prefixes.stream()
        .collect(Collectors.groupingBy(p -> p.prefix().text(), Collectors.counting()))
        .values()
        .stream()
        .anyMatch(n -> n > MOST_EQUAL);
  }
}
