package org.foreseal.run;

import java.util.List;
import java.util.Optional;
import org.foreseal.quantity.Uncertain;

/**
 * One way to a product, in the order in which the steps happen; steps that make a co-reactant come
 * before their use.
 *
 * @param score score of this route, 0 to 1
 * @param steps the steps
 */
public record ForecastRoute(double score, List<Step> steps) {
  /** Keeps an unmodifiable copy. */
  public ForecastRoute {
    steps = List.copyOf(steps);
  }

  /**
   * One balanced step.
   *
   * @param rule rule id
   * @param title what the rule does, in words
   * @param equation balanced equation in names
   * @param equationSmiles the same in SMILES
   * @param deltaGibbs Gibbs energy at the run's temperature, kJ/mol, absent where it cannot be
   *     estimated
   * @param needs what the step needs, in plain words
   */
  public record Step(
      String rule,
      String title,
      String equation,
      String equationSmiles,
      Optional<Uncertain> deltaGibbs,
      List<String> needs) {
    /** Keeps an unmodifiable copy. */
    public Step {
      needs = List.copyOf(needs);
    }
  }
}
