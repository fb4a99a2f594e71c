package org.foreseal.run;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.Collections;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.foreseal.quantity.CsvTable;
import org.foreseal.rule.Provision;

/**
 * A shipped table of materials by their usual names: what each offers a reaction and why. Columns:
 * name; synonyms, separated by {@code |}; roles, separated by blanks; SMILES, where it is a
 * molecule that can react as such; why; source.
 */
final class Catalogue {
  private final List<Entry> entries;
  private final Map<String, Entry> byKey = new LinkedHashMap<>();

  private Catalogue(List<Entry> entries) {
    this.entries = entries;
    for (Entry entry : entries) {
      add(entry.name(), entry);
      entry.synonyms().forEach(word -> add(word, entry));
    }
  }

  private void add(String word, Entry entry) {
    Entry other = byKey.putIfAbsent(key(word), entry);
    if (other != null) {
      throw new IllegalStateException(
          word + " names both " + other.name() + " and " + entry.name());
    }
  }

  /**
   * One material.
   *
   * @param smiles its SMILES, empty when it does not react as a molecule
   * @param why what the roles rest on
   */
  record Entry(
      String name,
      List<String> synonyms,
      Set<Provision> roles,
      String smiles,
      String why,
      String source) {
    Entry {
      synonyms = List.copyOf(synonyms);
      roles = roles.isEmpty() ? Set.of() : Collections.unmodifiableSet(EnumSet.copyOf(roles));
    }
  }

  /** Reads a table of the resource folder {@code run}. */
  static Catalogue load(String file) {
    return new Catalogue(
        CsvTable.read("/run/" + file).rows().stream().map(cells -> entry(cells, file)).toList());
  }

  private static Entry entry(List<String> cells, String file) {
    EnumSet<Provision> roles = EnumSet.noneOf(Provision.class);
    for (String word : words(cells.get(2), " ")) {
      roles.add(
          Roles.find(word).orElseThrow(() -> new IllegalStateException(file + ": role " + word)));
    }
    return new Entry(
        cells.get(0), words(cells.get(1), "\\|"), roles, cells.get(3), cells.get(4), cells.get(5));
  }

  private static List<String> words(String cell, String separator) {
    return Arrays.stream(cell.split(separator))
        .map(String::strip)
        .filter(w -> !w.isEmpty())
        .toList();
  }

  Optional<Entry> find(String name) {
    return Optional.ofNullable(byKey.get(key(name)));
  }

  List<Entry> entries() {
    return entries;
  }

  /** Every name and synonym, for hints. */
  Collection<String> words() {
    List<String> words = new ArrayList<>();
    for (Entry entry : entries) {
      words.add(entry.name());
      words.addAll(entry.synonyms());
    }
    return words;
  }

  private static String key(String name) {
    return name.toLowerCase(Locale.ROOT).replaceAll("[\\s\\-_]+", " ").strip();
  }
}
