package org.foreseal.network;

import java.util.ArrayList;
import java.util.List;

/** What one rule found in one slice of its combinations. */
final class Found {
  private final List<Proposal> proposals = new ArrayList<>();
  private final List<Refusal> refusals = new ArrayList<>();
  private int tried;
  private boolean outOfTime;

  void add(Proposal proposal) {
    proposals.add(proposal);
  }

  void add(Refusal refusal) {
    refusals.add(refusal);
  }

  List<Proposal> proposals() {
    return proposals;
  }

  List<Refusal> refusals() {
    return refusals;
  }

  /** Counts one more combination and answers how many there are. */
  int countTry() {
    return ++tried;
  }

  int tried() {
    return tried;
  }

  void endForTime() {
    outOfTime = true;
  }

  boolean isOutOfTime() {
    return outOfTime;
  }
}
