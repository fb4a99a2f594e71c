package org.foreseal.yaml;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.dataformat.yaml.YAMLFactory;
import com.fasterxml.jackson.dataformat.yaml.YAMLParser;
import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;

/**
 * Reads the plain part of YAML that run sheets and rule files need, keeping every place: keys,
 * lists and single values. Anchors, aliases, tags, repeated keys and further documents are refused.
 */
public final class YamlTree {
  private static final int DEEPEST = 16;
  private static final String SYNTAX_HINT =
      "indent with spaces, one key: value per line; put SMILES and texts with : or # in quotes";

  private final String source;
  private final List<String> lines;
  private final YAMLParser parser;

  private YamlTree(String source, List<String> lines, YAMLParser parser) {
    this.source = source;
    this.lines = lines;
    this.parser = parser;
  }

  /**
   * The one document of a text.
   *
   * @param source name of the file, for complaints
   */
  public static YamlNode read(String text, String source) {
    List<String> lines = text.lines().toList();
    Place start = new Place(source, 1, 0, lines.isEmpty() ? "" : lines.get(0));
    refuseControlCharacters(lines, source);
    try (YAMLParser parser = new YAMLFactory().createParser(new StringReader(text))) {
      YamlTree tree = new YamlTree(source, lines, parser);
      JsonToken first = parser.nextToken();
      if (first == null) {
        throw new BadInputException(start, "nothing in this file", "start from an example file");
      }
      YamlNode root = tree.node(first, 0);
      if (parser.nextToken() != null) {
        throw new BadInputException(
            tree.here(), "a second document", "one document per file: remove the line ---");
      }
      return root;
    } catch (JsonProcessingException e) {
      throw new BadInputException(
          place(source, lines, e.getLocation()), "not valid YAML: " + problem(e), SYNTAX_HINT);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static void refuseControlCharacters(List<String> lines, String source) {
    for (int i = 0; i < lines.size(); i++) {
      String line = lines.get(i);
      for (int k = 0; k < line.length(); k++) {
        char c = line.charAt(k);
        boolean isTextual = c == '\t' || (c >= ' ' && c != '\u007f');
        if (!isTextual || c == '\ufffd') {
          throw new BadInputException(
              new Place(source, i + 1, k + 1, line),
              "a character that is not text",
              "save the file as UTF-8 text");
        }
      }
    }
  }

  private YamlNode node(JsonToken token, int depth) throws IOException {
    Place place = here();
    if (depth > DEEPEST) {
      throw new BadInputException(place, "nested too deeply", "check the indentation");
    }
    if (parser.isCurrentAlias() || parser.getObjectId() != null || parser.getTypeId() != null) {
      throw new BadInputException(
          place, "anchors, aliases and tags are not used here", "write the value out");
    }
    return switch (token) {
      case START_OBJECT -> mapping(place, depth);
      case START_ARRAY -> sequence(place, depth);
      default -> new YamlNode.Scalar(place, scalarText(token), isQuoted(place));
    };
  }

  private String scalarText(JsonToken token) throws IOException {
    String text = parser.getText();
    return token == JsonToken.VALUE_NULL && "null".equals(text) ? "" : text == null ? "" : text;
  }

  private YamlNode.Mapping mapping(Place place, int depth) throws IOException {
    Map<String, YamlNode.Entry> entries = new LinkedHashMap<>();
    while (parser.nextToken() != JsonToken.END_OBJECT) {
      Place keyPlace = here();
      String key = String.valueOf(parser.currentName());
      YamlNode value = node(required(parser.nextToken()), depth + 1);
      YamlNode.Entry earlier = entries.putIfAbsent(key, new YamlNode.Entry(keyPlace, value));
      if (earlier != null) {
        throw new BadInputException(
            keyPlace,
            key + " is given twice, first on line " + earlier.keyPlace().line(),
            "keep one of the two");
      }
    }
    return new YamlNode.Mapping(place, Collections.unmodifiableMap(entries));
  }

  private YamlNode.Sequence sequence(Place place, int depth) throws IOException {
    List<YamlNode> items = new ArrayList<>();
    for (JsonToken t = required(parser.nextToken());
        t != JsonToken.END_ARRAY;
        t = required(parser.nextToken())) {
      items.add(node(t, depth + 1));
    }
    return new YamlNode.Sequence(place, List.copyOf(items));
  }

  private static JsonToken required(JsonToken token) throws IOException {
    if (token == null) {
      throw new java.io.EOFException("the text ends in the middle");
    }
    return token;
  }

  private boolean isQuoted(Place place) {
    int at = place.column() - 1;
    return at >= 0 && at < place.text().length() && "\"'|>".indexOf(place.text().charAt(at)) >= 0;
  }

  private Place here() {
    return place(source, lines, parser.currentTokenLocation());
  }

  private static Place place(String source, List<String> lines, JsonLocation location) {
    if (location == null || location.getLineNr() < 1) {
      return new Place(source, 1, 0, "");
    }
    int line = location.getLineNr();
    String text = line <= lines.size() ? lines.get(line - 1) : "";
    return new Place(source, line, Math.max(0, location.getColumnNr()), text);
  }

  /** The parser's own words without the places and excerpts it adds, which are indented. */
  private static String problem(JsonProcessingException e) {
    String text =
        String.valueOf(e.getOriginalMessage())
            .lines()
            .filter(line -> !line.isBlank() && !Character.isWhitespace(line.charAt(0)))
            .map(String::strip)
            .collect(Collectors.joining(", "));
    return text.isEmpty() ? "it cannot be read" : text;
  }
}
