package org.foreseal.cli;

import java.util.List;
import org.foreseal.run.Forecast;
import org.foreseal.run.NetworkSummary;
import org.foreseal.run.RunSheet;

/** Warns of results outside a validity range or cut by a limit, and makes them fail on request. */
final class Strictness {
  private Strictness() {}

  /** The exit code of these forecasts; without {@code --strict} only a warning. */
  static int code(List<Forecast> forecasts, CommonOptions options, Console console) {
    int code = ExitCode.DONE;
    for (Forecast forecast : forecasts) {
      code = worse(code, of(forecast.sheet(), forecast.network(), console));
    }
    return options.isStrict() ? code : ExitCode.DONE;
  }

  /** As above for one run. */
  static int code(RunSheet sheet, NetworkSummary network, CommonOptions options, Console console) {
    int code = of(sheet, network, console);
    return options.isStrict() ? code : ExitCode.DONE;
  }

  private static int of(RunSheet sheet, NetworkSummary network, Console console) {
    if (network.isCut()) {
      console.note("the network was cut: " + network.stoppedBy());
      return ExitCode.CUT_BY_A_LIMIT;
    }
    List<String> outside = sheet.outsideUsualRange();
    outside.forEach(console::note);
    return outside.isEmpty() ? ExitCode.DONE : ExitCode.OUTSIDE_VALIDITY;
  }

  private static int worse(int a, int b) {
    return Math.max(a, b);
  }
}
