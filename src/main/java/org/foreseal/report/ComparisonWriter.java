package org.foreseal.report;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;
import org.foreseal.report.TextTable.Column;
import org.foreseal.run.Comparison;
import org.foreseal.run.Comparison.Difference;
import org.foreseal.run.Comparison.Missing;
import org.foreseal.run.Comparison.Product;
import org.foreseal.run.Comparison.Run;
import org.foreseal.run.Forecast;
import org.foreseal.run.RunSheet;

/** Runs side by side, for people, spreadsheets and programs. */
public final class ComparisonWriter {
  private static final int WIDTH = TextTable.WIDTH;
  private static final int ROOM_FOR_LABELS = 40;
  private static final int USUAL_NAMES_PER_LINE = 6;
  private static final int MOST_COLUMNS = 8;
  private static final String ABSENT = "-";

  private ComparisonWriter() {}

  /**
   * For people.
   *
   * @param rows most products listed; {@link Integer#MAX_VALUE} lifts all limits
   */
  public static String text(Comparison comparison, int rows) {
    StringBuilder text = new StringBuilder();
    List<String> headings = headings(comparison);
    head(comparison, headings, text);
    table(comparison, headings, rows, text);
    differences(comparison, headings, rows, text);
    notes(comparison, text);
    return text.toString();
  }

  /** The labels themselves where they fit, else numbers that stand for them. */
  private static List<String> headings(Comparison comparison) {
    List<String> labels = comparison.runs().stream().map(Run::label).toList();
    int needed = labels.stream().mapToInt(l -> l.length() + 2).sum();
    if (needed <= ROOM_FOR_LABELS) {
      return labels;
    }
    List<String> numbered = new ArrayList<>();
    for (int i = 0; i < labels.size(); i++) {
      numbered.add("(" + (i + 1) + ")");
    }
    return numbered;
  }

  private static void head(Comparison comparison, List<String> headings, StringBuilder text) {
    RunSheet first = comparison.runs().get(0).forecast().sheet();
    String substrates =
        String.join(" + ", first.substrates().stream().map(RunWords::substrate).toList());
    text.append(Wrap.paragraph("Side by side: ", substrates, WIDTH));
    if (!first.title().isEmpty()) {
      text.append(Wrap.paragraph("  ", first.title(), WIDTH));
    }
    text.append('\n');
    line("temperature", same(comparison, RunWords::temperatures), text);
    line("solids", same(comparison, RunWords::solids), text);
    line(
        "additives",
        String.join("; ", first.additives().stream().map(RunWords::additive).toList()),
        text);
    line("conditions", String.join(", ", RunWords.conditionsButTemperature(first)), text);
    boolean solidsDiffer = same(comparison, RunWords::solids).isEmpty();
    for (int i = 0; i < headings.size(); i++) {
      Run run = comparison.runs().get(i);
      String solids = solidsDiffer ? RunWords.solids(run.forecast().sheet()) : "";
      legend(headings.get(i), run.label(), solids, text);
    }
    line("caution", RunWords.SEALED_VESSEL, text);
    text.append('\n');
  }

  private static String same(Comparison comparison, Function<RunSheet, String> words) {
    List<String> distinct =
        comparison.runs().stream().map(r -> words.apply(r.forecast().sheet())).distinct().toList();
    return distinct.size() == 1 ? distinct.get(0) : "";
  }

  private static void line(String label, String value, StringBuilder text) {
    if (!value.isEmpty()) {
      text.append(Wrap.paragraph("  " + label + " ".repeat(13 - label.length()), value, WIDTH));
    }
  }

  /** What a heading stands for, where that is not plain from the heading itself. */
  private static void legend(String heading, String label, String solids, StringBuilder text) {
    if (heading.equals(label)) {
      boolean saysMore = !solids.isEmpty() && !solids.equals(label);
      String head = solids.startsWith(label) ? "  " : "  " + heading + ": ";
      text.append(saysMore ? Wrap.paragraph(head, "    ", solids, WIDTH) : "");
      return;
    }
    String more = solids.isEmpty() || label.contains(solids) ? "" : ": " + solids;
    text.append(Wrap.paragraph("  " + heading + "  ", "    ", label + more, WIDTH));
  }

  private static void table(
      Comparison comparison, List<String> headings, int rows, StringBuilder text) {
    List<Product> products = comparison.products();
    List<Product> shown = products.subList(0, Math.min(rows, products.size()));
    text.append("Score of each product, ").append(ABSENT).append(" where it is not listed\n");
    for (int from = 0; from < headings.size(); from += MOST_COLUMNS) {
      text.append(from == 0 ? "" : "\n");
      text.append(table(shown, headings, from, Math.min(headings.size(), from + MOST_COLUMNS)));
    }
    if (products.size() > rows) {
      text.append("  ... and " + (products.size() - rows) + " more; --all lists them\n");
    }
  }

