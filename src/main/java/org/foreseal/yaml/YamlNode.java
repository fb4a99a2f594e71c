package org.foreseal.yaml;

import java.util.List;
import java.util.Map;
import org.foreseal.quantity.Place;

/** A value of a YAML text that knows where it stands. */
public sealed interface YamlNode {
  /** Where the value begins. */
  Place place();

  /** What it is, for complaints. */
  String kind();

  /**
   * A single value, not yet interpreted.
   *
   * @param text the value without its quotes
   * @param isQuoted whether it stood in quotes or in a block
   */
  record Scalar(Place place, String text, boolean isQuoted) implements YamlNode {
    @Override
    public String kind() {
      return text.isEmpty() ? "nothing" : "a single value";
    }
  }

  /** Values one after the other. */
  record Sequence(Place place, List<YamlNode> items) implements YamlNode {
    @Override
    public String kind() {
      return "a list";
    }
  }

  /** Keys with their values, in the order written. */
  record Mapping(Place place, Map<String, Entry> entries) implements YamlNode {
    @Override
    public String kind() {
      return "a block of keys";
    }
  }

  /**
   * A key with its value.
   *
   * @param keyPlace where the key stands
   */
  record Entry(Place keyPlace, YamlNode value) {}
}
