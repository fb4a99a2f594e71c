package org.foreseal.run;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.foreseal.molecule.Molecule;
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
import org.foreseal.yaml.YamlTree;

/**
 * Reads a run sheet, strictly: what is not understood is refused with its place. The format is
 * described by {@code schemas/run-sheet.schema.json}.
 */
final class RunSheetReader {
  private static final List<String> KEYS =
      List.of(
          "title",
          "substrates",
          "solvent",
          "water_g",
          "solids",
          "additives",
          "temperature_C",
          "pressure_bar",
          "duration_h",
          "hydrogen",
          "pH_25C",
          "vessel",
          "gc",
          "forecast");
  private static final List<String> AMOUNT_KEYS = List.of("molality", "milligrams", "millimoles");
  private static final List<String> SUBSTRATE_KEYS =
      List.of("name", "smiles", "molality", "milligrams", "millimoles");
  private static final List<String> SOLID_KEYS =
      List.of("name", "acts_as", "milligrams", "surface_m2_per_g");
  private static final List<String> ADDITIVE_KEYS =
      List.of("name", "smiles", "acts_as", "molality", "milligrams", "millimoles", "pressure_bar");

  /** Shorter labels, such as A or CO, are not taken for names. */
  private static final int SHORTEST_NAME = 4;

  private final MoleculeReader molecules;
  private final SolidCatalogue solids;
  private final AdditiveCatalogue additives;

  RunSheetReader(MoleculeReader molecules, SolidCatalogue solids, AdditiveCatalogue additives) {
    this.molecules = molecules;
    this.solids = solids;
    this.additives = additives;
  }

  /**
   * What the sheet says, not yet checked for completeness.
   *
   * @param source name of the file, for complaints
   */
  RunDraft read(String text, String source) {
    SheetFields fields = new SheetFields(YamlTree.read(text, source), "run sheet", KEYS);
    RunDraft draft = new RunDraft();
    draft.title = fields.text("title");
    draft.substrates = each(fields, "substrates", this::substrate);
    draft.inWater = fields.scalar("solvent", "water or none").map(RunSheetReader::isWater);
    draft.waterGrams = fields.number("water_g", Limits.WATER_GRAMS);
    draft.solids = each(fields, "solids", this::solid);
    draft.additives = each(fields, "additives", this::additive);
    draft.temperatureCelsius = temperatures(fields);
    draft.pressureBar = fields.number("pressure_bar", Limits.PRESSURE_BAR);
    draft.durationHours = fields.number("duration_h", Limits.DURATION_HOURS);
    draft.acidity = fields.number("pH_25C", Limits.ACIDITY);
    draft.hydrogen = fields.find("hydrogen").map(SettingsReader::hydrogen);
    draft.vessel = fields.find("vessel").map(SettingsReader::vessel);
    draft.chromatograph = fields.find("gc").map(SettingsReader::chromatograph);
    fields.find("forecast").ifPresent(node -> SettingsReader.forecast(node, draft));
    return draft;
  }

  private interface ItemReader<T> {
    Given<T> read(YamlNode node);
  }

  private static <T> List<Given<T>> each(SheetFields fields, String key, ItemReader<T> reader) {
    List<Given<T>> result = new ArrayList<>();
    fields.items(key).forEach(node -> result.add(reader.read(node)));
    return result;
  }

  private static boolean isWater(YamlNode.Scalar scalar) {
    return switch (scalar.text().strip()) {
      case "water" -> true;
      case "none" -> false;
      default ->
          throw new BadInputException(
              scalar.place(),
              "solvent: " + scalar.text() + " is not known",
              "water, or none for the vapour phase and neat runs");
    };
  }

  private static List<Double> temperatures(SheetFields fields) {
    Optional<YamlNode> node = fields.find("temperature_C");
    if (node.isEmpty()) {
      return List.of();
    }
    List<Double> result = new ArrayList<>();
    for (YamlNode.Scalar scalar : fields.scalars("temperature_C", "a temperature")) {
      boolean isRange = scalar.text().contains("..");
      result.addAll(
          isRange
              ? Measures.sheetTemperatures(scalar.text(), SheetFields.inside(scalar))
              : List.of(temperature(scalar)));
    }
    if (result.isEmpty()) {
      throw new BadInputException(
          node.get().place(), "temperature_C: an empty list", "write temperature_C: 260");
    }
    return Measures.ordered(result, node.get().place());
  }

  private static double temperature(YamlNode.Scalar scalar) {
    double celsius = SheetFields.number(scalar, "temperature_C");
    return Limits.TEMPERATURE_CELSIUS.check(celsius, "temperature_C", scalar.place());
  }

  private Given<Substrate> substrate(YamlNode node) {
    if (node instanceof YamlNode.Scalar scalar) {
      return substrate(wanted(scalar, "substrates"), Optional.empty(), Optional.empty());
    }
    SheetFields fields = new SheetFields(node, "substrate", SUBSTRATE_KEYS);
    Optional<YamlNode.Scalar> name = fields.scalar("name", "a name");
    Optional<YamlNode.Scalar> smiles = fields.scalar("smiles", "a SMILES");
    if (name.isEmpty() && smiles.isEmpty()) {
      throw new BadInputException(
          fields.place(), "a substrate without name and smiles", "write name: or smiles:");
    }
    Optional<Amount> amount = amount(fields, AMOUNT_KEYS);
    return substrate(smiles.or(() -> name).orElseThrow(), smiles.isEmpty() ? smiles : name, amount);
  }

