package org.foreseal.run;

import java.util.List;

/**
 * Outcome of the self-tests of the rules.
 *
 * @param rules number of rules looked at
 * @param examples number of examples and counter-examples run
 * @param faults what is wrong; empty when all is well
 */
public record RuleCheckReport(int rules, int examples, List<Fault> faults) {
  /** Keeps an unmodifiable copy. */
  public RuleCheckReport {
    faults = List.copyOf(faults);
  }

  /**
   * One thing that is wrong.
   *
   * @param place file and line
   * @param rule id of the rule, may be empty
   * @param problem what is wrong, in words
   */
  public record Fault(String place, String rule, String problem) {}
}
