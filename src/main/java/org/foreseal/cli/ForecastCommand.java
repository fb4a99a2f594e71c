package org.foreseal.cli;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import org.foreseal.report.ComparisonWriter;
import org.foreseal.report.ForecastCsvWriter;
import org.foreseal.report.ForecastJsonWriter;
import org.foreseal.report.ForecastTextWriter;
import org.foreseal.run.Comparison;
import org.foreseal.run.Engine;
import org.foreseal.run.Forecast;
import org.foreseal.run.ForecastOptions;
import org.foreseal.run.RunReader;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/**
 * {@code forecast}: what a run will show, ranked; several minerals or temperatures side by side.
 */
@Command(
    name = "forecast",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    sortOptions = false,
    synopsisHeading = "Usage: ",
    customSynopsis = "foreseal forecast [RUN.yaml | SUBSTRATE...] [OPTIONS]",
    header = "What will this run show in the GC, ranked; what not, and why.",
    footer = {
      "",
      "Examples:",
      "  foreseal forecast \"phenylacetic acid=0.5mol/kg\" --solid magnetite=50mg \\",
      "      --temperature 300C --pressure 1000bar --time 70h",
      "  foreseal forecast run.yaml --solid magnetite --solid hematite --solid none",
      "  foreseal forecast run.yaml --format json --out forecast.json",
      "",
      "Units: C K; bar kbar MPa atm; s min h d; mg g kg; mmol mol; mol/kg; m2/g.",
      "Range: rules were collected for 150 to 400 C; 0 to 600 C is accepted.",
      ExitCode.HELP_1,
      ExitCode.HELP_2
    })
final class ForecastCommand implements Callable<Integer> {
  private static final int USUAL_ROWS = 20;

  private final Session session;

  @Spec private CommandSpec spec = CommandSpec.create();
  @Mixin private RunArguments run;
  @Mixin private CommonOptions common;

  @Mixin private ResultFormat format;

  @Option(names = "--all", description = "List every product, however unlikely.")
  private boolean everything;

  ForecastCommand(Session session) {
    this.session = session;
    this.run = new RunArguments();
    this.common = new CommonOptions();
    this.format = new ResultFormat();
  }

  @Override
  public Integer call() throws IOException {
    Console console = new Console(spec.commandLine(), common, session);
    ForecastOptions options = run.forecastOptions(everything);
    List<RunReader.Variant> variants = run.read(session);
    Engine engine = session.engine().get();
    List<Comparison.Run> runs = new ArrayList<>();
    for (RunReader.Variant variant : variants) {
      console.detail("forecast " + variant.label());
      Forecast forecast = engine.forecast(variant.sheet(), options, console.progress());
      runs.add(new Comparison.Run(variant.label(), forecast));
    }
    console.result(written(runs));
    return Strictness.code(runs.stream().map(Comparison.Run::forecast).toList(), common, console);
  }

  private String written(List<Comparison.Run> runs) {
    int rows = everything ? Integer.MAX_VALUE : USUAL_ROWS;
    if (runs.size() > 1) {
      Comparison comparison = new Comparison(runs);
      return switch (format.chosen()) {
        case TEXT -> ComparisonWriter.text(comparison, rows);
        case CSV -> ComparisonWriter.csv(comparison);
        case JSON -> ComparisonWriter.json(comparison);
      };
    }
    Forecast forecast = runs.get(0).forecast();
    return switch (format.chosen()) {
      case TEXT -> ForecastTextWriter.write(forecast, rows);
      case CSV -> ForecastCsvWriter.write(forecast);
      case JSON -> ForecastJsonWriter.write(forecast);
    };
  }
}
