package org.foreseal.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.foreseal.report.TextTable.Column;
import org.foreseal.run.Candidate;
import org.foreseal.run.Forecast;
import org.foreseal.run.RuledOut;
import org.foreseal.run.RunSheet;

/** A forecast for people, 80 columns wide. */
public final class ForecastTextWriter {
  private static final int WIDTH = TextTable.WIDTH;
  private static final int USUAL_ROWS_ELSEWHERE = 8;
  private static final int USUAL_REASONS = 6;
  private static final int USUAL_NAMES_PER_REASON = 4;

  private final Forecast forecast;
  private final int rows;
  private final StringBuilder text = new StringBuilder();

  private ForecastTextWriter(Forecast forecast, int rows) {
    this.forecast = forecast;
    this.rows = rows;
  }

  /**
   * The forecast as text.
   *
   * @param rows most products in the main table; {@link Integer#MAX_VALUE} lifts all limits
   */
  public static String write(Forecast forecast, int rows) {
    ForecastTextWriter writer = new ForecastTextWriter(forecast, rows);
    writer.head();
    writer.visible();
    writer.elsewhere();
    writer.ruledOut();
    writer.notes();
    return writer.text.toString();
  }

  private boolean listsAll() {
    return rows == Integer.MAX_VALUE;
  }

  private void head() {
    RunSheet sheet = forecast.sheet();
    text.append(Wrap.paragraph("Forecast: ", RunWords.headline(sheet), WIDTH));
    if (!sheet.title().isEmpty()) {
      text.append(Wrap.paragraph("  ", sheet.title(), WIDTH));
    }
    text.append('\n');
    line("substrates", sheet.substrates().stream().map(RunWords::substrate).toList());
    line("solids", sheet.solids().stream().map(RunWords::solid).toList());
    line("additives", sheet.additives().stream().map(RunWords::additive).toList());
    line("conditions", List.of(RunWords.conditions(sheet)));
    line("network", List.of(RunWords.network(forecast.network())));
    line("caution", List.of(RunWords.SEALED_VESSEL));
    cautions();
  }

  /** Remarks of the products listed, each once, with the products it is about. */
  private void cautions() {
    Map<String, List<String>> byCaution = new LinkedHashMap<>();
    for (Candidate candidate : forecast.candidates()) {
      String own = candidate.name() + ": ";
      for (String caution : candidate.cautions()) {
        String remark = caution.startsWith(own) ? caution.substring(own.length()) : caution;
        byCaution.computeIfAbsent(remark, c -> new ArrayList<>()).add(candidate.name());
      }
    }
    byCaution.forEach(
        (caution, names) ->
            line("caution", List.of(Names.some(names, USUAL_NAMES_PER_REASON) + ": " + caution)));
  }

  private void line(String label, List<String> values) {
    if (!values.isEmpty()) {
      String head = "  " + label + " ".repeat(12 - label.length());
      text.append(Wrap.paragraph(head, String.join("; ", values), WIDTH));
    }
  }

  private void visible() {
    List<Candidate> visible = Candidates.visible(forecast);
    text.append("\nLook for in the GC, best first\n");
    if (visible.isEmpty()) {
      text.append("  nothing new: no listed product passes the column and gives a signal\n");
      return;
    }
    TextTable table =
        new TextTable(
            "",
            List.of(
                Column.number("#"),
                Column.text("product", 30),
                Column.text("formula", 7),
                Column.number("score"),
                Column.number("steps"),
                Column.number("dG kJ/mol")));
    visible.stream().limit(rows).forEach(c -> table.row(cells(c), remark(c)));
    text.append(table);
    more(visible.size(), rows, "products");
  }

  private List<String> cells(Candidate c) {
    return List.of(
        Integer.toString(c.rank()),
        c.name(),
        c.molecule().formula().toString(),
        Figures.score(c.score()),
        Integer.toString(Candidates.steps(c)),
        Candidates.hurdle(c).map(Figures::gibbs).orElse("not known"));
  }

