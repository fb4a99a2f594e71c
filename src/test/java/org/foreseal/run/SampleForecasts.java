package org.foreseal.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.foreseal.chromatography.WhereFound;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.quantity.Uncertain;
import org.foreseal.rule.Provision;

/** A small forecast of phenylacetic acid with made-up figures, to test what is written about it. */
public final class SampleForecasts {
  private static final ToolInfo TOOL = new ToolInfo("0.0-test", "0".repeat(64), 1);

  private SampleForecasts() {}

  public static Forecast of(RunSheet sheet) {
    return forecast(sheet, new NetworkSummary(412, 1023, 3, "depth", false));
  }

  public static Forecast cut(RunSheet sheet) {
    return forecast(sheet, new NetworkSummary(100, 180, 2, "species limit of 100", true));
  }

  private static Forecast forecast(RunSheet sheet, NetworkSummary network) {
    boolean hasOxide = sheet.solids().stream().anyMatch(s -> s.roles().contains(Provision.OXIDE));
    List<Candidate> candidates = new ArrayList<>();
    candidates.add(substrate());
    candidates.add(toluene());
    List<RuledOut> ruledOut = new ArrayList<>();
    if (hasOxide) {
      candidates.add(ketone());
    } else {
      ruledOut.add(
          new RuledOut(
              smiles("O=C(Cc1ccccc1)Cc1ccccc1"),
              "1,3-diphenylpropan-2-one",
              "ketonic-decarboxylation-self",
              "needs an oxide surface, an iron-bearing mineral or a base",
              ""));
    }
    candidates.add(carbonDioxide(candidates.size()));
    ruledOut.add(
        new RuledOut(
            smiles("c1ccccc1"), "benzene, with \"quotes\"", "x", "endergonic", "dG 63 kJ/mol"));
    return new Forecast(
        TOOL,
        sheet,
        List.of("gas-phase Gibbs energies; the water phase is not in these figures yet"),
        candidates,
        ruledOut,
        network);
  }

  private static String smiles(String smiles) {
    return Smiles.read(smiles).smiles();
  }

  private static Candidate substrate() {
    return candidate(0, "phenylacetic acid", "OC(=O)Cc1ccccc1", 1, WhereFound.WATER, List.of());
  }

  private static Candidate toluene() {
    return candidate(
        1,
        "toluene",
        "Cc1ccccc1",
        0.91,
        WhereFound.EXTRACT,
        List.of(
            new ForecastRoute.Step(
                "decarboxylation-alpha-aryl",
                "decarboxylation of an arylacetic acid",
                "phenylacetic acid = toluene + carbon dioxide",
                "O=C(O)Cc1ccccc1 = c1ccc(cc1)C + O=C=O",
                Optional.of(new Uncertain(-71.23, 3.4)),
                List.of())));
  }

  private static Candidate ketone() {
    return candidate(
        2,
        "1,3-diphenylpropan-2-one",
        "O=C(Cc1ccccc1)Cc1ccccc1",
        0.64,
        WhereFound.EXTRACT,
        List.of(
            new ForecastRoute.Step(
                "ketonic-decarboxylation-self",
                "ketonization of one acid",
                "2 phenylacetic acid = 1,3-diphenylpropan-2-one + carbon dioxide + water",
                "2 O=C(O)Cc1ccccc1 = O=C(Cc1ccccc1)Cc2ccccc2 + O=C=O + O",
                Optional.empty(),
                List.of("oxide surface"))));
  }

  private static Candidate carbonDioxide(int rank) {
    return candidate(rank, "carbon dioxide", "O=C=O", 0.9, WhereFound.GAS, List.of());
  }

  private static Candidate candidate(
      int rank,
      String name,
      String smiles,
      double score,
      WhereFound where,
      List<ForecastRoute.Step> steps) {
    Molecule molecule = Smiles.read(smiles);
    return new Candidate(
        rank,
        name,
        molecule,
        rank == 0,
        !"carbon dioxide".equals(name),
        score,
        where,
        where == WhereFound.EXTRACT,
        steps.size(),
        steps.stream().flatMap(s -> s.needs().stream()).toList(),
        "toluene".equals(name) ? List.of("flammable vapour") : List.of(),
        steps.isEmpty() ? List.of() : List.of(new ForecastRoute(score, steps)));
  }
}
