package org.foreseal.run;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
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
import org.foreseal.rule.Provision;

/**
 * A shipped table of materials by their usual names: what each offers a reaction and why. Columns:
 * name; synonyms, separated by {@code |}; roles, separated by blanks; SMILES, where it is a
 * molecule that can react as such; why; source.
 */
final class Catalogue {
  private static final int COLUMNS = 6;

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
    try (InputStream in = Catalogue.class.getResourceAsStream("/run/" + file)) {
      if (in == null) {
        throw new IllegalStateException("this build lacks run/" + file);
      }
      return new Catalogue(
          new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))
              .lines()
              .skip(1)
              .map(line -> entry(line, file))
              .toList());
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static Entry entry(String line, String file) {
    List<String> cells = cells(line);
    if (cells.size() != COLUMNS) {
      throw new IllegalStateException(file + ": " + cells.size() + " cells in: " + line);
    }
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

  private static List<String> cells(String line) {
    List<String> cells = new ArrayList<>();
    StringBuilder cell = new StringBuilder();
    boolean quoted = false;
    for (int i = 0; i < line.length(); i++) {
      char c = line.charAt(i);
      if (c == '"') {
        quoted = !quoted;
      } else if (c == ',' && !quoted) {
        cells.add(cell.toString().strip());
        cell.setLength(0);
      } else {
        cell.append(c);
      }
    }
    cells.add(cell.toString().strip());
    return cells;
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
