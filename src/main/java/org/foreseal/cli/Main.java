package org.foreseal.cli;

/** Starts the command line. */
public final class Main {
  private Main() {}

  /** Runs one command. */
  public static void main(String[] args) {
    System.exit(args.length);
  }
}