  /** What the steps of the best route do, and what they need. */
  private static String remark(Candidate c) {
    String route =
        Candidates.bestRoute(c).stream()
            .flatMap(r -> r.steps().stream())
            .map(step -> Candidates.brief(step.title()))
            .distinct()
            .collect(Collectors.joining(", then "));
    String needs = c.needs().isEmpty() ? "" : "needs " + String.join(", ", c.needs());
    return Stream.of(route, needs).filter(t -> !t.isEmpty()).collect(Collectors.joining("; "));
  }

  private void elsewhere() {
    List<Candidate> elsewhere = Candidates.elsewhere(forecast);
    if (!elsewhere.isEmpty()) {
      int most = listsAll() ? rows : USUAL_ROWS_ELSEWHERE;
      text.append("\nIn the gas or the water, or not seen without derivatization\n");
      TextTable table =
          new TextTable(
              "",
              List.of(
                  Column.number("#"),
                  Column.text("product", 14),
                  Column.text("formula", 7),
                  Column.number("score"),
                  Column.number("steps"),
                  Column.word("where"),
                  Column.text("made by", 20)));
      elsewhere.stream()
          .limit(most)
          .forEach(
              c ->
                  table.row(
                      List.of(
                          Integer.toString(c.rank()),
                          c.name(),
                          c.molecule().formula().toString(),
                          Figures.score(c.score()),
                          Integer.toString(c.depth()),
                          c.whereFound().word(),
                          Candidates.madeBy(c))));
      text.append(table);
      more(elsewhere.size(), most, "products");
    }
    substrates();
  }

  private void substrates() {
    List<String> left = new ArrayList<>();
    for (Candidate c : forecast.candidates()) {
      if (c.isSubstrate()) {
        left.add(
            c.name()
                + " ("
                + c.whereFound().word()
                + (c.gcVisible() ? ", seen in the GC)" : ", not seen in the GC as it is)"));
      }
    }
    if (!left.isEmpty()) {
      text.append('\n')
          .append(Wrap.paragraph("Left of the charge: ", String.join("; ", left), WIDTH));
    }
  }

  private void ruledOut() {
    if (forecast.ruledOut().isEmpty()) {
      return;
    }
    Map<String, List<RuledOut>> byReason = new LinkedHashMap<>();
    for (RuledOut out : forecast.ruledOut()) {
      byReason.computeIfAbsent(out.reason(), r -> new ArrayList<>()).add(out);
    }
    int mostReasons = listsAll() ? rows : USUAL_REASONS;
    text.append("\nNot expected, and why\n");
    byReason.entrySet().stream()
        .limit(mostReasons)
        .forEach(entry -> ruledOut(entry.getKey(), entry.getValue()));
    more(byReason.size(), mostReasons, "reasons");
  }

  private void ruledOut(String reason, List<RuledOut> outs) {
    int most = listsAll() ? rows : USUAL_NAMES_PER_REASON;
    List<String> names = outs.stream().map(ForecastTextWriter::nameWithDetail).distinct().toList();
    text.append(Wrap.paragraph("  ", "    ", Names.some(names, most) + ": " + reason, WIDTH));
  }

  private static String nameWithDetail(RuledOut out) {
    return out.detail().isEmpty() ? out.name() : out.name() + " (" + out.detail() + ")";
  }

  private void more(int all, int shown, String what) {
    if (all > shown) {
      text.append("  ... and " + (all - shown) + " more " + what + "; --all lists them\n");
    }
  }

  private void notes() {
    List<String> notes = new ArrayList<>(forecast.sheet().notes());
    notes.addAll(forecast.sheet().outsideUsualRange());
    notes.addAll(forecast.notes());
    notes.add("dG is that of the most uphill step of the route");
    text.append("\nNotes\n");
    notes.stream()
        .distinct()
        .forEach(note -> text.append(Wrap.paragraph("  - ", "    ", note, WIDTH)));
  }
}
