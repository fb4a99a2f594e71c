package org.foreseal.cli;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.foreseal.molecule.Molecule;
import org.foreseal.molecule.Smiles;
import org.foreseal.run.Engine;
import org.foreseal.run.StructureReader;
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
    return new Session(
        Main::engine, structures(), Molecule::smiles, System.in, isTerminal(), System::nanoTime);
  }

  /** Up to Java 21 there is a console only when a person sits at the terminal. */
  @SuppressWarnings("SystemConsoleNull")
  private static boolean isTerminal() {
    return System.console() != null;
  }

  private static Engine engine() {
    throw new UnsupportedOperationException("the forecast engine is not part of this build");
  }

  private static StructureReader structures() {
    return (text, place) -> {
      List<Molecule> molecules = Smiles.readAll(text, place);
      return new StructureReader.Structure(molecules.get(0), text, List.of());
    };
  }
}
