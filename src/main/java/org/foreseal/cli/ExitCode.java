package org.foreseal.cli;

/** What the tool tells the shell. */
final class ExitCode {
  static final int DONE = 0;
  static final int FAULT_OF_THE_TOOL = 1;
  static final int WRONG_USAGE = 2;
  static final int BAD_INPUT = 3;
  static final int FILE_TROUBLE = 4;
  static final int OUTSIDE_VALIDITY = 5;
  static final int CUT_BY_A_LIMIT = 6;

  /** First line of the exit codes in the help of a command. */
  static final String HELP_1 =
      "Exit codes: 0 done, 1 fault of the tool, 2 wrong usage, 3 bad input, 4 file";

  /** Second line. */
  static final String HELP_2 =
      "trouble; with --strict: 5 outside a validity range, 6 cut by a limit.";

  private ExitCode() {}
}
