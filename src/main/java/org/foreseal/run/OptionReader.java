package org.foreseal.run;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.foreseal.molecule.MoleculeReader;
import org.foreseal.molecule.ReadMolecule;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.foreseal.rule.Provision;
import org.foreseal.run.RunDraft.Given;
import org.foreseal.run.RunSheet.Additive;
import org.foreseal.run.RunSheet.Amount;
import org.foreseal.run.RunSheet.Solid;
import org.foreseal.run.RunSheet.Substrate;
import org.foreseal.yaml.YamlNode;

/** Puts what the options say into a draft. */
final class OptionReader {
  private static final Pattern ROLES_AT_END = Pattern.compile("(.*\\S)\\s*\\[([a-z, -]*)]");
  private static final String NO_SOLID = "none";

  private final MoleculeReader molecules;
  private final SolidCatalogue solids;
  private final AdditiveCatalogue additives;

  OptionReader(MoleculeReader molecules, SolidCatalogue solids, AdditiveCatalogue additives) {
    this.molecules = molecules;
    this.solids = solids;
    this.additives = additives;
  }

  /** Options win over what the draft holds; solids are left to {@link #solids}. */
  void apply(RunOptions options, RunDraft draft) {
    if (!options.substrates().isEmpty()) {
      draft.substrates = options.substrates().stream().map(this::substrate).toList();
    }
    if (!options.additives().isEmpty()) {
      draft.additives = options.additives().stream().map(this::additive).toList();
    }
    options
        .temperature()
        .ifPresent(
            t ->
                draft.temperatureCelsius = Measures.temperaturesCelsius(t, at("--temperature", t)));
    options
        .pressure()
        .ifPresent(
            t -> draft.pressureBar = OptionalDouble.of(Measures.bar(t, at("--pressure", t))));
    options
        .time()
        .ifPresent(
            t -> draft.durationHours = OptionalDouble.of(Measures.hours(t, at("--time", t))));
    options
        .water()
        .ifPresent(
            t -> draft.waterGrams = OptionalDouble.of(Measures.waterGrams(t, at("--water", t))));
    options.solvent().ifPresent(t -> draft.inWater = Optional.of(isWater(t)));
    options.hydrogen().ifPresent(t -> draft.hydrogen = Optional.of(hydrogen(t)));
    options.acidity().ifPresent(t -> draft.acidity = OptionalDouble.of(acidity(t)));
    draft.depth = limited(options.depth(), "--depth", Limits.DEPTH, draft.depth);
    draft.seed = limited(options.seed(), "--seed", Limits.SEED, draft.seed);
  }

  private static OptionalLong limited(
      OptionalLong given, String option, Limits limits, OptionalLong otherwise) {
    if (given.isEmpty()) {
      return otherwise;
    }
    limits.check(
        (double) given.getAsLong(),
        option.substring(2),
        at(option, Long.toString(given.getAsLong())));
    return given;
  }

  /** Place of the value of an option. */
  static Place at(String option, String value) {
    return Place.onCommandLine(option + " " + value, option.length() + 2);
  }

  private static boolean isWater(String text) {
    return switch (text.strip()) {
      case "water" -> true;
      case "none" -> false;
      default ->
          throw new BadInputException(
              at("--solvent", text),
              "the solvent " + text + " is not known",
              "water, or none for the vapour phase and neat runs");
    };
  }

  private static Hydrogen hydrogen(String text) {
    Place place = at("--hydrogen", text);
    if ("run".equals(text.strip())) {
      return new Hydrogen.FromRun();
    }
    return Measures.looksLikeNumber(text)
        ? new Hydrogen.Fixed(Measures.bar(text, place))
        : new Hydrogen.Buffered(SettingsReader.buffer(text.strip(), place));
  }

  private static double acidity(String text) {
    Place place = at("--ph", text);
    YamlNode.Scalar scalar = new YamlNode.Scalar(place, text, false);
    return Limits.ACIDITY.check(SheetFields.number(scalar, "pH"), "pH", place);
  }

