package org.foreseal.network;

/** What a pruner says of a step. */
public sealed interface Verdict {
  /** The step stays. */
  record Kept() implements Verdict {}

  /**
   * The step goes.
   *
   * @param reason why, in plain words
   * @param detail the figures behind it
   */
  record Pruned(String reason, String detail) implements Verdict {}

  /** The verdict that keeps a step. */
  Verdict KEPT = new Kept();
}
