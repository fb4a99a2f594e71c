package org.foreseal.cli;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.OptionalLong;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.foreseal.run.ForecastOptions;
import org.foreseal.run.RunOptions;
import org.foreseal.run.RunReader;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** A run on the command line: a run sheet, substrates, conditions. */
final class RunArguments {
  private static final String STANDARD_INPUT = "-";
  private static final int LONGEST_SHEET_BYTES = 1 << 20;

  @Parameters(
      paramLabel = "RUN",
      arity = "0..*",
      description = {
        "A run sheet (.yaml, or - for standard input), or substrates by name or SMILES, each"
            + " optionally =AMOUNT."
      })
  private List<String> arguments = new ArrayList<>();

  @Option(
      names = "--solid",
      paramLabel = "SOLID",
      description = {
        "Mineral or catalyst, optionally =MASS,SURFACE. Several --solid: runs side by side;"
            + " A+B: both in one run; none: no solid. Unknown ones state their roles:"
            + " \"my catalyst[oxide,acid]\"."
      })
  private List<String> solids = new ArrayList<>();

  @Option(
      names = "--additive",
      paramLabel = "ADDITIVE",
      description = "Acid, base, salt, oxidant, gas, H donor, optionally =AMOUNT.")
  private List<String> additives = new ArrayList<>();

  @Option(
      names = {"-T", "--temperature"},
      paramLabel = "T",
      description = "300C, 573K; 260C,300C or 260..300C side by side.")
  private @Nullable String temperature;

  @Option(
      names = {"-P", "--pressure"},
      paramLabel = "P",
      description = "300bar, 1kbar, 30MPa.")
  private @Nullable String pressure;

  @Option(
      names = {"-t", "--time"},
      paramLabel = "TIME",
      description = "70h, 3d, 30min.")
  private @Nullable String time;

  @Option(names = "--solvent", paramLabel = "WORD", description = "water (default) or none.")
  private @Nullable String solvent;

  @Option(names = "--water", paramLabel = "MASS", description = "Water charged, 0.25g.")
  private @Nullable String water;

  @Option(
      names = "--hydrogen",
      paramLabel = "H2",
      description = "What sets H2: hematite-magnetite (or another buffer), 2bar, or run.")
  private @Nullable String hydrogen;

  @Option(names = "--ph", paramLabel = "PH", description = "pH at 25 C.")
  private @Nullable String acidity;

  @Option(names = "--depth", paramLabel = "N", description = "Steps from the charge, 0 to 6 (3).")
  private @Nullable Long depth;

  @Option(names = "--seed", paramLabel = "N", description = "Random seed (1).")
  private @Nullable Long seed;

  @Option(
      names = "--rules",
      paramLabel = "DIR",
      description = "Your own rules: they add to or replace built-in ones.")
  private @Nullable Path rules;

  @Option(
      names = "--limit-species",
      paramLabel = "N",
      description = "Cut the network at this size.")
  private @Nullable Integer mostSpecies;

  @Option(
      names = "--limit-time",
      paramLabel = "TIME",
      description = "Cut the network after this time, 20s.")
  private @Nullable String longest;

  /** The runs asked for, one for each solid and temperature. */
  List<RunReader.Variant> read(Session session) throws IOException {
    Optional<String> sheet = sheetArgument();
    RunReader reader = new RunReader(session.molecules());
    return sheet.isPresent()
        ? reader.read(Optional.of(sheet(sheet.get(), session)), options())
        : reader.read(Optional.empty(), options());
  }

  ForecastOptions forecastOptions(boolean everything) {
    return new ForecastOptions(
        everything,
        Optional.ofNullable(rules),
        mostSpecies == null ? OptionalInt.empty() : OptionalInt.of(mostSpecies(mostSpecies)),
        Optional.ofNullable(longest).map(RunArguments::duration));
  }

  private static int mostSpecies(int given) {
    if (given < 1) {
      throw new BadInputException(
          Place.onCommandLine("--limit-species " + given, 17),
          "a limit of " + given + " species",
          "give at least 1");
    }
    return given;
  }

  private static Duration duration(String text) {
    return RunOptions.duration("--limit-time", text);
  }

  private RunOptions options() {
    return new RunOptions(
        arguments.stream().filter(a -> !isSheet(a)).toList(),
        solids,
        additives,
        Optional.ofNullable(temperature),
        Optional.ofNullable(pressure),
        Optional.ofNullable(time),
        Optional.ofNullable(solvent),
        Optional.ofNullable(water),
        Optional.ofNullable(hydrogen),
        Optional.ofNullable(acidity),
        depth == null ? OptionalLong.empty() : OptionalLong.of(depth),
        seed == null ? OptionalLong.empty() : OptionalLong.of(seed));
  }

  private Optional<String> sheetArgument() {
    List<String> sheets = arguments.stream().filter(RunArguments::isSheet).toList();
    if (sheets.size() > 1) {
      throw new BadInputException(
          Place.onCommandLine(sheets.get(1), 1),
          "a second run sheet",
          "one run sheet at a time; several minerals go into several --solid");
    }
    return sheets.stream().findFirst();
  }

  private static boolean isSheet(String argument) {
    String lower = argument.toLowerCase(Locale.ROOT);
    return STANDARD_INPUT.equals(argument) || lower.endsWith(".yaml") || lower.endsWith(".yml");
  }

  private static RunReader.Sheet sheet(String argument, Session session) throws IOException {
    boolean isInput = STANDARD_INPUT.equals(argument);
    String source = isInput ? "standard input" : argument;
    byte[] bytes =
        isInput ? session.input().readNBytes(LONGEST_SHEET_BYTES + 1) : firstBytes(path(argument));
    Place start = new Place(source, 1, 0, "");
    if (bytes.length > LONGEST_SHEET_BYTES) {
      throw new BadInputException(start, "longer than a megabyte", "give a run sheet");
    }
    try {
      String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      return new RunReader.Sheet(source, text.startsWith("\ufeff") ? text.substring(1) : text);
    } catch (CharacterCodingException e) {
      throw new BadInputException(start, "not UTF-8 text", "save the run sheet as UTF-8 text");
    }
  }

  private static Path path(String argument) {
    if (argument.indexOf('\0') >= 0) {
      throw new BadInputException(
          Place.onCommandLine(argument, 1), "not a file name", "give the name of a run sheet");
    }
    return Path.of(argument);
  }

  private static byte[] firstBytes(Path file) throws IOException {
    if (Files.isDirectory(file)) {
      throw new FileSystemException(file.toString(), null, "is a folder");
    }
    try (InputStream in = Files.newInputStream(file)) {
      return in.readNBytes(LONGEST_SHEET_BYTES + 1);
    }
  }
}
