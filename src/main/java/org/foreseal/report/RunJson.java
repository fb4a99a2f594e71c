package org.foreseal.report;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Optional;
import java.util.Set;
import org.foreseal.rule.Provision;
import org.foreseal.run.Hydrogen;
import org.foreseal.run.Loading;
import org.foreseal.run.RunSheet;
import org.foreseal.run.RunSheet.Amount;

/** A run as understood, for programs. */
final class RunJson {
  private RunJson() {}

  static ObjectNode of(RunSheet sheet) {
    ObjectNode run = Json.object();
    run.put("title", sheet.title());
    ArrayNode substrates = run.putArray("substrates");
    sheet.substrates().forEach(s -> substrates.add(substrate(sheet, s)));
    run.put("solvent", sheet.inWater() ? "water" : "none");
    run.set("waterGrams", Json.number(sheet.waterGrams()));
    ArrayNode solids = run.putArray("solids");
    sheet.solids().forEach(s -> solids.add(solid(s)));
    ArrayNode additives = run.putArray("additives");
    sheet.additives().forEach(a -> additives.add(additive(a)));
    temperature(sheet, run);
    run.set("pressureBar", Json.number(sheet.pressureBar()));
    run.set("durationHours", Json.number(sheet.durationHours()));
    run.put("hydrogen", sheet.hydrogen().map(Hydrogen::words).orElse(null));
    run.set("pH25C", Json.number(sheet.acidityAtRoomTemperature()));
    settings(sheet, run);
    run.put("depth", sheet.depth());
    run.put("seed", sheet.seed());
    run.set("notes", Json.texts(sheet.notes()));
    run.set("outsideUsualRange", Json.texts(sheet.outsideUsualRange()));
    return run;
  }

  private static void temperature(RunSheet sheet, ObjectNode run) {
    if (sheet.temperatureCelsius().size() == 1) {
      run.set("temperatureC", Json.number(sheet.temperatureCelsius().get(0)));
    } else {
      ArrayNode all = run.putArray("temperatureC");
      sheet.temperatureCelsius().forEach(t -> all.add(Json.number(t)));
    }
  }

  private static void settings(RunSheet sheet, ObjectNode run) {
    sheet
        .vessel()
        .ifPresent(
            v -> {
              ObjectNode node = run.putObject("vessel");
              node.set("volumeMillilitres", Json.number(v.volumeMillilitres()));
              node.put("kind", v.kind());
            });
    sheet
        .chromatograph()
        .ifPresent(
            g -> {
              ObjectNode node = run.putObject("gc");
              node.put("detector", g.detector().name());
              node.put("phase", g.phase().word());
              node.put("solvent", g.solvent());
              node.put("derivatization", g.derivatization().word());
              node.set("detectionLimitMolePercent", Json.number(g.detectionLimitMolePercent()));
            });
  }

  private static ObjectNode substrate(RunSheet sheet, RunSheet.Substrate substrate) {
    ObjectNode node = Json.object();
    node.put("name", substrate.name());
    node.put("smiles", substrate.molecule().smiles());
    node.set("millimoles", Json.number(Loading.millimoles(sheet, substrate)));
    amount(node, substrate.amount());
    return node;
  }

  private static ObjectNode solid(RunSheet.Solid solid) {
    ObjectNode node = Json.object();
    node.put("name", solid.name());
    roles(node, solid.roles());
    node.set("milligrams", Json.number(solid.milligrams()));
    node.set("surfaceSquareMetresPerGram", Json.number(solid.surfaceSquareMetresPerGram()));
    return node;
  }

  private static ObjectNode additive(RunSheet.Additive additive) {
    ObjectNode node = Json.object();
    node.put("name", additive.name());
    node.put("smiles", additive.molecule().map(m -> m.smiles()).orElse(null));
    roles(node, additive.roles());
    amount(node, additive.amount());
    return node;
  }

  private static void roles(ObjectNode node, Set<Provision> roles) {
    ArrayNode words = node.putArray("actsAs");
    roles.forEach(r -> words.add(r.word()));
  }

  private static void amount(ObjectNode node, Optional<Amount> amount) {
    if (amount.isPresent()) {
      ObjectNode given = node.putObject("amount");
      given.set("value", Json.number(amount.get().value()));
      given.put("unit", amount.get().unit());
    } else {
      node.putNull("amount");
    }
  }
}
