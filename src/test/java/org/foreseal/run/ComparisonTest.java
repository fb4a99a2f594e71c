package org.foreseal.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Optional;
import org.foreseal.chromatography.WhereFound;
import org.foreseal.molecule.Smiles;
import org.foreseal.run.Comparison.Difference;
import org.junit.jupiter.api.Test;

class ComparisonTest {
  private static final RunSheet SHEET =
      new RunReader(
              new org.foreseal.molecule.MoleculeReader(
                  org.foreseal.molecule.MoleculeNames.builtIn()))
          .read(new RunReader.Sheet("x", "substrates: [phenol]\ntemperature_C: 300\n"));

  private static Candidate candidate(String smiles, double score, boolean isSubstrate) {
    return new Candidate(
        isSubstrate ? 0 : 1,
        smiles,
        Smiles.read(smiles),
        isSubstrate,
        true,
        score,
        WhereFound.EXTRACT,
        true,
        1,
        List.of(),
        List.of(),
        List.of());
  }

  private static Comparison.Run run(
      String label, List<Candidate> candidates, Optional<RuledOut> ruledOut) {
    return new Comparison.Run(
        label,
        new Forecast(
            new ToolInfo("0", "0", 1),
            SHEET,
            List.of(),
            candidates,
            ruledOut.stream().toList(),
            new NetworkSummary(1, 1, 1, "depth", false)));
  }

  @Test
  void ordersProductsByTheirBestScoreAndLeavesSubstratesOut() {
    Comparison comparison =
        new Comparison(
            List.of(
                run(
                    "a",
                    List.of(
                        candidate("Oc1ccccc1", 1, true),
                        candidate("c1ccccc1", 0.3, false),
                        candidate("CCO", 0.2, false)),
                    Optional.empty()),
                run("b", List.of(candidate("CCO", 0.8, false)), Optional.empty())));
    assertEquals(
        List.of("CCO", "c1ccccc1"),
        comparison.products().stream().map(Comparison.Product::name).toList());
    assertEquals(0.2, comparison.products().get(0).scores().get(0).orElseThrow());
  }

  @Test
  void tellsApartByAbsenceAndByFarLowerScore() {
    RuledOut benzene =
        new RuledOut(Smiles.read("c1ccccc1").smiles(), "benzene", "r", "no hydrogen", "");
    Comparison comparison =
        new Comparison(
            List.of(
                run(
                    "a",
                    List.of(
                        candidate("c1ccccc1", 0.9, false),
                        candidate("CCO", 0.9, false),
                        candidate("CCC", 0.9, false),
                        candidate("CC", 0.05, false)),
                    Optional.empty()),
                run(
                    "b",
                    List.of(candidate("CCO", 0.1, false), candidate("CCC", 0.5, false)),
                    Optional.of(benzene))));
    List<Difference> differences = comparison.differences();
    assertEquals(
        List.of("CCO", "c1ccccc1"), differences.stream().map(d -> d.product().name()).toList());
    assertEquals("listed, but far lower", differences.get(0).missing().get(0).reason());
    assertEquals("no hydrogen", differences.get(1).missing().get(0).reason());
    assertEquals(List.of("a"), differences.get(1).shownBy());
  }

  @Test
  void looksForTheReasonAlongTheRouteOfTheOthers() {
    String acetaldehyde = Smiles.read("CC=O").smiles();
    ForecastRoute.Step step =
        new ForecastRoute.Step(
            "oxidation",
            "oxidation",
            "",
            "CCO = " + acetaldehyde + " + [H][H]",
            Optional.empty(),
            List.of());
    Candidate acid =
        new Candidate(
            1,
            "acid",
            Smiles.read("CC(=O)O"),
            false,
            true,
            0.5,
            WhereFound.EXTRACT,
            true,
            2,
            List.of(),
            List.of(),
            List.of(new ForecastRoute(0.5, List.of(step))));
    RuledOut onTheWay = new RuledOut(acetaldehyde, "acetaldehyde", "oxidation", "no iron", "");
    Comparison comparison =
        new Comparison(
            List.of(
                run("a", List.of(acid), Optional.empty()),
                run("b", List.of(), Optional.of(onTheWay)),
                run("c", List.of(), Optional.empty())));
    List<Comparison.Missing> missing = comparison.differences().get(0).missing();
    assertEquals("no iron", missing.get(0).reason());
    assertEquals("no route to it there", missing.get(1).reason());
  }

  @Test
  void refusesToCompareNothing() {
    assertThrows(IllegalArgumentException.class, () -> new Comparison(List.of()));
  }
}
