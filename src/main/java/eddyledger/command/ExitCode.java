package eddyledger.command;

/** Exit codes of every command. */
final class ExitCode {
  /** Done, nothing to report. */
  static final int DONE = 0;

  /** Done, with findings at or above the level asked for, or with a target missed. */
  static final int FINDINGS = 1;

  /** The input cannot be used. */
  static final int UNUSABLE = 2;

  /** Wrong usage of the command line. */
  static final int USAGE = 64;

  /** Internal fault; a report file is named. */
  static final int FAULT = 70;

  private ExitCode() {}
}
