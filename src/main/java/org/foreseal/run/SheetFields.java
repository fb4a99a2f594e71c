package org.foreseal.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import java.util.regex.Pattern;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.foreseal.yaml.YamlNode;

/** Reads the keys of one block of a run sheet and refuses those it does not know. */
final class SheetFields {
  private static final Pattern NUMBER =
      Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d{1,3})?");
  private static final Pattern NUMBER_WITH_UNIT =
      Pattern.compile("[+-]?[\\d.]+([eE][+-]?\\d+)?\\s*[A-Za-z°µ%/]+.*");
  private static final Pattern DECIMAL_COMMA = Pattern.compile("[+-]?\\d+,\\d+");

  private final YamlNode.Mapping block;
  private final String what;

  /**
   * The keys of a block.
   *
   * @param what what the block describes, for complaints
   * @param known keys it may have
   */
  SheetFields(YamlNode node, String what, List<String> known) {
    if (!(node instanceof YamlNode.Mapping mapping)) {
      throw new BadInputException(
          node.place(),
          what + ": " + node.kind() + " where a block of keys is wanted",
          "keys here: " + String.join(", ", known));
    }
    this.block = mapping;
    this.what = what;
    mapping.entries().forEach((key, entry) -> refuseUnknown(key, entry, known));
  }

  private void refuseUnknown(String key, YamlNode.Entry entry, List<String> known) {
    if (!known.contains(key)) {
      throw new BadInputException(
          entry.keyPlace(), what + ": unknown key " + key, Nearest.hint(key, known));
    }
  }

  Place place() {
    return block.place();
  }

  Optional<YamlNode> find(String key) {
    return Optional.ofNullable(block.entries().get(key)).map(YamlNode.Entry::value);
  }

  /** The scalar of a key, which must not be empty. */
  Optional<YamlNode.Scalar> scalar(String key, String wanted) {
    return find(key).map(node -> scalar(node, key, wanted));
  }

  static YamlNode.Scalar scalar(YamlNode node, String key, String wanted) {
    if (node instanceof YamlNode.Scalar scalar && !scalar.text().isBlank()) {
      return scalar;
    }
    String hint =
        node instanceof YamlNode.Sequence
            ? "if this is a SMILES that begins with a bracket, put it in quotes"
            : "write a value or leave the key out";
    throw new BadInputException(
        node.place(), key + ": " + node.kind() + " where " + wanted + " is wanted", hint);
  }

  Optional<String> text(String key) {
    return scalar(key, "a text").map(s -> s.text().strip().replaceAll("\\s+", " "));
  }

  OptionalDouble number(String key, Limits limits) {
    Optional<Double> value =
        scalar(key, "a number").map(s -> limits.check(number(s, key), key, s.place()));
    return value.isPresent() ? OptionalDouble.of(value.get()) : OptionalDouble.empty();
  }

  OptionalLong wholeNumber(String key, Limits limits) {
    OptionalDouble value = number(key, limits);
    if (value.isEmpty()) {
      return OptionalLong.empty();
    }
    if (value.getAsDouble() != Math.rint(value.getAsDouble())) {
      throw new BadInputException(
          find(key).orElseThrow().place(), key + " is a whole number", "write it without decimals");
    }
    return OptionalLong.of((long) value.getAsDouble());
  }

  /** The values of a key that may be a list or a single value. */
  List<YamlNode> items(String key) {
    Optional<YamlNode> node = find(key);
    if (node.isEmpty()) {
      return List.of();
    }
    return node.get() instanceof YamlNode.Sequence list ? list.items() : List.of(node.get());
  }

  /** The texts of a key that may be a list or a single value, each with its place. */
  List<YamlNode.Scalar> scalars(String key, String wanted) {
    List<YamlNode.Scalar> result = new ArrayList<>();
    items(key).forEach(node -> result.add(scalar(node, key, wanted)));
    return result;
  }

  /** Where the text of a scalar begins: after its quote. */
  static Place inside(YamlNode.Scalar scalar) {
    Place p = scalar.place();
    return new Place(p.source(), p.line(), p.column() + (scalar.isQuoted() ? 1 : 0), p.text());
  }

  static double number(YamlNode.Scalar scalar, String key) {
    String text = scalar.text().strip();
    if (scalar.isQuoted()) {
      throw new BadInputException(
          scalar.place(), key + ": a text where a number is wanted", "remove the quotes");
    }
    if (!NUMBER.matcher(text).matches()) {
      throw new BadInputException(
          scalar.place(), key + ": " + text + " is not a number", numberHint(text, key));
    }
    return Double.parseDouble(text);
  }

  private static String numberHint(String text, String key) {
    if (NUMBER_WITH_UNIT.matcher(text).matches()) {
      return "write the number alone; its unit is in the key " + key;
    }
    return DECIMAL_COMMA.matcher(text).matches()
        ? "write " + text.replace(',', '.')
        : "write a number such as 0.5 or 1e-3";
  }
}
