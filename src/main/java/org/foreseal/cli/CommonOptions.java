package org.foreseal.cli;

import java.nio.file.Path;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine;
import picocli.CommandLine.Option;

/** Options that every command has. */
final class CommonOptions {
  private static final int STACK_TRACE_LEVEL = 2;

  @Option(
      names = {"-o", "--out"},
      paramLabel = "FILE",
      description = "Write the result to FILE instead of standard output.")
  private @Nullable Path out;

  @Option(
      names = {"-q", "--quiet"},
      description = "No notes on standard error, errors only.")
  private boolean quiet;

  @Option(
      names = {"-v", "--verbose"},
      description = "Say what is being done; -vv adds stack traces to errors.")
  private boolean[] verbose = new boolean[0];

  @Option(
      names = "--strict",
      description = "Exit code 5 outside a validity range, 6 when cut by a limit.")
  private boolean strict;

  Optional<Path> out() {
    return Optional.ofNullable(out);
  }

  boolean isQuiet() {
    return quiet;
  }

  boolean isVerbose() {
    return verbose.length > 0;
  }

  boolean isStrict() {
    return strict;
  }

  /** Whether the command that failed was given {@code -vv}. */
  static boolean wantsStackTrace(CommandLine commandLine) {
    return commandLine.getMixins().values().stream()
        .anyMatch(m -> m instanceof CommonOptions o && o.verbose.length >= STACK_TRACE_LEVEL);
  }
}
