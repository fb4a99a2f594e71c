package org.foreseal.molecule;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import org.foreseal.quantity.CsvTable;

/**
 * The curated names of {@code names/common-names.csv}. Of several names for one structure the first
 * is shown, the others are only read.
 */
final class CommonNames {
  private static final String TABLE = "/names/common-names.csv";
  private static final int MOST_SUGGESTIONS = 3;

  /**
   * One line of the table.
   *
   * @param name the name
   * @param smiles flat structure
   * @param stereoSmiles the isomer a chemist means by the name, empty when there is only one
   */
  record Entry(String name, String smiles, String stereoSmiles) {}

  private final Map<String, Entry> byName = new LinkedHashMap<>();
  private final Map<String, List<Entry>> byHeavyAtoms = new LinkedHashMap<>();
  private final Map<String, Map<String, Entry>> parsed = new ConcurrentHashMap<>();

  CommonNames() {
    Set<String> structures = new HashSet<>();
    for (List<String> row : CsvTable.read(TABLE).rows()) {
      Entry entry = new Entry(row.get(0), row.get(1), row.get(2));
      byName.putIfAbsent(normalised(entry.name()), entry);
      if (structures.add(entry.smiles())) {
        byHeavyAtoms
            .computeIfAbsent(SmilesText.heavyAtomsOf(entry.smiles()), x -> new ArrayList<>())
            .add(entry);
      }
    }
  }

  /** The structure of a name, whatever its capitals, spaces and kinds of dashes. */
  Optional<Entry> find(String name) {
    return Optional.ofNullable(byName.get(normalised(name)));
  }

  /**
   * The entry to show for a structure. Only entries with the same heavy atoms are ever read, once:
   * reading all of them would cost every start of the program half a second.
   */
  Optional<Entry> find(Molecule molecule) {
    Map<String, Entry> alike =
        parsed.computeIfAbsent(SmilesText.heavyAtomsOf(molecule), this::parse);
    return Optional.ofNullable(alike.get(molecule.key()));
  }

  private Map<String, Entry> parse(String heavyAtoms) {
    Map<String, Entry> byKey = new LinkedHashMap<>();
    for (Entry e : byHeavyAtoms.getOrDefault(heavyAtoms, List.of())) {
      byKey.putIfAbsent(Smiles.read(e.smiles()).key(), e);
    }
    return byKey;
  }

  /** Every line of the table. */
  List<Entry> all() {
    return List.copyOf(byName.values());
  }

  /** Up to three names that differ by few letters, nearest first. */
  List<String> closest(String name) {
    String wanted = normalised(name);
    int reach = Math.max(1, wanted.length() / 4);
    return byName.entrySet().stream()
        .filter(known -> Math.abs(known.getKey().length() - wanted.length()) <= reach)
        .map(known -> Map.entry(known.getValue().name(), distance(wanted, known.getKey())))
        .filter(near -> near.getValue() <= reach)
        .sorted(Comparator.comparingInt(Map.Entry::getValue))
        .limit(MOST_SUGGESTIONS)
        .map(Map.Entry::getKey)
        .toList();
  }

  /** Lower case, plain hyphens and primes, Greek letters spelled out, single spaces. */
  static String normalised(String name) {
    return name.strip()
        .toLowerCase(Locale.ROOT)
        .replaceAll("[\u2010-\u2015\u2212]", "-")
        .replaceAll("[\u2032\u2019`]", "'")
        .replace("\u03b1", "alpha")
        .replace("\u03b2", "beta")
        .replace("\u03b3", "gamma")
        .replace("\u03b4", "delta")
        .replace("\u03b5", "epsilon")
        .replaceAll("\\s+", " ");
  }

  /** Insertions, deletions, changes and swaps of neighbouring letters. */
  private static int distance(String a, String b) {
    int[][] d = new int[a.length() + 1][b.length() + 1];
    for (int i = 0; i <= a.length(); i++) {
      for (int j = 0; j <= b.length(); j++) {
        d[i][j] = i == 0 || j == 0 ? i + j : step(a, b, d, i, j);
      }
    }
    return d[a.length()][b.length()];
  }

  private static int step(String a, String b, int[][] d, int i, int j) {
    boolean same = a.charAt(i - 1) == b.charAt(j - 1);
    int best =
        Math.min(d[i - 1][j - 1] + (same ? 0 : 1), Math.min(d[i - 1][j] + 1, d[i][j - 1] + 1));
    boolean swapped =
        i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
    return swapped ? Math.min(best, d[i - 2][j - 2] + 1) : best;
  }
}
