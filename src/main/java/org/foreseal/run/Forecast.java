package org.foreseal.run;

import java.util.List;

/**
 * The one result model that every writer shows.
 *
 * @param tool what made it
 * @param sheet the run as understood, options applied
 * @param notes remarks on how the input was understood and on what the figures are, for the reader
 * @param candidates every product listed, best first, substrates included where they fall
 * @param ruledOut what was considered and refused, with the reason
 * @param network size of the network and why it ended
 */
public record Forecast(
    ToolInfo tool,
    RunSheet sheet,
    List<String> notes,
    List<Candidate> candidates,
    List<RuledOut> ruledOut,
    NetworkSummary network) {
  /** Keeps unmodifiable copies. */
  public Forecast {
    notes = List.copyOf(notes);
    candidates = List.copyOf(candidates);
    ruledOut = List.copyOf(ruledOut);
  }
}
