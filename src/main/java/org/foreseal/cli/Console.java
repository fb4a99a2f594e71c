package org.foreseal.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.List;
import java.util.Optional;
import org.foreseal.run.Progress;
import picocli.CommandLine;

/** Where one command writes: the result to standard output or a file, remarks to standard error. */
final class Console {
  private final PrintWriter out;
  private final PrintWriter err;
  private final CommonOptions options;
  private final Session session;

  Console(CommandLine commandLine, CommonOptions options, Session session) {
    this.out = commandLine.getOut();
    this.err = commandLine.getErr();
    this.options = options;
    this.session = session;
  }

  /** Writes the result. */
  void result(String text) throws IOException {
    Optional<Path> file = options.out();
    if (file.isPresent()) {
      writeAside(file.get(), text);
      return;
    }
    out.print(text);
    out.flush();
    if (out.checkError()) {
      throw new IOException("standard output cannot be written");
    }
  }

  /** Either the whole text or, when it cannot be written, nothing new. */
  private static void writeAside(Path file, String text) throws IOException {
    Path folder = Optional.ofNullable(file.toAbsolutePath().getParent()).orElseThrow();
    if (Files.isDirectory(file)) {
      throw new FileSystemException(file.toString(), null, "is a folder");
    }
    if (!Files.isDirectory(folder)) {
      throw new NoSuchFileException(folder.toString());
    }
    Path aside = Files.createTempFile(folder, ".foreseal-", ".part");
    try {
      Files.writeString(aside, text, StandardCharsets.UTF_8);
      move(aside, file);
    } finally {
      Files.deleteIfExists(aside);
    }
  }

  private static void move(Path from, Path to) throws IOException {
    try {
      Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
    } catch (AtomicMoveNotSupportedException e) {
      Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
    }
  }

  /** A remark about the input or the result. */
  void note(String text) {
    if (!options.isQuiet()) {
      err.print("note: " + text + "\n");
      err.flush();
    }
  }

  void notes(List<String> texts) {
    texts.forEach(this::note);
  }

  /** What is being done, for those who asked. */
  void detail(String text) {
    if (options.isVerbose() && !options.isQuiet()) {
      err.print(text + "\n");
      err.flush();
    }
  }

  /** Shown at once with {@code -v}, after a second on a terminal, else not at all. */
  Progress progress() {
    if (options.isQuiet() || !(session.isTerminal() || options.isVerbose())) {
      return Progress.SILENT;
    }
    return new ProgressLine(err, options.isVerbose(), session.nanoTime());
  }
}
