package org.foreseal.cli;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import org.foreseal.molecule.ReadMolecule;
import org.foreseal.plan.AlphaHydrogenCheck;
import org.foreseal.plan.AlphaHydrogenReport;
import org.foreseal.quantity.Place;
import org.foreseal.report.AlphaHydrogenWriter;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code alpha-h}: which acids can ketonize, alone and crossed, and why not. */
@Command(
    name = "alpha-h",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    sortOptions = false,
    synopsisHeading = "Usage: ",
    customSynopsis = "foreseal alpha-h ACID... [OPTIONS]",
    header = "Which of these acids can ketonize, alone and crossed, and why not.",
    footer = {
      "",
      "Examples:",
      "  foreseal alpha-h \"phenylacetic acid\" \"benzoic acid\"",
      "  foreseal alpha-h \"CC(C)(C(=O)O)c1ccccc1\" \"CC(=O)O\" --format json",
      "",
      "Units: none; the check looks at molecules only, whatever the temperature.",
      ExitCode.HELP_1,
      ExitCode.HELP_2
    })
final class AlphaHydrogenCommand implements Callable<Integer> {
  private final Session session;

  @Spec private CommandSpec spec = CommandSpec.create();
  @Mixin private CommonOptions common;

  @Parameters(
      paramLabel = "ACID",
      arity = "1..*",
      description = "Carboxylic acids, by name or SMILES.")
  private List<String> acids = new ArrayList<>();

  @Mixin private ResultFormat format;

  AlphaHydrogenCommand(Session session) {
    this.session = session;
    this.common = new CommonOptions();
    this.format = new ResultFormat();
  }

  @Override
  public Integer call() throws IOException {
    Console console = new Console(spec.commandLine(), common, session);
    List<AlphaHydrogenCheck.Given> given = new ArrayList<>();
    for (String acid : acids) {
      Place place = Place.onCommandLine(acid, 1);
      ReadMolecule read = session.molecules().read(acid, place);
      console.notes(read.notes());
      given.add(new AlphaHydrogenCheck.Given(read.name(), read.molecule(), place));
    }
    AlphaHydrogenReport report = new AlphaHydrogenCheck(session.names()::display).check(given);
    console.result(
        switch (format.chosen()) {
          case TEXT -> AlphaHydrogenWriter.text(report);
          case CSV -> AlphaHydrogenWriter.csv(report);
          case JSON -> AlphaHydrogenWriter.json(report);
        });
    return ExitCode.DONE;
  }
}
