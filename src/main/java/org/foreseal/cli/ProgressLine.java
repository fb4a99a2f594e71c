package org.foreseal.cli;

import java.io.PrintWriter;
import java.util.function.LongSupplier;
import org.foreseal.run.Progress;

/** Prints how far the work is, at most once a second. */
final class ProgressLine implements Progress {
  private static final long SECOND = 1_000_000_000L;

  private final PrintWriter err;
  private final LongSupplier nanoTime;
  private long nextAt;

  ProgressLine(PrintWriter err, boolean atOnce, LongSupplier nanoTime) {
    this.err = err;
    this.nanoTime = nanoTime;
    this.nextAt = nanoTime.getAsLong() + (atOnce ? 0 : SECOND);
  }

  @Override
  public synchronized void report(String stage, long done) {
    long now = nanoTime.getAsLong();
    if (now - nextAt >= 0) {
      nextAt = now + SECOND;
      err.print(stage + ": " + done + "\n");
      err.flush();
    }
  }
}
