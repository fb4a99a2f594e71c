package org.foreseal.cli;

import picocli.CommandLine.Option;

/** The {@code --format} of the commands whose result is a table. */
final class ResultFormat {
  @Option(
      names = "--format",
      paramLabel = "FORMAT",
      defaultValue = "text",
      description = "text (default), csv or json.")
  private OutputFormat chosen = OutputFormat.TEXT;

  OutputFormat chosen() {
    return chosen;
  }
}
