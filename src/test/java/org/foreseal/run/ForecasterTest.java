package org.foreseal.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.MoleculeNames;
import org.foreseal.molecule.MoleculeReader;
import org.foreseal.molecule.Smiles;
import org.foreseal.quantity.BadInputException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The whole pipeline with the real rules and energies. */
class ForecasterTest {
  private static final MoleculeNames NAMES = MoleculeNames.builtIn();
  private static final Forecaster FORECASTER = Forecaster.standard(NAMES::display, "test");

  private static RunSheet sheet(String yaml) {
    return new RunReader(new MoleculeReader(NAMES)).read(new RunReader.Sheet("test.yaml", yaml));
  }

  private static Forecast forecast(String yaml) {
    return FORECASTER.forecast(sheet(yaml), ForecastOptions.usual(), Progress.SILENT);
  }

  private static final String PHENYLACETIC =
      """
      title: brine loop 4, test
      substrates:
        - {name: phenylacetic acid, molality: 0.5}
      solvent: water
      solids:
        - {name: SOLID, milligrams: 50}
      temperature_C: 300
      """;

  private static final String OWN_RULE =
      """
        family: own
        rules:
          - id: own-exchange
            title: acid to thioacid
            smirks: "[C:1](=[O:2])[O:3][H:4].[H:5][S:6][H:7]>>[C:1](=[O:2])[S:6][H:5].[H:4][O:3][H:7]"
            applies-to: any acid
            needs: [[]]
            helped-by: []
            window-C: [100, 400]
            prominence: 1
            sources: [{key: common-practice}]
            examples: [{from: ["CC(=O)O", "S"], to: ["CC(=O)S", "O"]}]
        """;

  private static Optional<Candidate> find(Forecast forecast, String smiles) {
    Molecule wanted = Smiles.read(smiles);
    return forecast.candidates().stream().filter(c -> c.molecule().equals(wanted)).findFirst();
  }

