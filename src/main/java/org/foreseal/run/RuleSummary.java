package org.foreseal.run;

import java.util.List;
import java.util.Optional;

/**
 * One rule of the library as shown to people.
 *
 * @param id its id
 * @param family its family
 * @param title what it does, in words
 * @param needs alternatives of what a run must offer, in words; empty when heat is enough
 * @param window temperatures where it is usually seen
 * @param prominence 1 core, 2 usual, 3 marginal
 * @param facts everything else worth showing, in order: reaction, guards with their reasons,
 *     sources, examples
 */
public record RuleSummary(
    String id,
    String family,
    String title,
    List<String> needs,
    Optional<Window> window,
    int prominence,
    List<Fact> facts) {
  /** Keeps unmodifiable copies. */
  public RuleSummary {
    needs = List.copyOf(needs);
    facts = List.copyOf(facts);
  }

  /**
   * A temperature window, soft unless the facts say otherwise.
   *
   * @param lowCelsius C
   * @param highCelsius C
   */
  public record Window(double lowCelsius, double highCelsius) {}

  /**
   * One labelled line.
   *
   * @param label such as reaction, guard, source, example
   * @param text what it says
   */
  public record Fact(String label, String text) {}
}
