package org.foreseal.cli;

import org.foreseal.run.ToolInfo;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** The tool itself: shows what it can do and hands over to a command. */
@Command(
    name = ToolInfo.NAME,
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    synopsisHeading = "Usage: ",
    customSynopsis = "foreseal COMMAND [OPTIONS] [RUN SHEET | SUBSTRATE...]",
    header = {
      "Before the capsule is sealed, know what to look for; after it is opened, know",
      "what you found."
    },
    footer = {
      "",
      "Examples:",
      "  foreseal forecast \"phenylacetic acid\" --solid magnetite --temperature 300C",
      "  foreseal alpha-h \"phenylacetic acid\" \"2-methyl-2-phenylpropanoic acid\"",
      "",
      "'foreseal COMMAND --help' shows the options, units and exit codes of a command."
    },
    commandListHeading = "%nCommands:%n",
    optionListHeading = "%nOptions:%n")
final class Foreseal implements Runnable {
  private static final int HELP_COLUMNS = 80;

  @Spec private CommandSpec spec = CommandSpec.create();

  /** The whole command line, ready to execute. */
  static CommandLine commandLine(Session session) {
    CommandLine line =
        new CommandLine(new Foreseal())
            .addSubcommand("forecast", new ForecastCommand(session))
            .addSubcommand("alpha-h", new AlphaHydrogenCommand(session))
            .addSubcommand("routes", new RoutesCommand(session))
            .addSubcommand("rules", new RulesCommand(session));
    line.setUsageHelpWidth(HELP_COLUMNS);
    line.setExpandAtFiles(false);
    line.setCaseInsensitiveEnumValuesAllowed(true);
    line.setExecutionExceptionHandler(new Complaints());
    line.setParameterExceptionHandler(new UsageComplaints());
    return line;
  }

  /** Without a command the help is shown. */
  @Override
  public void run() {
    spec.commandLine().usage(spec.commandLine().getOut());
  }
}
