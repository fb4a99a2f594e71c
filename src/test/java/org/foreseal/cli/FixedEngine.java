package org.foreseal.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.foreseal.molecule.Molecule;
import org.foreseal.run.DrawingFormat;
import org.foreseal.run.Engine;
import org.foreseal.run.Forecast;
import org.foreseal.run.ForecastOptions;
import org.foreseal.run.Progress;
import org.foreseal.run.RouteReport;
import org.foreseal.run.RuleCheckReport;
import org.foreseal.run.RuleSummary;
import org.foreseal.run.RunSheet;
import org.foreseal.run.SampleForecasts;

/**
 * An engine with fixed answers that follow the run it is given: ketones only where an oxide is
 * present. It stands in for the calculations so that these tests are about the commands.
 */
final class FixedEngine implements Engine {
  @Override
  public Forecast forecast(RunSheet sheet, ForecastOptions options, Progress progress) {
    progress.report("species", 10);
    progress.report("species", 20);
    return options.mostSpecies().isPresent()
        ? SampleForecasts.cut(sheet)
        : SampleForecasts.of(sheet);
  }

  @Override
  public RouteReport routes(
      RunSheet sheet, Molecule product, int most, ForecastOptions options, Progress progress) {
    Forecast forecast = SampleForecasts.of(sheet);
    var candidate =
        forecast.candidates().stream().filter(c -> c.molecule().equals(product)).findFirst();
    return new RouteReport(
        forecast.tool(),
        sheet,
        candidate.map(c -> c.name()).orElse(product.smiles()),
        product,
        candidate.map(c -> c.routes()).orElse(List.of()),
        Map.of("decarboxylation-alpha-aryl", List.of("gca-2020-269-597, abstract read")),
        candidate.isPresent() ? Optional.empty() : Optional.of("no rule leads to it"),
        forecast.notes(),
        forecast.network());
  }

  @Override
  public String drawing(
      RunSheet sheet,
      Optional<Molecule> product,
      DrawingFormat format,
      ForecastOptions options,
      Progress progress) {
    return format + " " + product.map(Molecule::smiles).orElse("all") + "\n";
  }

  @Override
  public List<RuleSummary> rules(Optional<Path> folder) {
    return List.of(
        new RuleSummary(
            "ketonic-decarboxylation-self",
            "ketonization",
            "ketonization of one acid",
            List.of("oxide", "base"),
            Optional.of(new RuleSummary.Window(250, 450)),
            1,
            List.of(new RuleSummary.Fact("source", "common practice"))),
        new RuleSummary(
            "decarboxylation-alpha-aryl",
            "decarboxylation",
            "decarboxylation of an arylacetic acid",
            List.of(),
            Optional.empty(),
            1,
            List.of()));
  }

  @Override
  public RuleCheckReport checkRules(Optional<Path> folder) {
    return folder.isEmpty()
        ? new RuleCheckReport(2, 6, List.of())
        : new RuleCheckReport(
            1,
            2,
            List.of(
                new RuleCheckReport.Fault(folder.get() + "/x.yaml:3", "x", "does not balance")));
  }
}
