package org.foreseal.report;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.OptionalDouble;

/** Builds JSON with keys in the order written and numbers of few digits. */
final class Json {
  private static final JsonNodeFactory NODES = JsonNodeFactory.instance;

  private Json() {}

  static ObjectNode object() {
    return NODES.objectNode();
  }

  static ArrayNode array() {
    return NODES.arrayNode();
  }

  static ArrayNode texts(List<String> values) {
    ArrayNode array = array();
    values.forEach(array::add);
    return array;
  }

  /** A number of at most six digits. */
  static JsonNode number(double value) {
    return Figures.json(value);
  }

  /** A number, or null when it is not known. */
  static JsonNode number(OptionalDouble value) {
    return value.isPresent() ? number(value.getAsDouble()) : NODES.nullNode();
  }

  static String text(JsonNode node) {
    DefaultIndenter indenter = new DefaultIndenter("  ", "\n");
    DefaultPrettyPrinter printer =
        new DefaultPrettyPrinter().withObjectIndenter(indenter).withArrayIndenter(indenter);
    try {
      return new ObjectMapper().writer(printer).writeValueAsString(node) + "\n";
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("a JSON tree that cannot be written", e);
    }
  }
}
