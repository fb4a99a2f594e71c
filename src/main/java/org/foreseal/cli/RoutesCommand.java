package org.foreseal.cli;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.foreseal.molecule.Molecule;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.foreseal.report.RoutesWriter;
import org.foreseal.run.DrawingFormat;
import org.foreseal.run.Engine;
import org.foreseal.run.ForecastOptions;
import org.foreseal.run.RouteReport;
import org.foreseal.run.RunReader;
import org.foreseal.run.RunSheet;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** {@code routes}: how a product comes about, step by step, or a drawing of the network. */
@Command(
    name = "routes",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    sortOptions = false,
    synopsisHeading = "Usage: ",
    customSynopsis = "foreseal routes [RUN.yaml | SUBSTRATE...] --to PRODUCT [OPTIONS]",
    header = "How does a product come about: steps, rules, dG with error, what each needs.",
    footer = {
      "",
      "Examples:",
      "  foreseal routes run.yaml --to toluene",
      "  foreseal routes \"phenylacetic acid\" --solid magnetite --temperature 300C \\",
      "      --to \"O=C(Cc1ccccc1)Cc1ccccc1\" --most 3",
      "  foreseal routes run.yaml --format graphml --out network.graphml",
      "",
      "Units: C K; bar kbar MPa atm; s min h d; mg g kg; mmol mol; mol/kg; m2/g. dG is",
      "in kJ/mol at the temperature of the run, with one standard deviation.",
      ExitCode.HELP_1,
      ExitCode.HELP_2
    })
final class RoutesCommand implements Callable<Integer> {
  /** Results and drawings. */
  enum Format {
    TEXT,
    CSV,
    JSON,
    GRAPHML,
    DOT
  }

  private final Session session;

  @Spec private CommandSpec spec = CommandSpec.create();
  @Mixin private RunArguments run;
  @Mixin private CommonOptions common;

  @Option(
      names = "--to",
      paramLabel = "PRODUCT",
      description = "The product, by name or SMILES; a drawing can do without.")
  private @Nullable String product;

  @Option(
      names = "--most",
      paramLabel = "N",
      defaultValue = "3",
      description = "Show the N best routes (3).")
  private int most;

  @Option(
      names = "--format",
      paramLabel = "FORMAT",
      defaultValue = "text",
      description = "text (default), csv, json; graphml or dot for a drawing.")
  private Format format = Format.TEXT;

  RoutesCommand(Session session) {
    this.session = session;
    this.run = new RunArguments();
    this.common = new CommonOptions();
  }

  @Override
  public Integer call() throws IOException {
    Console console = new Console(spec.commandLine(), common, session);
    ForecastOptions options = run.forecastOptions(true);
    RunSheet sheet = single(run.read(session));
    Optional<Molecule> target =
        Optional.ofNullable(product)
            .map(p -> session.molecules().read(p, Place.onCommandLine("--to " + p, 6)).molecule());
    Engine engine = session.engine().get();
    if (format == Format.GRAPHML || format == Format.DOT) {
      DrawingFormat drawing = DrawingFormat.valueOf(format.name());
      console.result(engine.drawing(sheet, target, drawing, options, console.progress()));
      return ExitCode.DONE;
    }
    Molecule wanted = target.orElseThrow(RoutesCommand::noProduct);
    RouteReport report = engine.routes(sheet, wanted, most(), options, console.progress());
    console.result(written(report));
    return Strictness.code(sheet, report.network(), common, console);
  }

  private String written(RouteReport report) {
    return switch (format) {
      case TEXT -> RoutesWriter.text(report);
      case CSV -> RoutesWriter.csv(report);
      case JSON -> RoutesWriter.json(report);
      case GRAPHML, DOT -> throw new IllegalStateException("a drawing is not a report");
    };
  }

  private int most() {
    if (most < 1) {
      throw new BadInputException(
          Place.onCommandLine("--most " + most, 8), most + " routes", "ask for at least 1");
    }
    return most;
  }

  private static BadInputException noProduct() {
    return new BadInputException(
        Place.onCommandLine("", 0), "no product is given", "add --to toluene, or its SMILES");
  }

  private static RunSheet single(List<RunReader.Variant> variants) {
    if (variants.size() > 1) {
      List<String> labels = variants.stream().map(RunReader.Variant::label).toList();
      throw new BadInputException(
          Place.onCommandLine("", 0),
          "routes of " + variants.size() + " runs at once: " + String.join("; ", labels),
          "choose one solid and one temperature, such as --temperature 260C");
    }
    return variants.get(0).sheet();
  }
}
