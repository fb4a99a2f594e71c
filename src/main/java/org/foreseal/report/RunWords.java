package org.foreseal.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.foreseal.rule.Provision;
import org.foreseal.run.NetworkSummary;
import org.foreseal.run.Quantities;
import org.foreseal.run.RunSheet;
import org.foreseal.run.RunSheet.Amount;

/** A run in words. */
final class RunWords {
  /** Short caution that stands on every page about a sealed hot run. */
  static final String SEALED_VESSEL =
      "Sealed hot vessel: gas and a liquid-full vessel build pressure. These are estimates, not"
          + " design values; the vessel maker's rating and local codes decide.";

  private RunWords() {}

  /** Substrates and solids: phenylacetic acid with magnetite in water, 260 C. */
  static String headline(RunSheet sheet) {
    String substrates =
        sheet.substrates().stream()
            .map(RunSheet.Substrate::name)
            .collect(Collectors.joining(" + "));
    String solids =
        sheet.solids().stream().map(RunSheet.Solid::name).collect(Collectors.joining(" + "));
    return substrates
        + (solids.isEmpty() ? "" : " with " + solids)
        + (sheet.inWater() ? " in water" : "")
        + ", "
        + temperatures(sheet);
  }

  static String temperatures(RunSheet sheet) {
    return sheet.temperatureCelsius().stream()
            .map(Quantities::plain)
            .collect(Collectors.joining(", "))
        + " C";
  }

  static String conditions(RunSheet sheet) {
    List<String> parts = new ArrayList<>(List.of(temperatures(sheet)));
    parts.addAll(conditionsButTemperature(sheet));
    return String.join(", ", parts);
  }

  static List<String> conditionsButTemperature(RunSheet sheet) {
    List<String> parts = new ArrayList<>();
    sheet.pressureBar().ifPresent(p -> parts.add(Quantities.plain(p) + " bar"));
    sheet.durationHours().ifPresent(h -> parts.add(Quantities.plain(h) + " h"));
    if (!sheet.inWater()) {
      parts.add("no water");
    }
    sheet.waterGrams().ifPresent(g -> parts.add(Quantities.plain(g) + " g water"));
    sheet
        .acidityAtRoomTemperature()
        .ifPresent(p -> parts.add("pH " + Quantities.plain(p) + " (25 C)"));
    sheet.hydrogen().ifPresent(h -> parts.add("hydrogen: " + h.words()));
    sheet.vessel().map(RunSheet.Vessel::kind).filter(k -> !k.isEmpty()).ifPresent(parts::add);
    return parts;
  }

  static String substrate(RunSheet.Substrate substrate) {
    return substrate.name() + amount(substrate.amount());
  }

  static String solid(RunSheet.Solid solid) {
    StringBuilder text = new StringBuilder(solid.name());
    solid.milligrams().ifPresent(mg -> text.append(' ').append(Quantities.plain(mg)).append(" mg"));
    solid
        .surfaceSquareMetresPerGram()
        .ifPresent(s -> text.append(", ").append(Quantities.plain(s)).append(" m2/g"));
    return text.append(roles(solid.roles())).toString();
  }

  /** Every solid of a run, or no solid. */
  static String solids(RunSheet sheet) {
    return sheet.solids().isEmpty()
        ? "no solid"
        : sheet.solids().stream().map(RunWords::solid).collect(Collectors.joining("; "));
  }

  static String additive(RunSheet.Additive additive) {
    return additive.name() + amount(additive.amount()) + roles(additive.roles());
  }

  private static String amount(Optional<Amount> amount) {
    return amount.map(a -> " " + Quantities.plain(a.value()) + " " + a.unit()).orElse("");
  }

  private static String roles(Set<Provision> roles) {
    return roles.isEmpty()
        ? ""
        : roles.stream().map(Provision::word).collect(Collectors.joining(", ", " (", ")"));
  }

  static String network(NetworkSummary network) {
    return network.species()
        + " species, "
        + network.steps()
        + " steps, depth "
        + network.depth()
        + (network.isCut() ? ", CUT: " + network.stoppedBy() : ", complete");
  }
}
