package org.foreseal.rule;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.CsvTable;

/**
 * All rules at hand, in order of file name and place in the file. A user's folder adds rules to the
 * built-in ones and replaces those that carry the same id.
 */
public final class RuleLibrary {
  private static final String FOLDER = "/rules/";
  private static final String INDEX = "index.txt";

  private final Map<String, Rule> rules;
  private final List<SpeciesLimit> limits;
  private final String digest;

  private RuleLibrary(Map<String, Rule> rules, List<SpeciesLimit> limits, String digest) {
    this.rules = rules;
    this.limits = List.copyOf(limits);
    this.digest = digest;
  }

  /**
   * The library in the jar, read once. Its examples are checked by the test suite, not at every
   * start.
   */
  public static RuleLibrary builtIn() {
    return BuiltIn.LIBRARY;
  }

  private static final class BuiltIn {
    static final RuleLibrary LIBRARY = read();

    private static RuleLibrary read() {
      Map<String, String> files = new TreeMap<>();
      for (String name : resource(INDEX).lines().filter(l -> !l.isBlank()).toList()) {
        files.put(name, resource(name));
      }
      return of(files);
    }
  }

  /**
   * The rule files of a folder, {@code *.yaml} in order of name.
   *
   * @throws IOException when the folder or a file cannot be read
   */
  public static RuleLibrary folder(Path folder) throws IOException {
    Map<String, String> files = new TreeMap<>();
    try (Stream<Path> entries = Files.list(folder)) {
      for (Path path : entries.filter(p -> p.toString().endsWith(".yaml")).sorted().toList()) {
        files.put(path.toString(), Files.readString(path));
      }
    }
    return of(files);
  }

  /** Rules from texts, keyed by the name to show in complaints. */
  public static RuleLibrary of(Map<String, String> files) {
    Map<String, Rule> rules = new LinkedHashMap<>();
    List<SpeciesLimit> limits = new ArrayList<>();
    List<RuleReader.Contents> contents =
        new TreeMap<>(files)
            .entrySet().parallelStream()
                .map(f -> RuleReader.read(f.getKey(), f.getValue()))
                .toList();
    for (RuleReader.Contents file : contents) {
      file.rules().forEach(rule -> addOnce(rules, rule));
      limits.addAll(file.limits());
    }
    return new RuleLibrary(rules, limits, digestOf(files));
  }

  private static void addOnce(Map<String, Rule> rules, Rule rule) {
    Rule earlier = rules.putIfAbsent(rule.id(), rule);
    if (earlier != null) {
      throw new BadInputException(
          rule.place(),
          "rule '" + rule.id() + "' stands also at " + earlier.place().label(),
          "give every rule its own id");
    }
  }

  /** This library with those of another added, replacing rules of the same id. */
  public RuleLibrary with(RuleLibrary own) {
    Map<String, Rule> merged = new LinkedHashMap<>(rules);
    merged.putAll(own.rules);
    List<SpeciesLimit> allLimits = new ArrayList<>(limits);
    allLimits.addAll(own.limits);
    return new RuleLibrary(
        merged, allLimits, digestOf(Map.of("built-in", digest, "own", own.digest)));
  }

  /** The rules in order. */
  public Collection<Rule> rules() {
    return Collections.unmodifiableCollection(rules.values());
  }

  /** The rule with this id. */
  public Optional<Rule> find(String id) {
    return Optional.ofNullable(rules.get(id));
  }

  /** What no rule may make. */
  public List<SpeciesLimit> speciesLimits() {
    return limits;
  }

  /** SHA-256 of the files, as hexadecimal digits. */
  public String digest() {
    return digest;
  }

  private static String resource(String name) {
    return new String(CsvTable.bytes(FOLDER + name), StandardCharsets.UTF_8);
  }

  private static String digestOf(Map<String, String> files) {
    try {
      MessageDigest sha = MessageDigest.getInstance("SHA-256");
      for (Map.Entry<String, String> file : new TreeMap<>(files).entrySet()) {
        sha.update(file.getValue().replace("\r\n", "\n").getBytes(StandardCharsets.UTF_8));
      }
      return HexFormat.of().formatHex(sha.digest());
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java has SHA-256", e);
    }
  }
}
