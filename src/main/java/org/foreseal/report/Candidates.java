package org.foreseal.report;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.foreseal.quantity.Uncertain;
import org.foreseal.run.Candidate;
import org.foreseal.run.Forecast;
import org.foreseal.run.ForecastRoute;

/** Questions that several writers put to the candidates of a forecast. */
final class Candidates {
  private Candidates() {}

  /** What stands in the chromatogram besides the substrates, best first. */
  static List<Candidate> visible(Forecast forecast) {
    return forecast.candidates().stream().filter(c -> c.gcVisible() && !c.isSubstrate()).toList();
  }

  /** What escapes the chromatogram, best first. */
  static List<Candidate> elsewhere(Forecast forecast) {
    return forecast.candidates().stream().filter(c -> !c.gcVisible() && !c.isSubstrate()).toList();
  }

  static Optional<ForecastRoute> bestRoute(Candidate candidate) {
    return candidate.routes().stream().findFirst();
  }

  /** What the last step of the best route does. */
  static String madeBy(Candidate candidate) {
    return bestRoute(candidate)
        .filter(r -> !r.steps().isEmpty())
        .map(r -> brief(r.steps().get(r.steps().size() - 1).title()))
        .orElse("");
  }

  /** A title without what it adds behind a colon or in brackets at its end. */
  static String brief(String title) {
    String beforeColon = title.split(": ", 2)[0];
    return beforeColon.replaceFirst("\\s+\\([^()]*\\)$", "");
  }

  /** The Gibbs energy of the step that is most uphill on the best route. */
  static Optional<Uncertain> hurdle(Candidate candidate) {
    return bestRoute(candidate).stream()
        .flatMap(r -> r.steps().stream())
        .flatMap(s -> s.deltaGibbs().stream())
        .max(Comparator.comparingDouble(Uncertain::value));
  }

  /** How many steps the best route takes, side branches included; 0 for what was charged. */
  static int steps(Candidate candidate) {
    return bestRoute(candidate).map(r -> r.steps().size()).orElse(candidate.depth());
  }
}