  private Given<Substrate> substrate(String text) {
    Place place = Place.onCommandLine(text, 1);
    Parts parts = parts(text);
    Optional<Amount> amount = parts.amount().map(a -> Measures.amount(a, parts.amountPlace(place)));
    ReadMolecule read = molecules.read(parts.name(), place);
    return new Given<>(new Substrate(read.name(), read.molecule(), amount), place, read.notes());
  }

  private Given<Additive> additive(String text) {
    Place place = at("--additive", text);
    Parts parts = parts(text);
    Named named = named(parts.name(), place);
    List<String> notes = new ArrayList<>();
    Optional<Amount> amount = parts.amount().map(a -> Measures.amount(a, parts.amountPlace(place)));
    Additive known =
        additives.read(named.name(), Optional.empty(), named.roles(), molecules, place, notes);
    return new Given<>(
        new Additive(known.name(), known.molecule(), known.roles(), amount), place, notes);
  }

  /** The solids of one run: joined by {@code +}, or {@code none}. */
  List<Given<Solid>> solids(String text) {
    if (NO_SOLID.equals(text.strip())) {
      return List.of();
    }
    List<Given<Solid>> result = new ArrayList<>();
    int from = 0;
    for (String part : text.split("\\+", -1)) {
      Place place = Place.onCommandLine("--solid " + text, "--solid ".length() + from + 1);
      result.add(new Given<>(solid(part.strip(), place), place, List.of()));
      from += part.length() + 1;
    }
    return result;
  }

  private Solid solid(String text, Place place) {
    Parts parts = parts(text);
    Named named = named(parts.name(), place);
    Solid known = solids.read(named.name(), named.roles(), place);
    Place amountPlace = parts.amountPlace(place);
    List<Double> masses = new ArrayList<>();
    List<Double> surfaces = new ArrayList<>();
    for (String value : parts.amount().map(a -> a.split(",", -1)).orElse(new String[0])) {
      if (Measures.isSurface(value)) {
        surfaces.add(Measures.surface(value, amountPlace));
      } else {
        masses.add(Measures.milligrams(value, amountPlace));
      }
    }
    return new Solid(
        known.name(),
        known.roles(),
        single(masses, "masses", amountPlace),
        single(surfaces, "surfaces", amountPlace));
  }

  private static OptionalDouble single(List<Double> values, String what, Place place) {
    if (values.size() > 1) {
      throw new BadInputException(place, "two " + what, "write it like magnetite=50mg,5m2/g");
    }
    return values.isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(values.get(0));
  }

  private record Named(String name, Set<Provision> roles) {}

  private static Named named(String text, Place place) {
    Matcher matcher = ROLES_AT_END.matcher(text);
    if (!matcher.matches()) {
      return new Named(text, Set.of());
    }
    Set<Provision> roles = EnumSet.noneOf(Provision.class);
    for (String word : matcher.group(2).split(",", -1)) {
      roles.add(Roles.read(word, place));
    }
    return new Named(matcher.group(1), roles);
  }

  /** A name and what stands behind the last {@code =}, if that begins with a number. */
  private record Parts(String name, Optional<String> amount) {
    Place amountPlace(Place whole) {
      return new Place(
          whole.source(), whole.line(), whole.column() + name.length() + 1, whole.text());
    }
  }

  /**
   * A double bond of a SMILES is no amount: {@code C=O} has no number behind it, and in {@code
   * C=1CCCCC1} an atom follows the number of the ring closure where a unit would stand.
   */
  private static Parts parts(String text) {
    int at = text.lastIndexOf('=');
    String behind = at < 0 ? "" : text.substring(at + 1).strip();
    boolean isAmount = !behind.isEmpty() && "+-.0123456789".indexOf(behind.charAt(0)) >= 0;
    boolean isRingClosure = behind.matches("\\d[BCNOPSFI(\\[].*");
    return isAmount && !isRingClosure
        ? new Parts(text.substring(0, at).strip(), Optional.of(behind))
        : new Parts(text.strip(), Optional.empty());
  }
}
