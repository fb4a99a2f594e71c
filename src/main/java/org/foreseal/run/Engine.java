package org.foreseal.run;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.foreseal.molecule.Molecule;

/** The calculations behind the commands. Bad input is met with {@code BadInputException}. */
public interface Engine {
  /**
   * What a run will show.
   *
   * @param sheet a run at exactly one temperature
   */
  Forecast forecast(RunSheet sheet, ForecastOptions options, Progress progress);

  /**
   * How one product comes about.
   *
   * @param sheet a run at exactly one temperature
   * @param most number of routes wanted, at least 1
   */
  RouteReport routes(
      RunSheet sheet, Molecule product, int most, ForecastOptions options, Progress progress);

  /**
   * The network drawn, or the part of it that leads to one product.
   *
   * @param sheet a run at exactly one temperature
   */
  String drawing(
      RunSheet sheet,
      Optional<Molecule> product,
      DrawingFormat format,
      ForecastOptions options,
      Progress progress);

  /**
   * The rules in use, in the order of the library; with a folder, the built-in ones and its own.
   */
  List<RuleSummary> rules(Optional<Path> folder);

  /** Runs the self-tests of the built-in rules, or of those in a folder. */
  RuleCheckReport checkRules(Optional<Path> folder);
}
