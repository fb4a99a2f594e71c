package org.foreseal.cli;

import java.io.PrintWriter;
import java.util.Collection;
import java.util.List;
import org.foreseal.run.Nearest;
import picocli.CommandLine;
import picocli.CommandLine.IParameterExceptionHandler;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** Says what is wrong with a command line and where the help is, without printing all of it. */
final class UsageComplaints implements IParameterExceptionHandler {
  @Override
  public int handleParseException(ParameterException failure, String[] args) {
    CommandLine commandLine = failure.getCommandLine();
    PrintWriter err = commandLine.getErr();
    err.print(String.valueOf(failure.getMessage()).replaceAll("\\s+", " ").strip() + "\n");
    if (failure instanceof UnmatchedArgumentException unmatched) {
      suggest(unmatched, err);
    }
    err.print("  see: " + commandLine.getCommandSpec().qualifiedName() + " --help\n");
    err.flush();
    return ExitCode.WRONG_USAGE;
  }

  private static void suggest(UnmatchedArgumentException failure, PrintWriter err) {
    CommandLine commandLine = failure.getCommandLine();
    String word = failure.getUnmatched().get(0);
    Collection<String> known =
        word.startsWith("-")
            ? commandLine.getCommandSpec().optionsMap().keySet()
            : commandLine.getSubcommands().keySet();
    List<String> near = Nearest.to(word, known);
    if (!near.isEmpty()) {
      err.print("  hint: did you mean " + String.join(" or ", near) + "?\n");
    }
  }
}
