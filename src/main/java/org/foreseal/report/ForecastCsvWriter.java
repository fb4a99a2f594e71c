package org.foreseal.report;

import java.util.List;
import org.foreseal.run.Candidate;
import org.foreseal.run.Forecast;

/** A forecast for spreadsheets: one line per candidate. */
public final class ForecastCsvWriter {
  static final List<String> COLUMNS =
      List.of(
          "rank",
          "name",
          "smiles",
          "formula",
          "monoisotopicMassDa",
          "isSubstrate",
          "score",
          "phase",
          "gcVisible",
          "depth",
          "madeBy",
          "keyStepDeltaGKJPerMol",
          "keyStepDeltaGSdKJPerMol",
          "needs",
          "cautions");

  private ForecastCsvWriter() {}

  /** The candidates as CSV, in the order of the forecast. */
  public static String write(Forecast forecast) {
    Csv csv = new Csv(COLUMNS);
    forecast.candidates().forEach(c -> csv.line(cells(c)));
    return csv.toString();
  }

  static List<String> cells(Candidate c) {
    return List.of(
        Integer.toString(c.rank()),
        c.name(),
        c.molecule().smiles(),
        c.molecule().formula().toString(),
        Figures.dalton(c.molecule()),
        Boolean.toString(c.isSubstrate()),
        Figures.json(c.score()).asText(),
        c.whereFound().word(),
        Boolean.toString(c.gcVisible()),
        Integer.toString(c.depth()),
        Candidates.madeBy(c),
        Candidates.hurdle(c).map(g -> Figures.tenths(g.value())).orElse(""),
        Candidates.hurdle(c).map(g -> Figures.tenths(g.standardDeviation())).orElse(""),
        String.join("; ", c.needs()),
        String.join("; ", c.cautions()));
  }
}
