package org.foreseal.report;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;

/**
 * Checks a JSON tree against the part of JSON Schema that our schemas use. A word it does not know
 * is an error, so that a schema cannot say more than is checked.
 */
public final class SchemaCheck {
  private static final Set<String> WORDS =
      Set.of(
          "$schema",
          "$defs",
          "$ref",
          "title",
          "description",
          "type",
          "enum",
          "anyOf",
          "required",
          "properties",
          "additionalProperties",
          "items",
          "minItems",
          "minLength",
          "pattern",
          "minimum",
          "maximum",
          "exclusiveMinimum",
          "minProperties",
          "maxProperties");

  private final JsonNode root;

  private SchemaCheck(JsonNode root) {
    this.root = root;
  }

  /** A schema of the resource folder {@code schemas}. */
  public static SchemaCheck load(String name) {
    try (InputStream in = SchemaCheck.class.getResourceAsStream("/schemas/" + name)) {
      return new SchemaCheck(new ObjectMapper().readTree(in));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** What does not fit, with its place; empty when all fits. */
  public List<String> faults(JsonNode instance) {
    return faults(root, instance, "$");
  }

  private List<String> faults(JsonNode schema, JsonNode value, String at) {
    List<String> faults = new ArrayList<>();
    schema.fieldNames().forEachRemaining(word -> refuseUnknown(word));
    if (schema.has("$ref")) {
      String name = schema.get("$ref").asText().replace("#/$defs/", "");
      faults.addAll(faults(root.get("$defs").get(name), value, at));
    }
    if (schema.has("anyOf")) {
      anyOf(schema.get("anyOf"), value, at, faults);
    }
    if (schema.has("enum") && stream(schema.get("enum")).noneMatch(value::equals)) {
      faults.add(at + ": " + value + " is none of " + schema.get("enum"));
    }
    if (schema.has("type") && stream(schema.get("type")).noneMatch(t -> isOf(t.asText(), value))) {
      faults.add(at + ": " + value + " is no " + schema.get("type"));
      return faults;
    }
    scalar(schema, value, at, faults);
    if (value.isObject()) {
      object(schema, value, at, faults);
    }
    if (value.isArray()) {
      array(schema, value, at, faults);
    }
    return faults;
  }

  private static void refuseUnknown(String word) {
    if (!WORDS.contains(word)) {
      throw new IllegalArgumentException("schema word " + word + " is not checked");
    }
  }

  private void anyOf(JsonNode choices, JsonNode value, String at, List<String> faults) {
    List<String> all = new ArrayList<>();
    for (JsonNode choice : choices) {
      List<String> found = faults(choice, value, at);
      if (found.isEmpty()) {
        return;
      }
      all.addAll(found);
    }
    faults.addAll(all);
  }

  private static void scalar(JsonNode schema, JsonNode value, String at, List<String> faults) {
    if (value.isNumber()) {
      double number = value.asDouble();
      boolean isLow =
          number < schema.path("minimum").asDouble(Double.NEGATIVE_INFINITY)
              || number <= schema.path("exclusiveMinimum").asDouble(Double.NEGATIVE_INFINITY);
      boolean isHigh = number > schema.path("maximum").asDouble(Double.POSITIVE_INFINITY);
      if (isLow || isHigh) {
        faults.add(at + ": " + value + " is out of range");
      }
    }
    if (value.isTextual()) {
      if (value.asText().length() < schema.path("minLength").asInt(0)) {
        faults.add(at + ": too short");
      }
      if (schema.has("pattern")
          && !value.asText().matches(".*" + schema.get("pattern").asText() + ".*")) {
        faults.add(at + ": " + value + " does not match");
      }
    }
  }

  private void object(JsonNode schema, JsonNode value, String at, List<String> faults) {
    for (JsonNode key : schema.path("required")) {
      if (!value.has(key.asText())) {
        faults.add(at + ": no " + key.asText());
      }
    }
    int size = value.size();
    if (size < schema.path("minProperties").asInt(0)
        || size > schema.path("maxProperties").asInt(Integer.MAX_VALUE)) {
      faults.add(at + ": " + size + " keys");
    }
    value
        .fieldNames()
        .forEachRemaining(
            key -> {
              JsonNode property = schema.path("properties").path(key);
              if (!property.isMissingNode()) {
                faults.addAll(faults(property, value.get(key), at + "." + key));
              } else if (!schema.path("additionalProperties").asBoolean(true)) {
                faults.add(at + ": unknown key " + key);
              }
            });
  }

  private void array(JsonNode schema, JsonNode value, String at, List<String> faults) {
    if (value.size() < schema.path("minItems").asInt(0)) {
      faults.add(at + ": only " + value.size() + " items");
    }
    if (schema.has("items")) {
      for (int i = 0; i < value.size(); i++) {
        faults.addAll(faults(schema.get("items"), value.get(i), at + "[" + i + "]"));
      }
    }
  }

  private static boolean isOf(String type, JsonNode value) {
    return switch (type) {
      case "object" -> value.isObject();
      case "array" -> value.isArray();
      case "string" -> value.isTextual();
      case "number" -> value.isNumber();
      case "integer" -> value.isIntegralNumber();
      case "boolean" -> value.isBoolean();
      case "null" -> value.isNull();
      default -> throw new IllegalArgumentException("type " + type);
    };
  }

  private static Stream<JsonNode> stream(JsonNode node) {
    return node.isArray() ? StreamSupport.stream(node.spliterator(), false) : Stream.of(node);
  }
}
