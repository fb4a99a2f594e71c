package org.foreseal.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.foreseal.quantity.BadInputException;
import org.foreseal.quantity.Place;
import org.foreseal.report.RulesWriter;
import org.foreseal.run.Nearest;
import org.foreseal.run.RuleCheckReport;
import org.foreseal.run.RuleSummary;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code rules}: list, show and check the rule library, built-in or the user's own. */
@Command(
    name = "rules",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    sortOptions = false,
    synopsisHeading = "Usage: ",
    customSynopsis = "foreseal rules (list | show ID | check [DIR]) [OPTIONS]",
    header = "List, show or check the rules, built-in ones or your own folder.",
    footer = {
      "",
      "Examples:",
      "  foreseal rules list",
      "  foreseal rules show ketonic-decarboxylation-self",
      "  foreseal rules check my-rules",
      "",
      "Units: temperatures in C. check ends with exit code 3 when a rule is faulty.",
      ExitCode.HELP_1,
      ExitCode.HELP_2
    })
final class RulesCommand implements Callable<Integer> {
  private static final List<String> ACTIONS = List.of("list", "show", "check");

  private final Session session;

  @Spec private CommandSpec spec = CommandSpec.create();
  @Mixin private CommonOptions common;

  @Parameters(index = "0", paramLabel = "ACTION", description = "list, show or check.")
  private String action = "";

  @Parameters(
      index = "1",
      arity = "0..1",
      paramLabel = "ID|DIR",
      description = "The rule to show, or the folder to check.")
  private @Nullable String argument;

  @Option(
      names = "--rules",
      paramLabel = "DIR",
      description = "Your own rules: they add to or replace built-in ones.")
  private @Nullable Path folder;

  @Mixin private ResultFormat format;

  RulesCommand(Session session) {
    this.session = session;
    this.common = new CommonOptions();
    this.format = new ResultFormat();
  }

  @Override
  public Integer call() throws IOException {
    Console console = new Console(spec.commandLine(), common, session);
    return switch (action) {
      case "list" -> list(console);
      case "show" -> show(console);
      case "check" -> check(console);
      default ->
          throw new BadInputException(
              Place.onCommandLine("rules " + action, 7),
              "rules cannot " + action,
              Nearest.hint(action, ACTIONS));
    };
  }

  private int list(Console console) throws IOException {
    if (argument != null) {
      throw new BadInputException(
          Place.onCommandLine("rules list " + argument, 12),
          "list takes no argument",
          "foreseal rules show " + argument + " shows one rule; --rules DIR adds a folder");
    }
    List<RuleSummary> rules = session.engine().get().rules(Optional.ofNullable(folder));
    console.result(
        switch (format.chosen()) {
          case TEXT -> RulesWriter.listText(rules);
          case CSV -> RulesWriter.listCsv(rules);
          case JSON -> RulesWriter.listJson(rules);
        });
    return ExitCode.DONE;
  }

  private int show(Console console) throws IOException {
    String id = argument == null ? "" : argument;
    List<RuleSummary> rules = session.engine().get().rules(Optional.ofNullable(folder));
    RuleSummary rule =
        rules.stream()
            .filter(r -> r.id().equals(id))
            .findFirst()
            .orElseThrow(() -> unknown(id, rules));
    console.result(
        switch (format.chosen()) {
          case TEXT -> RulesWriter.text(rule);
          case CSV -> RulesWriter.csv(rule);
          case JSON -> RulesWriter.json(rule);
        });
    return ExitCode.DONE;
  }

  private static BadInputException unknown(String id, List<RuleSummary> rules) {
    List<String> near = Nearest.to(id, rules.stream().map(RuleSummary::id).toList());
    return new BadInputException(
        Place.onCommandLine("rules show " + id, 12),
        id.isEmpty() ? "no rule is named" : "no rule is called " + id,
        near.isEmpty()
            ? "foreseal rules list shows them all"
            : "did you mean " + String.join(" or ", near) + "?");
  }

  private int check(Console console) throws IOException {
    Optional<Path> checked =
        Optional.ofNullable(argument).map(Path::of).or(() -> Optional.ofNullable(folder));
    RuleCheckReport result = session.engine().get().checkRules(checked);
    console.result(
        switch (format.chosen()) {
          case TEXT -> RulesWriter.checkText(result);
          case CSV -> RulesWriter.checkCsv(result);
          case JSON -> RulesWriter.checkJson(result);
        });
    return result.faults().isEmpty() ? ExitCode.DONE : ExitCode.BAD_INPUT;
  }
}