  static List<Path> examples() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("examples"))) {
      return files.sorted().toList();
    }
  }

  @ParameterizedTest
  @MethodSource("examples")
  void everyExampleGivesAListAChemistCanRead(Path file) throws IOException {
    RunSheet all =
        new RunReader(new MoleculeReader(NAMES))
            .read(new RunReader.Sheet(file.toString(), Files.readString(file)));
    RunSheet sheet = all.atCelsius(all.temperatureCelsius().get(0));
    Forecast forecast = FORECASTER.forecast(sheet, ForecastOptions.usual(), Progress.SILENT);
    assertFalse(forecast.network().isCut());
    List<Candidate> products =
        forecast.candidates().stream().filter(c -> !c.isSubstrate()).limit(20).toList();
    assertTrue(products.size() >= 10, () -> "only " + products.size());
    List<String> unnamed =
        products.stream()
            .filter(c -> NAMES.commonOrGenerated(c.molecule()).isEmpty())
            .map(Candidate::name)
            .toList();
    assertTrue(unnamed.size() <= 0.1 * products.size(), () -> "no name for " + unnamed);
    for (Candidate c : products) {
      assertTrue(c.score() > 0 && c.score() <= 1);
      c.routes().forEach(r -> r.steps().forEach(s -> assertBalanced(s.equationSmiles())));
    }
  }

  private static void assertBalanced(String equation) {
    int middle = equation.indexOf(" = ");
    assertEquals(
        elements(equation.substring(0, middle)),
        elements(equation.substring(middle + 3)),
        equation);
  }

  private static Map<String, Integer> elements(String side) {
    Map<String, Integer> counts = new TreeMap<>();
    for (String term : side.split(" \\+ ", -1)) {
      int space = term.indexOf(' ');
      int times = space > 0 ? Integer.parseInt(term.substring(0, space)) : 1;
      Smiles.read(term.substring(space + 1))
          .formula()
          .counts()
          .forEach((e, n) -> counts.merge(e.symbol(), times * n, Integer::sum));
    }
    return counts;
  }

  @Test
  void magnetiteBringsTheKetoneAndBenzoicAcid() {
    Forecast forecast = forecast(PHENYLACETIC.replace("SOLID", "magnetite"));
    for (String smiles :
        List.of("Cc1ccccc1", "O=C(Cc1ccccc1)Cc1ccccc1", "OC(=O)c1ccccc1", "c1ccccc1")) {
      assertTrue(find(forecast, smiles).orElseThrow().rank() <= 12, smiles);
    }
    Candidate ketone = find(forecast, "O=C(Cc1ccccc1)Cc1ccccc1").orElseThrow();
    assertTrue(
        forecast.notes().stream()
            .anyMatch(
                n -> n.contains("a group is not in the fit") && n.contains("1,3-diphenylacetone")),
        () -> forecast.notes().toString());
    assertEquals("1,3-diphenylacetone", ketone.name());
    assertEquals(List.of("oxide"), ketone.needs());
    ForecastRoute.Step step = ketone.routes().get(0).steps().get(0);
    assertEquals(
        "2 phenylacetic acid = 1,3-diphenylacetone + carbon dioxide + water", step.equation());
    assertTrue(step.deltaGibbs().orElseThrow().standardDeviation() > 0);
    assertTrue(find(forecast, "c1ccccc1").orElseThrow().cautions().get(0).contains("carcinogen"));
  }

  @Test
  void anInertSolidLeavesTolueneAndSaysWhatIsMissing() {
    Forecast forecast =
        forecast(PHENYLACETIC.replace("SOLID, milligrams: 50", "gold grains, acts_as: [inert]"));
    assertEquals(
        "toluene",
        forecast.candidates().stream().filter(c -> c.rank() == 1).findFirst().orElseThrow().name());
    assertTrue(find(forecast, "O=C(Cc1ccccc1)Cc1ccccc1").isEmpty());
    RuledOut why =
        forecast.ruledOut().stream()
            .filter(r -> r.name().equals("1,3-diphenylacetone"))
            .findFirst()
            .orElseThrow();
    assertTrue(why.reason().startsWith("needs oxide"), why.reason());
  }

  @Test
  void outsideTheRangeOfTheMethodThereAreNoGibbsEnergiesAndANoteSaysSo() {
    Forecast forecast = forecast(PHENYLACETIC.replace("SOLID", "magnetite").replace("300", "550"));
    assertTrue(
        forecast.notes().stream()
            .anyMatch(n -> n.startsWith("no Gibbs energy, outside the range")));
    List<ForecastRoute.Step> steps =
        forecast.candidates().stream()
            .flatMap(c -> c.routes().stream())
            .flatMap(r -> r.steps().stream())
            .toList();
    assertFalse(steps.isEmpty());
    assertTrue(steps.stream().allMatch(s -> s.deltaGibbs().isEmpty()));
  }

  @Test
  void corundumGivesTheKetoneButNoBenzoicAcid() {
    Forecast forecast = forecast(PHENYLACETIC.replace("SOLID", "corundum"));
    assertTrue(find(forecast, "O=C(Cc1ccccc1)Cc1ccccc1").isPresent());
    assertTrue(find(forecast, "OC(=O)c1ccccc1").isEmpty());
  }

  @Test
  void aBlockedAcidHasItsKetoneRuledOut() {
    Forecast forecast =
        forecast(
            PHENYLACETIC
                .replace("phenylacetic acid", "2-methyl-2-phenylpropanoic acid")
                .replace("SOLID", "magnetite"));
    Molecule ketone = Smiles.read("CC(C)(c1ccccc1)C(=O)C(C)(C)c1ccccc1");
    RuledOut why =
        forecast.ruledOut().stream()
            .filter(r -> r.smiles().equals(ketone.smiles()))
            .findFirst()
            .orElseThrow();
    assertTrue(why.reason().contains("alpha-H"));
  }

  @Test
  void routesTellTheStepsOrTheReason() {
    RunSheet sheet = sheet(PHENYLACETIC.replace("SOLID", "magnetite"));
    RouteReport found =
        FORECASTER.routes(
            sheet,
            Smiles.read("C(=Cc1ccccc1)c1ccccc1"),
            3,
            ForecastOptions.usual(),
            Progress.SILENT);
    assertEquals("trans-stilbene", found.name());
    assertFalse(found.routes().isEmpty());
    assertFalse(found.sourcesByRule().isEmpty());
    RouteReport none =
        FORECASTER.routes(
            sheet, Smiles.read("CCCCCCCC"), 3, ForecastOptions.usual(), Progress.SILENT);
    assertEquals(Optional.of("no rule leads to it within 3 steps"), none.reason());
    RouteReport charge =
        FORECASTER.routes(
            sheet, Smiles.read("OC(=O)Cc1ccccc1"), 3, ForecastOptions.usual(), Progress.SILENT);
    assertEquals(Optional.of("it is part of the charge"), charge.reason());
  }

  @Test
  void drawingsShowTheNetworkOrTheWayToOneProduct() {
    RunSheet sheet = sheet(PHENYLACETIC.replace("SOLID", "magnetite"));
    String whole =
        FORECASTER.drawing(
            sheet,
            Optional.empty(),
            DrawingFormat.GRAPHML,
            ForecastOptions.usual(),
            Progress.SILENT);
    String part =
        FORECASTER.drawing(
            sheet,
            Optional.of(Smiles.read("Cc1ccccc1")),
            DrawingFormat.DOT,
            ForecastOptions.usual(),
            Progress.SILENT);
    assertTrue(whole.contains("1,3-diphenylacetone"));
    assertTrue(part.contains("toluene") && part.length() < whole.length());
  }

  @Test
  void everythingListsMoreThanTheUsual() {
    RunSheet sheet = sheet(PHENYLACETIC.replace("SOLID", "magnetite"));
    ForecastOptions all =
        new ForecastOptions(true, Optional.empty(), OptionalInt.empty(), Optional.empty());
    int usual =
        FORECASTER.forecast(sheet, ForecastOptions.usual(), Progress.SILENT).candidates().size();
    Forecast whole = FORECASTER.forecast(sheet, all, Progress.SILENT);
    assertTrue(whole.candidates().size() >= usual);
    assertEquals(
        whole.network().species() - 1, whole.candidates().size(), "all species but the water");
  }

  @Test
  void aCutNetworkSaysSo() {
    RunSheet sheet = sheet(PHENYLACETIC.replace("SOLID", "magnetite"));
    Forecast cut =
        FORECASTER.forecast(
            sheet,
            new ForecastOptions(false, Optional.empty(), OptionalInt.of(30), Optional.empty()),
            Progress.SILENT);
    assertTrue(cut.network().isCut());
    assertTrue(cut.notes().stream().anyMatch(n -> n.contains("cut (limit: 30 species)")));
  }

  @Test
  void ownRulesTakePart(@TempDir Path folder) throws IOException {
    Files.writeString(folder.resolve("own.yaml"), OWN_RULE);
    RunSheet sheet = sheet(PHENYLACETIC.replace("SOLID", "pyrite"));
    ForecastOptions own =
        new ForecastOptions(false, Optional.of(folder), OptionalInt.empty(), Optional.empty());
    assertTrue(
        find(FORECASTER.forecast(sheet, own, Progress.SILENT), "O=C(S)Cc1ccccc1").isPresent());
    assertTrue(FORECASTER.checkRules(Optional.of(folder)).faults().isEmpty());
    assertTrue(
        FORECASTER.rules(Optional.of(folder)).stream()
            .anyMatch(r -> r.id().equals("own-exchange")));
  }

  @Test
  void ownRulesThatFailTheirExampleAreRefused(@TempDir Path folder) throws IOException {
    Files.writeString(folder.resolve("own.yaml"), OWN_RULE.replace("CC(=O)S", "CCS"));
    ForecastOptions own =
        new ForecastOptions(false, Optional.of(folder), OptionalInt.empty(), Optional.empty());
    RunSheet sheet = sheet(PHENYLACETIC.replace("SOLID", "pyrite"));
    BadInputException e =
        assertThrows(
            BadInputException.class, () -> FORECASTER.forecast(sheet, own, Progress.SILENT));
    assertTrue(e.report().contains("own.yaml:3") && e.report().contains("should give"), e::report);
  }

  @Test
  void builtInRulesAreShownWithTheirReasonsAndSources() {
    List<RuleSummary> rules = new ArrayList<>(FORECASTER.rules(Optional.empty()));
    RuleSummary ketonization =
        rules.stream()
            .filter(r -> r.id().equals("ketonic-decarboxylation-self"))
            .findFirst()
            .orElseThrow();
    List<String> labels = ketonization.facts().stream().map(RuleSummary.Fact::label).toList();
    assertTrue(
        labels.containsAll(
            List.of("reaction", "guard", "near miss", "source", "example", "takes not")));
    assertTrue(FORECASTER.checkRules(Optional.empty()).faults().isEmpty());
  }
}
