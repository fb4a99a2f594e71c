package org.foreseal.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.util.Objects;
import org.foreseal.quantity.BadInputException;
import picocli.CommandLine;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.ParseResult;

/** Turns what went wrong into a message and an exit code; a stack trace only on request. */
final class Complaints implements IExecutionExceptionHandler {
  @Override
  public int handleExecutionException(
      Exception failure, CommandLine commandLine, ParseResult parseResult) {
    PrintWriter err = commandLine.getErr();
    int code = explain(failure, err);
    if (CommonOptions.wantsStackTrace(commandLine)) {
      failure.printStackTrace(err);
    }
    err.flush();
    return code;
  }

  private static int explain(Exception failure, PrintWriter err) {
    if (failure instanceof BadInputException bad) {
      err.print(bad.report() + "\n");
      return ExitCode.BAD_INPUT;
    }
    if (failure instanceof IOException io) {
      err.print(fileTrouble(io) + "\n");
      return ExitCode.FILE_TROUBLE;
    }
    if (failure instanceof UncheckedIOException unchecked) {
      err.print(fileTrouble(Objects.requireNonNull(unchecked.getCause())) + "\n");
      return ExitCode.FILE_TROUBLE;
    }
    err.print(
        "this is a fault of the tool, please report: "
            + failure.getClass().getSimpleName()
            + ": "
            + String.valueOf(failure.getMessage()).replaceAll("\\s+", " ")
            + "\n");
    return ExitCode.FAULT_OF_THE_TOOL;
  }

  private static String fileTrouble(IOException failure) {
    String file = failure instanceof FileSystemException f ? f.getFile() + ": " : "";
    if (failure instanceof NoSuchFileException) {
      return file + "no such file or folder";
    }
    if (failure instanceof AccessDeniedException) {
      return file + "not permitted";
    }
    if (failure instanceof FileSystemException f && f.getReason() != null) {
      return file + f.getReason();
    }
    return failure instanceof FileSystemException
        ? file + "cannot be read or written"
        : String.valueOf(failure.getMessage());
  }
}