  /** The runs from one index to before another. */
  private static TextTable table(List<Product> products, List<String> headings, int from, int to) {
    List<Column> columns = new ArrayList<>();
    columns.add(Column.text("product", 16));
    columns.add(Column.text("formula", 7));
    columns.add(Column.word("GC"));
    headings.subList(from, to).forEach(h -> columns.add(Column.number(h)));
    TextTable table = new TextTable("", columns);
    for (Product product : products) {
      List<String> cells = new ArrayList<>();
      cells.add(product.name());
      cells.add(product.molecule().formula().toString());
      cells.add(product.gcVisible() ? "yes" : "no");
      product.scores().subList(from, to).forEach(s -> cells.add(score(s)));
      table.row(cells);
    }
    return table;
  }

  private static String score(OptionalDouble score) {
    return score.isPresent() ? Figures.score(score.getAsDouble()) : ABSENT;
  }

  private static void differences(
      Comparison comparison, List<String> headings, int rows, StringBuilder text) {
    List<Difference> differences = comparison.differences();
    text.append("\nTells the runs apart\n");
    if (differences.isEmpty()) {
      text.append("  nothing: the runs show the same products at like scores\n");
    }
    Map<String, String> headingOf = new LinkedHashMap<>();
    for (int i = 0; i < headings.size(); i++) {
      headingOf.put(comparison.runs().get(i).label(), headings.get(i));
    }
    Map<String, List<String>> namesByWords = new LinkedHashMap<>();
    for (Difference difference : differences) {
      namesByWords
          .computeIfAbsent(words(difference, headingOf), w -> new ArrayList<>())
          .add(difference.product().name());
    }
    int most = rows == Integer.MAX_VALUE ? rows : USUAL_NAMES_PER_LINE;
    namesByWords.forEach(
        (words, names) ->
            text.append(
                Wrap.paragraph("  ", "    ", Names.some(names, most) + ": " + words, WIDTH)));
  }

  /** Which runs show it, which do not, and why. */
  private static String words(Difference difference, Map<String, String> headingOf) {
    Map<String, List<String>> byReason = new LinkedHashMap<>();
    for (Missing missing : difference.missing()) {
      byReason
          .computeIfAbsent(missing.reason(), r -> new ArrayList<>())
          .add(headingOf.getOrDefault(missing.label(), missing.label()));
    }
    List<String> shown =
        difference.shownBy().stream().map(l -> headingOf.getOrDefault(l, l)).toList();
    List<String> parts = new ArrayList<>();
    parts.add("with " + String.join(", ", shown));
    byReason.forEach(
        (reason, labels) -> parts.add("not with " + String.join(", ", labels) + ": " + reason));
    return String.join("; ", parts);
  }

  private static void notes(Comparison comparison, StringBuilder text) {
    Set<String> notes = new LinkedHashSet<>();
    for (Run run : comparison.runs()) {
      Forecast forecast = run.forecast();
      notes.addAll(forecast.sheet().notes());
      notes.addAll(forecast.sheet().outsideUsualRange());
      notes.addAll(forecast.notes());
      if (forecast.network().isCut()) {
        notes.add(run.label() + ": " + RunWords.network(forecast.network()));
      }
    }
    text.append("\nNotes\n");
    notes.forEach(n -> text.append(Wrap.paragraph("  - ", "    ", n, WIDTH)));
  }

  /** For spreadsheets: one line per product and run. */
  public static String csv(Comparison comparison) {
    List<String> header = new ArrayList<>(List.of("run"));
    header.addAll(ForecastCsvWriter.COLUMNS);
    Csv csv = new Csv(header);
    for (Run run : comparison.runs()) {
      run.forecast()
          .candidates()
          .forEach(
              c -> {
                List<String> cells = new ArrayList<>(List.of(run.label()));
                cells.addAll(ForecastCsvWriter.cells(c));
                csv.line(cells);
              });
    }
    return csv.toString();
  }

  /** For programs: every forecast in full, then the differences. */
  public static String json(Comparison comparison) {
    ObjectNode root = Json.object();
    root.put("schemaVersion", ForecastJsonWriter.SCHEMA_VERSION);
    ArrayNode runs = root.putArray("runs");
    for (Run run : comparison.runs()) {
      ObjectNode node = runs.addObject();
      node.put("label", run.label());
      node.setAll(ForecastJsonWriter.tree(run.forecast()));
    }
    ArrayNode differences = root.putArray("differences");
    comparison.differences().forEach(d -> differences.add(difference(comparison, d)));
    return Json.text(root);
  }

  private static ObjectNode difference(Comparison comparison, Difference difference) {
    ObjectNode node = Json.object();
    node.put("name", difference.product().name());
    node.put("smiles", difference.product().molecule().smiles());
    ObjectNode scores = node.putObject("scores");
    for (int i = 0; i < comparison.runs().size(); i++) {
      scores.set(
          comparison.runs().get(i).label(), Json.number(difference.product().scores().get(i)));
    }
    node.set("shownBy", Json.texts(difference.shownBy()));
    ArrayNode missing = node.putArray("missing");
    for (Missing m : difference.missing()) {
      missing.addObject().put("label", m.label()).put("reason", m.reason());
    }
    return node;
  }
}
