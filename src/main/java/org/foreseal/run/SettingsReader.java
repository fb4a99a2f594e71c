package org.foreseal.run;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.foreseal.run.RunSheet.Chromatograph;
import org.foreseal.run.RunSheet.Derivatization;
import org.foreseal.run.RunSheet.Detector;
import org.foreseal.run.RunSheet.StationaryPhase;
import org.foreseal.run.RunSheet.Vessel;
import org.foreseal.yaml.YamlNode;

/** Reads the blocks of a run sheet that are not about what is charged. */
final class SettingsReader {
  private static final List<String> GC_KEYS =
      List.of("detector", "phase", "solvent", "derivatization", "detection_limit_mole_percent");

  private SettingsReader() {}

  static Hydrogen hydrogen(YamlNode node) {
    SheetFields fields =
        new SheetFields(node, "hydrogen", List.of("buffer", "fugacity_bar", "from"));
    Optional<Hydrogen> buffer =
        fields
            .scalar("buffer", "a buffer")
            .map(s -> new Hydrogen.Buffered(buffer(s.text().strip(), SheetFields.inside(s))));
    OptionalDouble fugacity = fields.number("fugacity_bar", Limits.PRESSURE_BAR);
    Optional<Hydrogen> from = fields.scalar("from", "run").map(SettingsReader::fromRun);
    if ((buffer.isPresent() ? 1 : 0) + (fugacity.isPresent() ? 1 : 0) + (from.isPresent() ? 1 : 0)
        != 1) {
      throw new BadInputException(
          fields.place(),
          "hydrogen wants one of buffer, fugacity_bar and from",
          "such as hydrogen: {buffer: hematite-magnetite}");
    }
    return buffer.or(() -> from).orElseGet(() -> new Hydrogen.Fixed(fugacity.orElseThrow()));
  }

  static Hydrogen.Assemblage buffer(String word, Place place) {
    for (Hydrogen.Assemblage assemblage : Hydrogen.Assemblage.values()) {
      if (assemblage.isCalled(word)) {
        return assemblage;
      }
    }
    List<String> known =
        Arrays.stream(Hydrogen.Assemblage.values()).map(Hydrogen.Assemblage::word).toList();
    throw new BadInputException(place, "no buffer is called " + word, Nearest.hint(word, known));
  }

  private static Hydrogen fromRun(YamlNode.Scalar scalar) {
    if (!"run".equals(scalar.text().strip())) {
      throw new BadInputException(
          scalar.place(), "from: " + scalar.text() + " is not known", "write {from: run}");
    }
    return new Hydrogen.FromRun();
  }

  static Vessel vessel(YamlNode node) {
    SheetFields fields = new SheetFields(node, "vessel", List.of("volume_mL", "kind"));
    return new Vessel(
        fields.number("volume_mL", Limits.VOLUME_MILLILITRES), fields.text("kind").orElse(""));
  }

  static Chromatograph chromatograph(YamlNode node) {
    SheetFields fields = new SheetFields(node, "gc", GC_KEYS);
    return new Chromatograph(
        oneOf(fields, "detector", Detector.values(), d -> d.name()).orElse(Detector.FID),
        oneOf(fields, "phase", StationaryPhase.values(), StationaryPhase::word)
            .orElse(StationaryPhase.FIVE_PERCENT_PHENYL),
        fields.text("solvent").orElse(""),
        oneOf(fields, "derivatization", Derivatization.values(), Derivatization::word)
            .orElse(Derivatization.NONE),
        fields
            .number("detection_limit_mole_percent", Limits.MOLE_PERCENT)
            .orElse(Chromatograph.USUAL_LIMIT_MOLE_PERCENT));
  }

  static void forecast(YamlNode node, RunDraft draft) {
    SheetFields fields = new SheetFields(node, "forecast", List.of("depth", "seed"));
    draft.depth = fields.wholeNumber("depth", Limits.DEPTH);
    draft.seed = fields.wholeNumber("seed", Limits.SEED);
  }

  private static <T> Optional<T> oneOf(
      SheetFields fields, String key, T[] values, Function<T, String> word) {
    return fields.scalar(key, "a word").map(scalar -> oneOf(scalar, key, values, word));
  }

  private static <T> T oneOf(
      YamlNode.Scalar scalar, String key, T[] values, Function<T, String> word) {
    String wanted = scalar.text().strip().toLowerCase(Locale.ROOT);
    for (T value : values) {
      if (word.apply(value).toLowerCase(Locale.ROOT).equals(wanted)) {
        return value;
      }
    }
    throw new BadInputException(
        scalar.place(),
        key + ": " + scalar.text() + " is not known",
        Nearest.hint(wanted, Arrays.stream(values).map(word).toList()));
  }
}
