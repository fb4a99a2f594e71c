package org.foreseal.cli;

import java.io.ByteArrayInputStream;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.util.function.Supplier;
import org.foreseal.molecule.MoleculeNames;
import org.foreseal.molecule.MoleculeReader;
import org.foreseal.run.Engine;
import picocli.CommandLine;

/** Runs one command line with captured writers. */
record CommandRun(int code, String out, String err) {
  static CommandRun of(String... arguments) {
    return with(FixedEngine::new, arguments);
  }

  static CommandRun with(Supplier<Engine> engine, String... arguments) {
    return run(engine, "", false, arguments);
  }

  static CommandRun reading(String input, String... arguments) {
    return run(FixedEngine::new, input, false, arguments);
  }

  static CommandRun run(
      Supplier<Engine> engine, String input, boolean isTerminal, String... arguments) {
    long[] clock = new long[1];
    Session session =
        new Session(
            engine,
            new MoleculeReader(MoleculeNames.builtIn()),
            MoleculeNames.builtIn(),
            new ByteArrayInputStream(input.getBytes(StandardCharsets.UTF_8)),
            isTerminal,
            () -> clock[0] += 700_000_000L);
    CommandLine line = Foreseal.commandLine(session);
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    line.setOut(new PrintWriter(out));
    line.setErr(new PrintWriter(err));
    int code = line.execute(arguments);
    return new CommandRun(code, out.toString(), err.toString());
  }
}
