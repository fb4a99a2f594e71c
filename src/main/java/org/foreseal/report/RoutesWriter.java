package org.foreseal.report;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.foreseal.run.ForecastRoute;
import org.foreseal.run.ForecastRoute.Step;
import org.foreseal.run.RouteReport;

/** How a product comes about, for people, spreadsheets and programs. */
public final class RoutesWriter {
  private static final int WIDTH = TextTable.WIDTH;

  private RoutesWriter() {}

  /** For people: each route as its steps in order. */
  public static String text(RouteReport report) {
    StringBuilder text = new StringBuilder();
    text.append(
        Wrap.paragraph(
            "Routes to ",
            report.name()
                + " ("
                + report.product().formula()
                + ") from "
                + RunWords.headline(report.sheet()),
            WIDTH));
    if (report.routes().isEmpty()) {
      text.append('\n')
          .append(
              Wrap.paragraph(
                  "  none: ", report.reason().orElse("the network does not hold it"), WIDTH));
    }
    for (int i = 0; i < report.routes().size(); i++) {
      route(i + 1, report.routes().get(i), text);
    }
    sources(report, text);
    notes(report, text);
    return text.toString();
  }

  private static void route(int number, ForecastRoute route, StringBuilder text) {
    int steps = route.steps().size();
    text.append("\nRoute " + number + ", score " + Figures.score(route.score()) + ", ");
    text.append(steps + (steps == 1 ? " step" : " steps")).append('\n');
    for (int i = 0; i < steps; i++) {
      step(i + 1, route.steps().get(i), text);
    }
  }

  private static void step(int number, Step step, StringBuilder text) {
    String head = "  " + number + ". ";
    text.append(Wrap.paragraph(head, step.title() + " [" + step.rule() + "]", WIDTH));
    text.append(Wrap.paragraph("     ", "       ", step.equation(), WIDTH));
    String gibbs =
        step.deltaGibbs().map(g -> "dG " + Figures.gibbs(g) + " kJ/mol").orElse("dG not known");
    String needs = step.needs().isEmpty() ? "" : "; needs " + String.join(", ", step.needs());
    text.append(Wrap.paragraph("     ", "       ", gibbs + needs, WIDTH));
  }

  private static void sources(RouteReport report, StringBuilder text) {
    Set<String> rules = rulesInOrder(report.routes());
    if (rules.isEmpty()) {
      return;
    }
    text.append("\nSources of the rules\n");
    for (String rule : rules) {
      List<String> sources = report.sourcesByRule().getOrDefault(rule, List.of());
      String all = sources.isEmpty() ? "none stated" : String.join("; ", sources);
      text.append(Wrap.paragraph("  ", "    ", rule + ": " + all, WIDTH));
    }
  }

  private static Set<String> rulesInOrder(List<ForecastRoute> routes) {
    Set<String> rules = new LinkedHashSet<>();
    routes.forEach(r -> r.steps().forEach(s -> rules.add(s.rule())));
    return rules;
  }

  private static void notes(RouteReport report, StringBuilder text) {
    text.append("\nNotes\n");
    Set<String> notes = new LinkedHashSet<>(report.sheet().notes());
    notes.addAll(report.sheet().outsideUsualRange());
    notes.addAll(report.notes());
    notes.forEach(n -> note(n, text));
    note("searched " + RunWords.network(report.network()), text);
    note(RunWords.SEALED_VESSEL, text);
  }

  private static void note(String note, StringBuilder text) {
    text.append(Wrap.paragraph("  - ", "    ", note, WIDTH));
  }

  /** For spreadsheets: one line per step. */
  public static String csv(RouteReport report) {
    Csv csv =
        new Csv(
            List.of(
                "product",
                "route",
                "routeScore",
                "step",
                "rule",
                "title",
                "equation",
                "equationSmiles",
                "deltaGKJPerMol",
                "deltaGSdKJPerMol",
                "needs",
                "sources"));
    for (int r = 0; r < report.routes().size(); r++) {
      ForecastRoute route = report.routes().get(r);
      for (int s = 0; s < route.steps().size(); s++) {
        csv.line(cells(report, r, route, s));
      }
    }
    return csv.toString();
  }

  private static List<String> cells(RouteReport report, int r, ForecastRoute route, int s) {
    Step step = route.steps().get(s);
    return List.of(
        report.name(),
        Integer.toString(r + 1),
        Figures.json(route.score()).asText(),
        Integer.toString(s + 1),
        step.rule(),
        step.title(),
        step.equation(),
        step.equationSmiles(),
        step.deltaGibbs().map(g -> Figures.tenths(g.value())).orElse(""),
        step.deltaGibbs().map(g -> Figures.tenths(g.standardDeviation())).orElse(""),
        String.join("; ", step.needs()),
        String.join("; ", report.sourcesByRule().getOrDefault(step.rule(), List.of())));
  }

  /** For programs. */
  public static String json(RouteReport report) {
    ObjectNode root = Json.object();
    root.put("schemaVersion", ForecastJsonWriter.SCHEMA_VERSION);
    root.set("tool", ForecastJsonWriter.tool(report.tool()));
    root.set("run", RunJson.of(report.sheet()));
    root.putObject("product")
        .put("name", report.name())
        .put("smiles", report.product().smiles())
        .put("formula", report.product().formula().toString());
    ArrayNode routes = root.putArray("routes");
    report.routes().forEach(r -> routes.add(route(r, report)));
    root.put("reason", report.reason().orElse(null));
    root.set("notes", Json.texts(report.notes()));
    root.set("network", ForecastJsonWriter.network(report.network()));
    return Json.text(root);
  }

  private static ObjectNode route(ForecastRoute route, RouteReport report) {
    ObjectNode node = Json.object();
    node.set("score", Json.number(route.score()));
    ArrayNode steps = node.putArray("steps");
    for (Step step : route.steps()) {
      ObjectNode written = ForecastJsonWriter.step(step);
      List<String> sources = report.sourcesByRule().getOrDefault(step.rule(), List.of());
      written.set("sources", Json.texts(sources));
      steps.add(written);
    }
    return node;
  }
}
