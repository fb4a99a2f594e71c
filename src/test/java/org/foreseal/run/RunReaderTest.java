package org.foreseal.run;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalLong;
import java.util.Set;
import org.foreseal.molecule.MoleculeNames;
import org.foreseal.molecule.MoleculeReader;
import org.foreseal.molecule.Smiles;
import org.foreseal.quantity.BadInputException;
import org.foreseal.rule.Provision;
import org.foreseal.run.RunSheet.Additive;
import org.foreseal.run.RunSheet.Amount;
import org.foreseal.run.RunSheet.Solid;
import org.foreseal.run.RunSheet.Substrate;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class RunReaderTest {
  private static final String HEAD = "substrates: [phenylacetic acid]\ntemperature_C: 260\n";
  private static final RunReader READER =
      new RunReader(new MoleculeReader(MoleculeNames.builtIn()));

  private static RunSheet read(String text) {
    return READER.read(new RunReader.Sheet("run.yaml", text));
  }

  private static RunOptions options(
      List<String> substrates, List<String> solids, List<String> additives, String temperature) {
    return new RunOptions(
        substrates,
        solids,
        additives,
        Optional.of(temperature),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        Optional.empty(),
        OptionalLong.empty(),
        OptionalLong.empty());
  }

  private static RunSheet one(List<String> solids, List<String> additives) {
    return READER
        .read(Optional.empty(), options(List.of("acetic acid"), solids, additives, "260C"))
        .get(0)
        .sheet();
  }

  @Test
  void keepsEveryFieldOfTheSheet() {
    RunSheet sheet =
        read(
            """
            title: brine loop 4, plate 2, 260 C
            substrates:
              - {name: phenylacetic acid, smiles: "OC(=O)Cc1ccccc1", molality: 0.5}
            solvent: water
            water_g: 0.25
            solids:
              - {name: magnetite, milligrams: 50, surface_m2_per_g: 5}
              - {name: "my catalyst", acts_as: [oxide, acid], milligrams: 10, surface_m2_per_g: 80}
            additives:
              - {name: hydrochloric acid, molality: 0.01}
            temperature_C: 260
            pressure_bar: 300
            duration_h: 48
            hydrogen: {buffer: HM}
            pH_25C: 4.5
            vessel: {volume_mL: 1.2, kind: gold capsule}
            gc: {detector: MS, phase: polyethylene-glycol, solvent: dichloromethane,
              derivatization: methyl-ester, detection_limit_mole_percent: 0.05}
            forecast: {depth: 2, seed: 7}
            """);
    RunSheet expected =
        new RunSheet(
            "brine loop 4, plate 2, 260 C",
            List.of(
                new Substrate(
                    "phenylacetic acid",
                    Smiles.read("OC(=O)Cc1ccccc1"),
                    Optional.of(new Amount(0.5, "mol/kg")))),
            true,
            OptionalDouble.of(0.25),
            List.of(
                new Solid(
                    "magnetite",
                    Set.of(Provision.OXIDE, Provision.SPINEL_TYPE, Provision.IRON_BEARING),
                    OptionalDouble.of(50),
                    OptionalDouble.of(5)),
                new Solid(
                    "my catalyst",
                    Set.of(Provision.OXIDE, Provision.ACID),
                    OptionalDouble.of(10),
                    OptionalDouble.of(80))),
            List.of(
                new Additive(
                    "hydrochloric acid",
                    Optional.of(Smiles.read("Cl")),
                    Set.of(Provision.ACID),
                    Optional.of(new Amount(0.01, "mol/kg")))),
            List.of(260.0),
            OptionalDouble.of(300),
            OptionalDouble.of(48),
            2,
            7,
            List.of(),
            Optional.of(new Hydrogen.Buffered(Hydrogen.Assemblage.HEMATITE_MAGNETITE)),
            OptionalDouble.of(4.5),
            Optional.of(new RunSheet.Vessel(OptionalDouble.of(1.2), "gold capsule")),
            Optional.of(
                new RunSheet.Chromatograph(
                    RunSheet.Detector.MS,
                    RunSheet.StationaryPhase.POLYETHYLENE_GLYCOL,
                    "dichloromethane",
                    RunSheet.Derivatization.METHYL_ESTER,
                    0.05)));
    assertEquals(expected, sheet);
  }

  @Test
  void fillsInWhatIsUsual() {
    RunSheet sheet = read(HEAD + "gc: {}\n");
    assertTrue(sheet.inWater());
    assertEquals(3, sheet.depth());
    assertEquals(1, sheet.seed());
    assertEquals(RunSheet.Detector.FID, sheet.chromatograph().orElseThrow().detector());
    assertEquals(0.1, sheet.chromatograph().orElseThrow().detectionLimitMolePercent());
    assertTrue(sheet.hydrogen().isEmpty());
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "260; 260",
        "[300, 260]; 260 300",
        "260..300; 260 300",
        "260..300 by 20; 260 280 300",
        "200..300 by 30; 200 230 260 290",
        "[150, 260..300]; 150 260 300",
        "2.6e2; 260"
      })
  void readsTemperaturesOfTheSheet(String written, String expected) {
    RunSheet sheet = read("substrates: [acetic acid]\ntemperature_C: " + written + "\n");
    assertEquals(expected, words(sheet.temperatureCelsius()));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = ';',
      value = {
        "300C; 300",
        "300 C; 300",
        "573.15K; 300",
        "260C,300C; 260 300",
        "260,300C; 260 300",
        "260..300C; 260 300",
        "260C..300C by 20C; 260 280 300",
        "533.15..573.15K; 260 300",
        "260°C; 260"
      })
  void readsTemperaturesOfTheCommandLine(String written, String expected) {
    List<RunReader.Variant> runs =
        READER.read(
            Optional.empty(), options(List.of("acetic acid"), List.of(), List.of(), written));
    List<Double> all = runs.stream().map(v -> v.sheet().temperatureCelsius().get(0)).toList();
    assertEquals(expected, words(all));
  }

  private static String words(List<Double> temperatures) {
    return String.join(" ", temperatures.stream().map(Quantities::plain).toList());
  }

  @Test
  void makesOneRunForEachSolidAndTemperature() {
    List<RunReader.Variant> runs =
        READER.read(
            Optional.empty(),
            options(
                List.of("acetic acid"),
                List.of("none", "magnetite+quartz=20mg"),
                List.of(),
                "260C,300C"));
    assertEquals(
        List.of(
            "no solid, 260 C",
            "no solid, 300 C",
            "magnetite + quartz, 260 C",
            "magnetite + quartz, 300 C"),
        runs.stream().map(RunReader.Variant::label).toList());
    assertEquals(List.of(), runs.get(0).sheet().solids());
    assertEquals(OptionalDouble.of(20), runs.get(2).sheet().solids().get(1).milligrams());
  }

  @Test
  void tellsAmountsOfOneSolidApart() {
    List<RunReader.Variant> runs =
        READER.read(
            Optional.empty(),
            options(
                List.of("acetic acid"),
                List.of("magnetite=50mg", "magnetite=0.1g"),
                List.of(),
                "260C"));
    assertEquals(
        List.of("magnetite 50 mg", "magnetite 100 mg"),
        runs.stream().map(RunReader.Variant::label).toList());
  }

  @ParameterizedTest
  @CsvSource({
    "acetic acid=0.5mol/kg, CC(=O)O, 0.5, mol/kg",
    "CC(=O)O=20mg, CC(=O)O, 20, mg",
    "C=C=2bar, C=C, 2, bar",
    "CC=O=0.02g, CC=O, 20, mg",
    "ethanol=50 umol, CCO, 0.05, mmol",
    "ethanol=20mmol/kg, CCO, 0.02, mol/kg"
  })
  void readsSubstratesWithAmounts(String text, String smiles, double value, String unit) {
    Substrate read = substrate(text);
    assertEquals(Smiles.read(smiles), read.molecule());
    assertEquals(unit, read.amount().orElseThrow().unit());
    assertEquals(value, read.amount().orElseThrow().value(), 1e-12);
  }

  @ParameterizedTest
  @ValueSource(strings = {"C=C", "O=C(C)O", "C=1CCCCC1", "CC=O", "C=1C=CC=CC=1C"})
  void takesADoubleBondForNoAmount(String smiles) {
    assertEquals(Smiles.read(smiles), substrate(smiles).molecule());
    assertTrue(substrate(smiles).amount().isEmpty());
  }

  private static Substrate substrate(String text) {
    return READER
        .read(Optional.empty(), options(List.of(text), List.of(), List.of(), "260C"))
        .get(0)
        .sheet()
        .substrates()
        .get(0);
  }

  @ParameterizedTest
  @CsvSource({
    "benzoic acid, acid",
    "methanesulfonic acid, acid",
    "benzylamine, base",
    "4-methylpyridine, base",
    "glycine, acid base",
    "acetamide, ''",
    "toluene, ''",
    "phenol, ''"
  })
  void readsRolesOffTheStructureOfAnUnknownAdditive(String name, String roles) {
    Additive additive = one(List.of(), List.of(name)).additives().get(0);
    assertEquals(roles, String.join(" ", additive.roles().stream().map(Provision::word).toList()));
    assertTrue(additive.molecule().isPresent());
  }

  @Test
  void saysHowAnUnknownAdditiveWasTaken() {
    List<String> notes = one(List.of(), List.of("benzylamine=0.1mol/kg")).notes();
    assertEquals(List.of("additive benzylamine: taken as base, by its structure"), notes);
  }

  @Test
  void givesAMoleculeTheRolesOfItsCatalogueEntryHoweverItIsWritten() {
    assertEquals(
        Set.of(Provision.ACID, Provision.HYDROGEN_DONOR),
        one(List.of(), List.of("OC=O")).additives().get(0).roles());
  }

  @Test
  void takesStatedRoles() {
    RunSheet sheet =
        one(List.of("slag[oxide,base]=30mg"), List.of("brine[inert]", "tar[reductant]"));
    assertEquals(Set.of(Provision.OXIDE, Provision.BASE), sheet.solids().get(0).roles());
    assertEquals(Set.of(Provision.INERT), sheet.additives().get(0).roles());
    assertTrue(sheet.additives().get(1).molecule().isEmpty());
  }

  @Test
  void pointsAtTheValueInTheSheet() {
    BadInputException refused =
        assertThrows(BadInputException.class, () -> read(HEAD + "pressure_bar: -3\n"));
    assertEquals("run.yaml:3:15", refused.place().label());
    assertEquals("pressure_bar: -3", refused.place().text());
  }

  @Test
  void pointsIntoAQuotedSmiles() {
    BadInputException refused =
        assertThrows(
            BadInputException.class,
            () -> read("substrates: [{smiles: \"CC)C\"}]\ntemperature_C: 260\n"));
    assertEquals(26, refused.place().column(), refused.report());
  }
}
