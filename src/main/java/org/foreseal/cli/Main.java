package org.foreseal.cli;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import org.foreseal.molecule.MoleculeNames;
import org.foreseal.molecule.MoleculeReader;
import org.foreseal.run.Forecaster;
import picocli.CommandLine;

/** Starts the command line. */
public final class Main {
  private Main() {}

  /** Runs one command and exits with its code. */
  public static void main(String[] args) {
    CommandLine commandLine = Foreseal.commandLine(session());
    commandLine.setOut(new PrintWriter(System.out, true, StandardCharsets.UTF_8));
    commandLine.setErr(new PrintWriter(System.err, true, StandardCharsets.UTF_8));
    System.exit(commandLine.execute(args));
  }

  private static Session session() {
    MoleculeNames names = MoleculeNames.builtIn();
    return new Session(
        () -> Forecaster.standard(names::display, Version.text()),
        new MoleculeReader(names),
        names,
        System.in,
        isTerminal(),
        System::nanoTime);
  }

  /** Up to Java 21 there is a console only when a person sits at the terminal. */
  @SuppressWarnings("SystemConsoleNull")
  private static boolean isTerminal() {
    return System.console() != null;
  }
}
