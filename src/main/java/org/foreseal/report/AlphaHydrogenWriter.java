package org.foreseal.report;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.foreseal.molecule.Molecule;
import org.foreseal.plan.AlphaHydrogenReport;
import org.foreseal.plan.AlphaHydrogenReport.Acid;
import org.foreseal.plan.AlphaHydrogenReport.AlphaCarbon;
import org.foreseal.plan.AlphaHydrogenReport.Ketone;
import org.foreseal.report.TextTable.Column;

/** Which acids can ketonize, for people, spreadsheets and programs. */
public final class AlphaHydrogenWriter {
  private static final int WIDTH = TextTable.WIDTH;

  private AlphaHydrogenWriter() {}

  /** For people. */
  public static String text(AlphaHydrogenReport report) {
    StringBuilder text = new StringBuilder("Alpha-H check for 2 RCOOH = R2CO + CO2 + H2O\n\n");
    text.append(acids(report));
    report.acids().forEach(acid -> cautions(acid, text));
    text.append('\n').append(matrix(report));
    section("\nKetones that can form\n", report, true, text);
    section("\nNo ketone\n", report, false, text);
    text.append("\nThe check looks at structures; an oxide surface or a base is needed as well.\n");
    return text.toString();
  }

  private static String acids(AlphaHydrogenReport report) {
    TextTable table =
        new TextTable(
            "",
            List.of(
                Column.number("#"),
                Column.text("acid", 18),
                Column.text("alpha carbon", 12),
                Column.number("alpha-H"),
                Column.word("enolate"),
                Column.text("why", 20)));
    for (int i = 0; i < report.acids().size(); i++) {
      Acid acid = report.acids().get(i);
      table.row(
          List.of(
              Integer.toString(i + 1),
              acid.name(),
              alphaCarbons(acid),
              Integer.toString(acid.alphaHydrogens()),
              yesOrNo(acid.canGiveEnolate()),
              acid.reason()));
    }
    return table.toString();
  }

  private static String alphaCarbons(Acid acid) {
    return acid.alphaCarbons().isEmpty()
        ? "none"
        : acid.alphaCarbons().stream().map(AlphaCarbon::kind).collect(Collectors.joining(", "));
  }

  private static void cautions(Acid acid, StringBuilder text) {
    for (String caution : acid.cautions()) {
      text.append(Wrap.paragraph("caution: ", "  ", acid.name() + ": " + caution, WIDTH));
    }
  }

  private static String matrix(AlphaHydrogenReport report) {
    int size = report.acids().size();
    List<Column> columns = new ArrayList<>();
    columns.add(Column.number(""));
    for (int i = 1; i <= size; i++) {
      columns.add(Column.word(Integer.toString(i)));
    }
    TextTable table = new TextTable("", columns);
    for (int i = 0; i < size; i++) {
      List<String> cells = new ArrayList<>();
      cells.add(Integer.toString(i + 1));
      for (int j = 0; j < size; j++) {
        cells.add(yesOrNo(pair(report, i, j).isPossible()));
      }
      table.row(cells);
    }
    return table.toString();
  }

  private static Ketone pair(AlphaHydrogenReport report, int i, int j) {
    return report.ketones().stream()
        .filter(k -> k.first() == Math.min(i, j) && k.second() == Math.max(i, j))
        .findFirst()
        .orElseThrow();
  }

  private static void section(
      String heading, AlphaHydrogenReport report, boolean possible, StringBuilder text) {
    List<Ketone> pairs = report.ketones().stream().filter(k -> k.isPossible() == possible).toList();
    if (pairs.isEmpty()) {
      return;
    }
    text.append(heading);
    for (Ketone pair : pairs) {
      String head = "  " + (pair.first() + 1) + " + " + (pair.second() + 1) + "  ";
      String product = pair.ketone().map(k -> nameAndFormula(pair, k) + ": ").orElse("");
      text.append(Wrap.paragraph(head, product + pair.reason(), WIDTH));
    }
  }

  /** The SMILES stands in for a name where there is none but the formula. */
  private static String nameAndFormula(Ketone pair, Molecule ketone) {
    String formula = ketone.formula().toString();
    return (pair.name().equals(formula) ? ketone.smiles() : pair.name()) + ", " + formula;
  }

  private static String yesOrNo(boolean value) {
    return value ? "yes" : "no";
  }

  /** For spreadsheets: one line per pair. */
  public static String csv(AlphaHydrogenReport report) {
    Csv csv =
        new Csv(
            List.of(
                "firstAcid",
                "secondAcid",
                "firstAlphaHydrogens",
                "secondAlphaHydrogens",
                "possible",
                "ketoneSmiles",
                "ketoneName",
                "reason"));
    for (Ketone pair : report.ketones()) {
      Acid first = report.acids().get(pair.first());
      Acid second = report.acids().get(pair.second());
      csv.line(
          List.of(
              first.name(),
              second.name(),
              Integer.toString(first.alphaHydrogens()),
              Integer.toString(second.alphaHydrogens()),
              Boolean.toString(pair.isPossible()),
              pair.ketone().map(Molecule::smiles).orElse(""),
              pair.name(),
              pair.reason()));
    }
    return csv.toString();
  }

  /** For programs; indices of acids count from 0. */
  public static String json(AlphaHydrogenReport report) {
    ObjectNode root = Json.object();
    ArrayNode acids = root.putArray("acids");
    report.acids().forEach(a -> acids.add(acid(a)));
    ArrayNode ketones = root.putArray("ketones");
    report.ketones().forEach(k -> ketones.add(ketone(k)));
    return Json.text(root);
  }

  private static ObjectNode acid(Acid acid) {
    ObjectNode node = Json.object();
    node.put("name", acid.name());
    node.put("smiles", acid.molecule().smiles());
    node.put("alphaHydrogens", acid.alphaHydrogens());
    node.put("canGiveEnolate", acid.canGiveEnolate());
    node.put("reason", acid.reason());
    ArrayNode carbons = node.putArray("alphaCarbons");
    acid.alphaCarbons()
        .forEach(c -> carbons.addObject().put("kind", c.kind()).put("hydrogens", c.hydrogens()));
    node.set("cautions", Json.texts(acid.cautions()));
    return node;
  }

  private static ObjectNode ketone(Ketone pair) {
    ObjectNode node = Json.object();
    node.putArray("acids").add(pair.first()).add(pair.second());
    node.put("possible", pair.isPossible());
    node.put("smiles", pair.ketone().map(Molecule::smiles).orElse(null));
    node.put("name", pair.isPossible() ? pair.name() : null);
    node.put("reason", pair.reason());
    return node;
  }
}
