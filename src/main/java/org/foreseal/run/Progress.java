package org.foreseal.run;

/** Told how far a long calculation is. May be called often and from any thread. */
@FunctionalInterface
public interface Progress {
  /** Nobody listens. */
  Progress SILENT = (stage, done) -> {};

  /**
   * Work goes on.
   *
   * @param stage what is being done, in the chemist's words
   * @param done how many species, steps, ... are done
   */
  void report(String stage, long done);
}
