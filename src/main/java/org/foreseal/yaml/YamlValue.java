package org.foreseal.yaml;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;

/**
 * A value of a YAML text, asked strictly: whoever reads it names the keys it knows and the kind of
 * value it expects, and anything else is met with a complaint that points at the place.
 */
public final class YamlValue {
  private final YamlNode node;

  private YamlValue(YamlNode node) {
    this.node = node;
  }

  /**
   * Reads one YAML document.
   *
   * @param source name shown in complaints
   * @param yaml the text
   */
  public static YamlValue parse(String source, String yaml) {
    return new YamlValue(YamlTree.read(yaml, source));
  }

  /** Where it stands. */
  public Place place() {
    return node.place();
  }

  /** A complaint about this value. */
  public BadInputException complaint(String problem, String hint) {
    return new BadInputException(place(), problem, hint);
  }

  /** This value as a mapping that may hold only these keys. */
  public YamlValue mapOf(Set<String> known) {
    if (!(node instanceof YamlNode.Mapping mapping)) {
      throw complaint(
          "a mapping of keys and values is expected here", "known keys: " + listed(known));
    }
    mapping.entries().forEach((key, entry) -> refuseUnknown(key, entry, known));
    return this;
  }

  private static void refuseUnknown(String key, YamlNode.Entry entry, Set<String> known) {
    if (!known.contains(key)) {
      throw new BadInputException(
          entry.keyPlace(), "unknown key '" + key + "'", "known keys: " + listed(known));
    }
  }

  private static String listed(Set<String> known) {
    return String.join(", ", known.stream().sorted().toList());
  }

  /** The value of this key, if given. */
  public Optional<YamlValue> get(String key) {
    return node instanceof YamlNode.Mapping mapping
        ? Optional.ofNullable(mapping.entries().get(key)).map(e -> new YamlValue(e.value()))
        : Optional.empty();
  }

  /** Whether the key is given. */
  public boolean has(String key) {
    return get(key).isPresent();
  }

  /** The keys given, in order. */
  public Set<String> keys() {
    return node instanceof YamlNode.Mapping mapping ? mapping.entries().keySet() : Set.of();
  }

  /** The value of this key, which must be given. */
  public YamlValue require(String key) {
    return get(key).orElseThrow(() -> complaint("'" + key + "' is missing", "add it"));
  }

  /** Whether this value is a list. */
  public boolean isList() {
    return node instanceof YamlNode.Sequence;
  }

  /** The elements of this list. */
  public List<YamlValue> items() {
    if (node instanceof YamlNode.Sequence list) {
      return list.items().stream().map(YamlValue::new).toList();
    }
    throw complaint("a list is expected here", "write [a, b] or lines that begin with '- '");
  }

  /** The elements of the list under this key, none when the key is absent. */
  public List<YamlValue> itemsOf(String key) {
    return get(key).map(YamlValue::items).orElse(List.of());
  }

  /** This value as non-empty text. */
  public String text() {
    if (node instanceof YamlNode.Scalar scalar && !scalar.text().isBlank()) {
      return scalar.text();
    }
    throw complaint("a text is expected here", "write one value");
  }

  /** The text under this key, or this default. */
  public String textOr(String key, String otherwise) {
    return get(key).map(YamlValue::text).orElse(otherwise);
  }

  /** This value as a whole number within bounds. */
  public int integer(int smallest, int largest) {
    String text = text().strip();
    if (!text.matches("[+-]?\\d{1,9}")) {
      throw complaint(
          "'" + text + "' is not a whole number",
          "write a number from " + smallest + " to " + largest);
    }
    int value = Integer.parseInt(text);
    if (value < smallest || value > largest) {
      throw complaint(
          "'" + text + "' is out of range", "write a number from " + smallest + " to " + largest);
    }
    return value;
  }
}
