package org.foreseal.report;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.foreseal.report.TextTable.Column;
import org.foreseal.run.Quantities;
import org.foreseal.run.RuleCheckReport;
import org.foreseal.run.RuleSummary;

/** The rule library, for people, spreadsheets and programs. */
public final class RulesWriter {
  private static final int WIDTH = TextTable.WIDTH;

  private RulesWriter() {}

  /** The list for people, by family. */
  public static String listText(List<RuleSummary> rules) {
    StringBuilder text = new StringBuilder(Figures.count(rules.size(), "rule") + "\n");
    for (String family : rules.stream().map(RuleSummary::family).distinct().toList()) {
      TextTable table =
          new TextTable(
              "  ",
              List.of(Column.text("id", 20), Column.text("what it does", 20), Column.word("C")));
      rules.stream()
          .filter(r -> r.family().equals(family))
          .forEach(r -> table.row(List.of(r.id(), r.title(), window(r))));
      text.append('\n').append(family).append('\n').append(table);
    }
    return text.toString();
  }

  private static String window(RuleSummary rule) {
    return rule.window()
        .map(w -> Quantities.plain(w.lowCelsius()) + ".." + Quantities.plain(w.highCelsius()))
        .orElse("-");
  }

  /** One rule for people. */
  public static String text(RuleSummary rule) {
    StringBuilder text =
        new StringBuilder(Wrap.paragraph("", rule.id() + ": " + rule.title(), WIDTH));
    fact("family", rule.family(), text);
    fact("needs", needs(rule), text);
    fact("window", rule.window().isPresent() ? window(rule) + " C" : "any", text);
    fact("prominence", Integer.toString(rule.prominence()), text);
    rule.facts().forEach(f -> fact(f.label(), f.text(), text));
    return text.toString();
  }

  private static String needs(RuleSummary rule) {
    return rule.needs().isEmpty() ? "heat alone" : String.join(" or ", rule.needs());
  }

  private static void fact(String label, String value, StringBuilder text) {
    String head = "  " + label + " ".repeat(Math.max(1, 17 - label.length()));
    text.append(Wrap.paragraph(head, value, WIDTH));
  }

  /** The list for spreadsheets. */
  public static String listCsv(List<RuleSummary> rules) {
    Csv csv = new Csv(List.of("id", "family", "title", "needs", "lowC", "highC", "prominence"));
    for (RuleSummary rule : rules) {
      csv.line(
          List.of(
              rule.id(),
              rule.family(),
              rule.title(),
              String.join("; ", rule.needs()),
              rule.window().map(w -> Quantities.plain(w.lowCelsius())).orElse(""),
              rule.window().map(w -> Quantities.plain(w.highCelsius())).orElse(""),
              Integer.toString(rule.prominence())));
    }
    return csv.toString();
  }

  /** One rule for spreadsheets: its facts, one per line. */
  public static String csv(RuleSummary rule) {
    Csv csv = new Csv(List.of("id", "label", "text"));
    csv.line(List.of(rule.id(), "title", rule.title()));
    rule.facts().forEach(f -> csv.line(List.of(rule.id(), f.label(), f.text())));
    return csv.toString();
  }

  /** The list for programs. */
  public static String listJson(List<RuleSummary> rules) {
    ArrayNode array = Json.array();
    rules.forEach(r -> array.add(tree(r)));
    ObjectNode root = Json.object();
    root.set("rules", array);
    return Json.text(root);
  }

  /** One rule for programs. */
  public static String json(RuleSummary rule) {
    return Json.text(tree(rule));
  }

  private static ObjectNode tree(RuleSummary rule) {
    ObjectNode node = Json.object();
    node.put("id", rule.id());
    node.put("family", rule.family());
    node.put("title", rule.title());
    node.set("needs", Json.texts(rule.needs()));
    if (rule.window().isPresent()) {
      ObjectNode window = node.putObject("windowC");
      window.set("low", Json.number(rule.window().get().lowCelsius()));
      window.set("high", Json.number(rule.window().get().highCelsius()));
    } else {
      node.putNull("windowC");
    }
    node.put("prominence", rule.prominence());
    ArrayNode facts = node.putArray("facts");
    rule.facts().forEach(f -> facts.addObject().put("label", f.label()).put("text", f.text()));
    return node;
  }

  /** The outcome of the self-tests for people. */
  public static String checkText(RuleCheckReport check) {
    StringBuilder text = new StringBuilder();
    for (RuleCheckReport.Fault fault : check.faults()) {
      String rule = fault.rule().isEmpty() ? "" : fault.rule() + ": ";
      text.append(Wrap.paragraph(fault.place() + ": ", "  ", rule + fault.problem(), WIDTH));
    }
    text.append(
        Figures.count(check.rules(), "rule")
            + ", "
            + check.examples()
            + " examples and counter-examples: ");
    text.append(
        check.faults().isEmpty()
            ? "all pass\n"
            : Figures.count(check.faults().size(), "fault") + "\n");
    return text.toString();
  }

  /** The outcome for spreadsheets: one line per fault. */
  public static String checkCsv(RuleCheckReport check) {
    Csv csv = new Csv(List.of("place", "rule", "problem"));
    check.faults().forEach(f -> csv.line(List.of(f.place(), f.rule(), f.problem())));
    return csv.toString();
  }

  /** The outcome for programs. */
  public static String checkJson(RuleCheckReport check) {
    ObjectNode root = Json.object().put("rules", check.rules()).put("examples", check.examples());
    ArrayNode faults = root.putArray("faults");
    check
        .faults()
        .forEach(
            f ->
                faults
                    .addObject()
                    .put("place", f.place())
                    .put("rule", f.rule())
                    .put("problem", f.problem()));
    return Json.text(root);
  }
}
