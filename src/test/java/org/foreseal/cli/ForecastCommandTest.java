package org.foreseal.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.foreseal.report.SchemaCheck;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class ForecastCommandTest {
  private static final String SHEET = "examples/phenylacetic-acid.yaml";
  private static final String[] ON_MAGNETITE = {
    "forecast", "phenylacetic acid=0.5mol/kg", "--solid", "magnetite=50mg,5m2/g", "-T", "300C"
  };

  private static CommandRun forecast(String... more) {
    return CommandRun.of(
        Stream.concat(Stream.of(ON_MAGNETITE), Stream.of(more)).toArray(String[]::new));
  }

  private static JsonNode json(CommandRun run) throws IOException {
    assertEquals(ExitCode.DONE, run.code(), run.err());
    return new ObjectMapper().readTree(run.out());
  }

  @Test
  void printsTheProductsWithTheirRoutes() {
    CommandRun run = forecast();
    assertEquals(ExitCode.DONE, run.code(), run.err());
    assertTrue(
        run.out().startsWith("Forecast: phenylacetic acid with magnetite in water, 300 C\n"));
    assertTrue(run.out().contains("1  toluene"));
    assertTrue(run.out().contains("ketonization of one acid; needs oxide surface"));
    assertTrue(run.out().contains("dG 63 kJ/mol): endergonic"));
    assertTrue(run.out().contains("Sealed hot vessel"));
    assertTrue(run.out().contains("gas-phase Gibbs energies"));
    assertEquals("", run.err());
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "",
        "--all",
        "--solid=none",
        "--solid=hematite --solid=Ni --solid=CuO --solid=MgO"
      })
  void keepsTextWithinEightyColumns(String more) {
    CommandRun run = forecast(more.isEmpty() ? new String[0] : more.split(" "));
    run.out().lines().forEach(line -> assertTrue(line.length() <= 80, line));
    assertFalse(run.out().lines().anyMatch(line -> line.endsWith(" ")));
  }

  @Test
  void writesJsonThatFitsItsSchema() throws IOException {
    JsonNode one = json(forecast("--format", "json"));
    assertEquals(List.of(), SchemaCheck.load("forecast.schema.json").faults(one));
    JsonNode several = json(forecast("--format=json", "--solid", "none"));
    assertEquals(List.of(), SchemaCheck.load("forecast.schema.json").faults(several));
    assertEquals(2, several.get("runs").size());
  }

  @Test
  void repeatsTheRunAsUnderstoodInJson() throws IOException {
    JsonNode run =
        json(CommandRun.of("forecast", SHEET, "-T", "260C", "--format", "json")).get("run");
    assertEquals(260, run.get("temperatureC").asDouble());
    // 0.5 mol/kg in 0.25 g of water.
    assertEquals(0.125, run.get("substrates").get(0).get("millimoles").asDouble());
    assertEquals("buffer hematite-magnetite", run.get("hydrogen").asText());
    assertEquals(0.6, run.get("vessel").get("volumeMillilitres").asDouble());
  }

  @Test
  void writesOneCsvLinePerCandidate() {
    CommandRun run = forecast("--format", "csv");
    assertEquals(5, run.out().lines().count());
    assertTrue(run.out().startsWith("rank,name,smiles,formula,monoisotopicMassDa,"));
    // 7 C + 8 H: 84 + 8 x 1.00782503, by hand.
    assertTrue(run.out().contains("1,toluene,"), run.out());
    assertTrue(run.out().contains(",92.06260,"), run.out());
    assertTrue(run.out().contains("\"1,3-diphenylpropan-2-one\""));
    assertFalse(run.out().contains("\r"));
  }

  @Test
  void tellsMineralsApartWithTheReason() {
    CommandRun run = forecast("--solid", "none", "--solid", "corundum");
    assertTrue(run.out().contains("Tells the runs apart"));
    String told =
        run.out().substring(run.out().indexOf("Tells the runs apart")).replaceAll("\\s+", " ");
    assertTrue(
        told.contains(
            "1,3-diphenylpropan-2-one: with magnetite, corundum; not with no solid: needs an oxide"),
        told);
  }

  @Test
  void setsTemperaturesSideBySide() {
    CommandRun run = CommandRun.of("forecast", SHEET, "--temperature", "260C,300C");
    assertTrue(run.out().contains("260 C"));
    assertTrue(run.out().contains("300 C"));
  }

  @Test
  void letsOptionsWinOverTheSheet() throws IOException {
    JsonNode run =
        json(CommandRun.of(
                "forecast",
                SHEET,
                "--temperature",
                "573.15K",
                "--pressure",
                "1kbar",
                "--time",
                "3d",
                "--solid",
                "hematite",
                "--depth",
                "2",
                "--seed",
                "7",
                "--format",
                "json"))
            .get("run");
    assertEquals(300, run.get("temperatureC").asDouble());
    assertEquals(1000, run.get("pressureBar").asDouble());
    assertEquals(72, run.get("durationHours").asDouble());
    assertEquals("hematite", run.get("solids").get(0).get("name").asText());
    assertEquals(2, run.get("depth").asInt());
    assertEquals(7, run.get("seed").asInt());
  }

  @Test
  void givesTheSameBytesWhateverTheLocale() {
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.GERMANY);
      CommandRun german = forecast("--format", "json");
      Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
      CommandRun arabic = forecast("--format", "json");
      assertEquals(german.out(), arabic.out());
      assertTrue(forecast().out().contains("0.91"));
    } finally {
      Locale.setDefault(before);
    }
  }

  @Test
  void writesAFileWholeOrNotAtAll(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("forecast.json");
    assertEquals(ExitCode.DONE, forecast("--format", "json", "--out", file.toString()).code());
    assertEquals(forecast("--format", "json").out(), Files.readString(file));
    CommandRun lost = forecast("--out", folder.resolve("no/such/folder.txt").toString());
    assertEquals(ExitCode.FILE_TROUBLE, lost.code());
    assertTrue(lost.err().contains("no such file or folder"), lost.err());
    CommandRun onFolder = forecast("--out", folder.toString());
    assertEquals(ExitCode.FILE_TROUBLE, onFolder.code());
    try (Stream<Path> left = Files.list(folder)) {
      assertEquals(List.of(file), left.toList());
    }
  }

  @Test
  void keepsAnOldFileWhenTheRunFails(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("old.txt");
    Files.writeString(file, "old");
    assertEquals(ExitCode.BAD_INPUT, forecast("--time", "70", "--out", file.toString()).code());
    assertEquals("old", Files.readString(file));
  }

  @Test
  void readsTheSheetFromStandardInput() throws IOException {
    CommandRun run =
        CommandRun.reading(Files.readString(Path.of(SHEET)), "forecast", "-", "-T", "300C");
    assertEquals(ExitCode.DONE, run.code(), run.err());
  }

  @Test
  void warnsWhenCutAndFailsOnlyWhenStrict() {
    CommandRun cut = forecast("--limit-species", "100");
    assertEquals(ExitCode.DONE, cut.code());
    assertTrue(cut.err().contains("note: the network was cut: species limit of 100"), cut.err());
    assertTrue(cut.out().contains("CUT"));
    assertEquals(ExitCode.CUT_BY_A_LIMIT, forecast("--limit-species", "100", "--strict").code());
  }

  @Test
  void warnsOutsideTheUsualRangeAndFailsOnlyWhenStrict() {
    CommandRun hot = forecast("-T", "450C");
    assertEquals(ExitCode.WRONG_USAGE, hot.code(), "the option is given twice");
    CommandRun run = CommandRun.of("forecast", "acetic acid", "-T", "450C");
    assertEquals(ExitCode.DONE, run.code());
    assertTrue(run.err().contains("450 C lies outside 150 to 400 C"), run.err());
    CommandRun strict = CommandRun.of("forecast", "acetic acid", "-T", "450C", "--strict", "-q");
    assertEquals(ExitCode.OUTSIDE_VALIDITY, strict.code());
    assertEquals("", strict.err());
  }

  @Test
  void showsProgressAtOnceOnlyWhenAskedFor() {
    assertEquals("", forecast().err());
    assertTrue(forecast("-v").err().contains("species: 10"));
    assertEquals("", forecast("-v", "-q").err());
  }

  @Test
  void showsProgressOnATerminalAfterASecond() {
    CommandRun run = CommandRun.run(FixedEngine::new, "", true, ON_MAGNETITE);
    assertFalse(run.err().contains("species: 10"), run.err());
    assertTrue(run.err().contains("species: 20"), run.err());
  }

  @Test
  void saysWhenTheToolIsAtFault() {
    CommandRun run =
        CommandRun.with(
            () -> {
              throw new IllegalStateException("broken\n\there");
            },
            ON_MAGNETITE);
    assertEquals(ExitCode.FAULT_OF_THE_TOOL, run.code());
    assertEquals(
        "this is a fault of the tool, please report: IllegalStateException: broken here\n",
        run.err());
  }

  @Test
  void showsAStackTraceOnlyOnRequest() {
    CommandRun run =
        CommandRun.with(
            () -> {
              throw new IllegalStateException("broken");
            },
            Stream.concat(Stream.of(ON_MAGNETITE), Stream.of("-vv")).toArray(String[]::new));
    assertTrue(run.err().contains("\tat org.foreseal"), run.err());
  }
}
