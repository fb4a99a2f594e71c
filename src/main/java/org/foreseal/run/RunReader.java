package org.foreseal.run;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.foreseal.molecule.MoleculeReader;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;

/** Makes runs from a run sheet, from options, or from both; options win. */
public final class RunReader {
  private final RunSheetReader sheets;
  private final OptionReader options;

  /**
   * A reader.
   *
   * @param molecules reads names and SMILES
   */
  public RunReader(MoleculeReader molecules) {
    SolidCatalogue solids = SolidCatalogue.builtIn();
    AdditiveCatalogue additives = AdditiveCatalogue.builtIn();
    this.sheets = new RunSheetReader(molecules, solids, additives);
    this.options = new OptionReader(molecules, solids, additives);
  }

  /**
   * A run sheet.
   *
   * @param source its file, for complaints
   * @param text its text
   */
  public record Sheet(String source, String text) {}

  /**
   * One run at one temperature.
   *
   * @param label what sets it apart from the others, empty when it is the only one
   */
  public record Variant(String label, RunSheet sheet) {}

  /** A run sheet alone. */
  public RunSheet read(Sheet sheet) {
    return sheets.read(sheet.text(), sheet.source()).finish(start(sheet));
  }

  /**
   * The runs asked for: one for each {@code --solid} and each temperature, solids first.
   *
   * @throws org.foreseal.quantity.BadInputException when something is wrong or missing
   */
  public List<Variant> read(Optional<Sheet> sheet, RunOptions given) {
    RunDraft draft = sheet.map(s -> sheets.read(s.text(), s.source())).orElseGet(RunDraft::new);
    options.apply(given, draft);
    Place whole = sheet.map(RunReader::start).orElse(Place.onCommandLine("", 0));
    List<RunSheet> bySolid = new ArrayList<>();
    for (String solids : given.solids()) {
      draft.solids = options.solids(solids);
      bySolid.add(draft.finish(whole));
    }
    if (bySolid.isEmpty()) {
      bySolid.add(draft.finish(whole));
    }
    return variants(bySolid);
  }

  private static List<Variant> withoutRepeats(List<Variant> variants) {
    Set<String> seen = new HashSet<>();
    for (Variant variant : variants) {
      if (!seen.add(variant.label())) {
        throw new BadInputException(
            Place.onCommandLine("--solid " + variant.label(), 9),
            "the same run is asked for twice: " + variant.label(),
            "give each --solid once; A+B puts two solids into one run");
      }
    }
    return variants;
  }

  private static Place start(Sheet sheet) {
    return new Place(sheet.source(), 1, 0, sheet.text().lines().findFirst().orElse(""));
  }

  private static List<Variant> variants(List<RunSheet> bySolid) {
    List<String> names = bySolid.stream().map(s -> solidsLabel(s, false)).toList();
    boolean isEachNamedOnce = names.stream().distinct().count() == names.size();
    List<Variant> result = new ArrayList<>();
    for (RunSheet sheet : bySolid) {
      for (double celsius : sheet.temperatureCelsius()) {
        List<String> label = new ArrayList<>();
        if (bySolid.size() > 1) {
          label.add(solidsLabel(sheet, !isEachNamedOnce));
        }
        if (sheet.temperatureCelsius().size() > 1) {
          label.add(Quantities.plain(celsius) + " C");
        }
        result.add(new Variant(String.join(", ", label), sheet.atCelsius(celsius)));
      }
    }
    return withoutRepeats(result);
  }

  private static String solidsLabel(RunSheet sheet, boolean withAmounts) {
    List<String> names =
        sheet.solids().stream().map(s -> s.name() + (withAmounts ? amounts(s) : "")).toList();
    return names.isEmpty() ? "no solid" : String.join(" + ", names);
  }

  private static String amounts(RunSheet.Solid solid) {
    StringBuilder text = new StringBuilder();
    solid.milligrams().ifPresent(m -> text.append(' ').append(Quantities.plain(m)).append(" mg"));
    solid
        .surfaceSquareMetresPerGram()
        .ifPresent(a -> text.append(' ').append(Quantities.plain(a)).append(" m2/g"));
    return text.toString();
  }
}
