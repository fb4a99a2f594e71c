package org.foreseal.rule;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.dataformat.yaml.YAMLFactory;
import com.fasterxml.jackson.dataformat.yaml.YAMLParser;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;

/**
 * A piece of a YAML file that knows where it stands, so that every complaint can point at line and
 * column. Strict: a key may stand once, and a reader names the keys it knows.
 */
public final class YamlNode {
  private enum Kind {
    TEXT,
    LIST,
    MAP
  }

  private final Kind kind;
  private final Place place;
  private final String text;
  private final List<YamlNode> items = new ArrayList<>();
  private final Map<String, YamlNode> fields = new LinkedHashMap<>();
  private final Map<String, Place> keyPlaces = new LinkedHashMap<>();

  private YamlNode(Kind kind, Place place, String text) {
    this.kind = kind;
    this.place = place;
    this.text = text;
  }

  /**
   * Reads one YAML document.
   *
   * @param source name shown in complaints
   * @param yaml the text
   */
  public static YamlNode parse(String source, String yaml) {
    List<String> lines = yaml.lines().toList();
    try (YAMLParser parser = new YAMLFactory().createParser(yaml)) {
      Reader reader = new Reader(source, lines, parser);
      if (parser.nextToken() == null) {
        throw new BadInputException(
            new Place(source, 1, 0, ""), "the file is empty", "start from an example file");
      }
      return reader.value();
    } catch (JsonProcessingException e) {
      JsonLocation at = e.getLocation() == null ? JsonLocation.NA : e.getLocation();
      throw new BadInputException(
          placeOf(source, lines, at),
          "not valid YAML: " + firstLine(e.getOriginalMessage()),
          "check indentation, quotes and brackets");
    } catch (IOException e) {
      throw new IllegalStateException("a text in memory could not be read", e);
    }
  }

  private static String firstLine(String message) {
    return String.valueOf(message).lines().findFirst().orElse("");
  }

  private static Place placeOf(String source, List<String> lines, JsonLocation at) {
    int line = Math.max(1, at.getLineNr());
    String text = line <= lines.size() ? lines.get(line - 1) : "";
    return new Place(source, line, Math.max(0, at.getColumnNr()), text);
  }

  private record Reader(String source, List<String> lines, YAMLParser parser) {
    private static final int DEEPEST = 40;

    YamlNode value() throws IOException {
      return value(0);
    }

    private YamlNode value(int depth) throws IOException {
      Place here = placeOf(source, lines, parser.currentTokenLocation());
      if (depth > DEEPEST) {
        throw new BadInputException(here, "nested too deeply", "check the indentation");
      }
      JsonToken token = parser.currentToken();
      if (token == JsonToken.START_OBJECT) {
        return map(here, depth);
      }
      if (token == JsonToken.START_ARRAY) {
        YamlNode list = new YamlNode(Kind.LIST, here, "");
        while (parser.nextToken() != JsonToken.END_ARRAY) {
          list.items.add(value(depth + 1));
        }
        return list;
      }
      if (token == null) {
        throw new BadInputException(here, "the file ends too early", "complete it");
      }
      return new YamlNode(Kind.TEXT, here, token == JsonToken.VALUE_NULL ? "" : parser.getText());
    }

    private YamlNode map(Place here, int depth) throws IOException {
      YamlNode map = new YamlNode(Kind.MAP, here, "");
      while (parser.nextToken() != JsonToken.END_OBJECT) {
        String key = parser.currentName();
        Place at = placeOf(source, lines, parser.currentTokenLocation());
        if (map.fields.containsKey(key)) {
          throw new BadInputException(at, "'" + key + "' stands twice", "keep one of them");
        }
        parser.nextToken();
        map.fields.put(key, value(depth + 1));
        map.keyPlaces.put(key, at);
      }
      return map;
    }
  }

  /** Where it stands. */
  public Place place() {
    return place;
  }

  /** A complaint about this piece. */
  public BadInputException complaint(String problem, String hint) {
    return new BadInputException(place, problem, hint);
  }

  /** This piece as a mapping that may hold only these keys. */
  public YamlNode mapOf(Set<String> known) {
    if (kind != Kind.MAP) {
      throw complaint(
          "a mapping of keys and values is expected here", "known keys: " + listed(known));
    }
    for (String key : fields.keySet()) {
      if (!known.contains(key)) {
        throw new BadInputException(
            keyPlaces.getOrDefault(key, place),
            "unknown key '" + key + "'",
            "known keys: " + listed(known));
      }
    }
    return this;
  }

  private static String listed(Set<String> known) {
    return String.join(", ", known.stream().sorted().toList());
  }

  /** The value of this key, if given. */
  public Optional<YamlNode> get(String key) {
    return Optional.ofNullable(fields.get(key));
  }

  /** Whether the key is given. */
  public boolean has(String key) {
    return fields.containsKey(key);
  }

  /** The keys given, in order. */
  public Set<String> keys() {
    return java.util.Collections.unmodifiableSet(fields.keySet());
  }

  /** The value of this key, which must be given. */
  public YamlNode require(String key) {
    return get(key).orElseThrow(() -> complaint("'" + key + "' is missing", "add it"));
  }

  /** Whether this piece is a list. */
  public boolean isList() {
    return kind == Kind.LIST;
  }

  /** Whether this piece is a mapping. */
  public boolean isMap() {
    return kind == Kind.MAP;
  }

  /** The elements of this list. */
  public List<YamlNode> items() {
    if (kind != Kind.LIST) {
      throw complaint("a list is expected here", "write [a, b] or lines that begin with '- '");
    }
    return List.copyOf(items);
  }

  /** The elements of the list under this key, none when the key is absent. */
  public List<YamlNode> itemsOf(String key) {
    return get(key).map(YamlNode::items).orElse(List.of());
  }

  /** This piece as non-empty text. */
  public String text() {
    if (kind != Kind.TEXT || text.isBlank()) {
      throw complaint("a text is expected here", "write one value");
    }
    return text;
  }

  /** The text under this key, or this default. */
  public String textOr(String key, String otherwise) {
    return get(key).map(YamlNode::text).orElse(otherwise);
  }

  /** This piece as a whole number within bounds. */
  public int integer(int smallest, int largest) {
    try {
      int value = Integer.parseInt(text().trim());
      if (value >= smallest && value <= largest) {
        return value;
      }
    } catch (NumberFormatException e) {
      throw complaint(
          "'" + text + "' is not a whole number",
          "write a number from " + smallest + " to " + largest);
    }
    throw complaint(
        "'" + text + "' is out of range", "write a number from " + smallest + " to " + largest);
  }
}
