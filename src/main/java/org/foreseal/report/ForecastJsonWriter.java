package org.foreseal.report;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.foreseal.molecule.InchiKeys;
import org.foreseal.quantity.Uncertain;
import org.foreseal.run.Candidate;
import org.foreseal.run.Forecast;
import org.foreseal.run.ForecastRoute;
import org.foreseal.run.NetworkSummary;
import org.foreseal.run.RuledOut;
import org.foreseal.run.ToolInfo;

/** A forecast for programs, as {@code schemas/forecast.schema.json} describes it. */
public final class ForecastJsonWriter {
  /** Version of the layout; keys are only ever added under one version. */
  public static final int SCHEMA_VERSION = 1;

  private ForecastJsonWriter() {}

  /** The forecast as JSON. */
  public static String write(Forecast forecast) {
    return Json.text(tree(forecast));
  }

  static ObjectNode tree(Forecast forecast) {
    ObjectNode root = Json.object();
    root.put("schemaVersion", SCHEMA_VERSION);
    root.set("tool", tool(forecast.tool()));
    root.set("run", RunJson.of(forecast.sheet()));
    root.set("notes", Json.texts(forecast.notes()));
    ArrayNode candidates = root.putArray("candidates");
    forecast.candidates().forEach(c -> candidates.add(candidate(c)));
    ArrayNode ruledOut = root.putArray("ruledOut");
    forecast.ruledOut().forEach(r -> ruledOut.add(ruledOut(r)));
    root.set("network", network(forecast.network()));
    return root;
  }

  static ObjectNode tool(ToolInfo tool) {
    return Json.object()
        .put("name", ToolInfo.NAME)
        .put("version", tool.version())
        .put("rulesDigest", tool.rulesDigest())
        .put("seed", tool.seed());
  }

  private static ObjectNode candidate(Candidate c) {
    ObjectNode node = Json.object();
    node.put("rank", c.rank());
    node.put("name", c.name());
    node.put("smiles", c.molecule().smiles());
    node.put("formula", c.molecule().formula().toString());
    node.put("inchiKey", InchiKeys.of(c.molecule()).orElse(null));
    node.put("monoisotopicMassDa", new BigDecimal(Figures.dalton(c.molecule())));
    node.put("isSubstrate", c.isSubstrate());
    node.put("isOrganic", c.isOrganic());
    node.set("score", Json.number(c.score()));
    node.putNull("chanceSeen");
    node.putNull("molePercent");
    node.put("phase", c.whereFound().word());
    node.put("gcVisible", c.gcVisible());
    node.put("depth", c.depth());
    node.set("needs", Json.texts(c.needs()));
    node.set("gc", unknownChromatography());
    ArrayNode routes = node.putArray("routes");
    c.routes().forEach(r -> routes.add(route(r)));
    node.set("cautions", Json.texts(c.cautions()));
    return node;
  }

  private static ObjectNode unknownChromatography() {
    ObjectNode gc = Json.object();
    List.of("boilingPointC", "retentionIndex", "fidResponse", "ions", "derivative")
        .forEach(gc::putNull);
    return gc;
  }

  static ObjectNode route(ForecastRoute route) {
    ObjectNode node = Json.object();
    node.set("score", Json.number(route.score()));
    ArrayNode steps = node.putArray("steps");
    route.steps().forEach(s -> steps.add(step(s)));
    return node;
  }

  static ObjectNode step(ForecastRoute.Step step) {
    ObjectNode node = Json.object();
    node.put("rule", step.rule());
    node.put("title", step.title());
    node.put("equation", step.equation());
    node.put("equationSmiles", step.equationSmiles());
    Optional<Uncertain> gibbs = step.deltaGibbs();
    if (gibbs.isPresent()) {
      ObjectNode value = node.putObject("deltaGKJPerMol");
      value.set("value", tenths(gibbs.get().value()));
      value.set("sd", tenths(gibbs.get().standardDeviation()));
    } else {
      node.putNull("deltaGKJPerMol");
    }
    node.set("needs", Json.texts(step.needs()));
    return node;
  }

  private static JsonNode tenths(double value) {
    return Json.number(Math.round(value * 10) / 10.0);
  }

  private static ObjectNode ruledOut(RuledOut out) {
    return Json.object()
        .put("smiles", out.smiles())
        .put("name", out.name())
        .put("rule", out.rule())
        .put("reason", out.reason())
        .put("detail", out.detail());
  }

  static ObjectNode network(NetworkSummary network) {
    return Json.object()
        .put("species", network.species())
        .put("steps", network.steps())
        .put("depth", network.depth())
        .put("stoppedBy", network.stoppedBy())
        .put("isCut", network.isCut());
  }
}