  private Given<Substrate> substrate(
      YamlNode.Scalar structure, Optional<YamlNode.Scalar> label, Optional<Amount> amount) {
    Place place = SheetFields.inside(structure);
    ReadMolecule read = molecules.read(structure.text().strip(), place);
    label.ifPresent(l -> refuseDisagreement(l, read.molecule()));
    String shown = label.map(l -> l.text().strip()).orElse(read.name());
    return new Given<>(new Substrate(shown, read.molecule(), amount), place, read.notes());
  }

  /** A label may be anything, but a name of another molecule is a slip. */
  private void refuseDisagreement(YamlNode.Scalar label, Molecule given) {
    String text = label.text().strip();
    Optional<ReadMolecule> named =
        text.length() < SHORTEST_NAME ? Optional.empty() : readable(text, label.place());
    if (named.filter(n -> n.notes().isEmpty() && !n.molecule().equals(given)).isPresent()) {
      throw new BadInputException(
          SheetFields.inside(label),
          "name and smiles disagree: " + text + " is " + named.orElseThrow().molecule().smiles(),
          "keep the one that is meant");
    }
  }

  private Optional<ReadMolecule> readable(String text, Place place) {
    try {
      return Optional.of(molecules.read(text, place));
    } catch (BadInputException notAName) {
      // A label such as "acid of plate 2" names no molecule, and need not.
      return Optional.empty();
    }
  }

  private Given<Solid> solid(YamlNode node) {
    if (node instanceof YamlNode.Scalar scalar) {
      Place place = SheetFields.inside(wanted(scalar, "solids"));
      return new Given<>(solids.read(scalar.text().strip(), Set.of(), place), place, List.of());
    }
    SheetFields fields = new SheetFields(node, "solid", SOLID_KEYS);
    YamlNode.Scalar name = required(fields, "solid");
    Place place = SheetFields.inside(name);
    Solid known = solids.read(name.text().strip(), roles(fields), place);
    Solid solid =
        new Solid(
            known.name(),
            known.roles(),
            fields.number("milligrams", Limits.MILLIGRAMS),
            fields.number("surface_m2_per_g", Limits.SURFACE));
    return new Given<>(solid, place, List.of());
  }

  private Given<Additive> additive(YamlNode node) {
    List<String> notes = new ArrayList<>();
    if (node instanceof YamlNode.Scalar scalar) {
      Place place = SheetFields.inside(wanted(scalar, "additives"));
      String name = scalar.text().strip();
      Additive known = additives.read(name, Optional.empty(), Set.of(), molecules, place, notes);
      return new Given<>(known, place, notes);
    }
    SheetFields fields = new SheetFields(node, "additive", ADDITIVE_KEYS);
    Optional<YamlNode.Scalar> smiles = fields.scalar("smiles", "a SMILES");
    YamlNode.Scalar name =
        smiles.isPresent()
            ? fields.scalar("name", "a name").or(() -> smiles).orElseThrow()
            : required(fields, "additive");
    Optional<Molecule> molecule = smiles.map(s -> molecule(s, notes));
    Place place = SheetFields.inside(name);
    Additive known =
        additives.read(name.text().strip(), molecule, roles(fields), molecules, place, notes);
    Optional<Amount> amount =
        amount(fields, List.of("molality", "milligrams", "millimoles", "pressure_bar"));
    return new Given<>(
        new Additive(known.name(), known.molecule(), known.roles(), amount), place, notes);
  }

  private Molecule molecule(YamlNode.Scalar smiles, List<String> notes) {
    ReadMolecule read = molecules.read(smiles.text().strip(), SheetFields.inside(smiles));
    notes.addAll(read.notes());
    return read.molecule();
  }

  private static YamlNode.Scalar wanted(YamlNode.Scalar scalar, String key) {
    return SheetFields.scalar(scalar, key, "a name");
  }

  private static YamlNode.Scalar required(SheetFields fields, String what) {
    return fields
        .scalar("name", "a name")
        .orElseThrow(
            () ->
                new BadInputException(
                    fields.place(), "this " + what + " has no name", "write name: magnetite"));
  }

  private static Set<Provision> roles(SheetFields fields) {
    Set<Provision> roles = EnumSet.noneOf(Provision.class);
    for (YamlNode.Scalar word : fields.scalars("acts_as", "a role")) {
      roles.add(Roles.read(word.text(), SheetFields.inside(word)));
    }
    if (roles.isEmpty() && fields.find("acts_as").isPresent()) {
      throw new BadInputException(
          fields.find("acts_as").orElseThrow().place(),
          "acts_as: an empty list",
          "roles: " + String.join(", ", Roles.words()));
    }
    return roles;
  }

  private static Optional<Amount> amount(SheetFields fields, List<String> keys) {
    List<String> present = keys.stream().filter(k -> fields.find(k).isPresent()).toList();
    if (present.size() > 1) {
      throw new BadInputException(
          fields.find(present.get(1)).orElseThrow().place(),
          "two amounts: " + String.join(" and ", present),
          "keep one of them");
    }
    return present.stream().findFirst().map(key -> amount(fields, key));
  }

  private static Amount amount(SheetFields fields, String key) {
    return switch (key) {
      case "molality" -> new Amount(value(fields.number(key, Limits.MOLALITY)), "mol/kg");
      case "milligrams" -> new Amount(value(fields.number(key, Limits.MILLIGRAMS)), "mg");
      case "millimoles" -> new Amount(value(fields.number(key, Limits.MILLIMOLES)), "mmol");
      default -> new Amount(value(fields.number(key, Limits.PRESSURE_BAR)), "bar");
    };
  }

  private static double value(OptionalDouble number) {
    return number.orElseThrow();
  }
}
