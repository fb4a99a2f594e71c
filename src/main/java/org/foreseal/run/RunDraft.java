package org.foreseal.run;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import java.util.Set;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.foreseal.run.RunSheet.Additive;
import org.foreseal.run.RunSheet.Amount;
import org.foreseal.run.RunSheet.Solid;
import org.foreseal.run.RunSheet.Substrate;

/** A run while it is put together from a run sheet and options; later settings win. */
final class RunDraft {
  Optional<String> title = Optional.empty();
  List<Given<Substrate>> substrates = List.of();
  Optional<Boolean> inWater = Optional.empty();
  OptionalDouble waterGrams = OptionalDouble.empty();
  List<Given<Solid>> solids = List.of();
  List<Given<Additive>> additives = List.of();
  List<Double> temperatureCelsius = List.of();
  OptionalDouble pressureBar = OptionalDouble.empty();
  OptionalDouble durationHours = OptionalDouble.empty();
  Optional<Hydrogen> hydrogen = Optional.empty();
  OptionalDouble acidity = OptionalDouble.empty();
  Optional<RunSheet.Vessel> vessel = Optional.empty();
  Optional<RunSheet.Chromatograph> chromatograph = Optional.empty();
  OptionalLong depth = OptionalLong.empty();
  OptionalLong seed = OptionalLong.empty();

  /** Something charged, with the place where it was asked for and remarks on how it was read. */
  record Given<T>(T value, Place place, List<String> notes) {
    Given {
      notes = List.copyOf(notes);
    }
  }

  /**
   * The finished run.
   *
   * @param whole where a complaint about something missing points
   */
  RunSheet finish(Place whole) {
    checkComplete(whole);
    refuseRepeats();
    boolean water = inWater.orElse(true);
    if (!water) {
      refuseWhatNeedsWater(whole);
    }
    return new RunSheet(
        title.orElse(""),
        values(substrates),
        water,
        waterGrams,
        values(solids),
        values(additives),
        temperatureCelsius,
        pressureBar,
        durationHours,
        (int) depth.orElse(RunSheet.DEFAULT_DEPTH),
        seed.orElse(RunSheet.DEFAULT_SEED),
        notes(),
        hydrogen,
        acidity,
        vessel,
        chromatograph);
  }

  private static <T> List<T> values(List<Given<T>> given) {
    return given.stream().map(Given::value).toList();
  }

  private void checkComplete(Place whole) {
    if (substrates.isEmpty()) {
      throw new BadInputException(
          whole,
          "no substrate is given",
          "name one, such as phenylacetic acid, or write its SMILES");
    }
    if (temperatureCelsius.isEmpty()) {
      throw new BadInputException(
          whole,
          "no temperature is given",
          "write temperature_C: 260 in the run sheet or --temperature 260C");
    }
  }

  private void refuseRepeats() {
    Set<Object> seen = new HashSet<>();
    substrates.forEach(s -> refuseRepeat(seen, s.value().molecule(), s.value().name(), s.place()));
    seen.clear();
    solids.forEach(s -> refuseRepeat(seen, s.value().name(), s.value().name(), s.place()));
    seen.clear();
    additives.forEach(a -> refuseRepeat(seen, a.value().name(), a.value().name(), a.place()));
  }

  private static void refuseRepeat(Set<Object> seen, Object key, String name, Place place) {
    if (!seen.add(key)) {
      throw new BadInputException(
          place, name + " is given twice", "give it once, with the whole amount");
    }
  }

  private void refuseWhatNeedsWater(Place whole) {
    if (waterGrams.isPresent()) {
      throw new BadInputException(
          whole, "water is weighed in but the solvent is none", "write solvent: water");
    }
    substrates.forEach(s -> refuseMolality(s.value().amount(), s.place()));
    additives.forEach(a -> refuseMolality(a.value().amount(), a.place()));
  }

  private static void refuseMolality(Optional<Amount> amount, Place place) {
    if (amount.filter(a -> "mol/kg".equals(a.unit())).isPresent()) {
      throw new BadInputException(
          place, "a molality without water", "give milligrams or millimoles, or solvent: water");
    }
  }

  private List<String> notes() {
    List<String> notes = new ArrayList<>();
    substrates.forEach(s -> notes.addAll(s.notes()));
    solids.forEach(s -> notes.addAll(s.notes()));
    additives.forEach(a -> notes.addAll(a.notes()));
    return notes.stream().distinct().toList();
  }
}
