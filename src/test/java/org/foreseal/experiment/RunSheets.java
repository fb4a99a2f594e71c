package org.foreseal.experiment;

import java.util.List;
import java.util.OptionalDouble;
import org.foreseal.run.RunSheet;

/** Short ways to a run sheet in tests. */
final class RunSheets {
  private RunSheets() {}

  static RunSheet of(
      List<RunSheet.Substrate> substrates,
      boolean inWater,
      List<RunSheet.Solid> solids,
      List<RunSheet.Additive> additives,
      List<Double> temperatureCelsius) {
    return new RunSheet(
        "",
        substrates,
        inWater,
        OptionalDouble.empty(),
        solids,
        additives,
        temperatureCelsius,
        OptionalDouble.empty(),
        OptionalDouble.empty(),
        3,
        1,
        List.of());
  }
}
