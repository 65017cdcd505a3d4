package eddyledger.command;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;

/** What every command that reads a project takes. */
final class ProjectArguments {
  @Parameters(index = "0", paramLabel = "FILE", description = "Project file (.eddyledger).")
  Path file;

  @Option(
      names = "--fail-on",
      paramLabel = "error|warning|target",
      defaultValue = "error",
      description =
          "What ends a finished command with exit code 1: errors, errors and warnings, or errors"
              + " and missed targets (default: ${DEFAULT-VALUE}).")
  FailOn failOn;

  /**
   * Sees to it that a table is not written over the project.
   *
   * @param table where the table goes; null if none is written
   * @throws ParameterException if that is the project file itself
   */
  void spare(Path table, CommandSpec spec) {
    if (table != null && isFile(table)) {
      throw new ParameterException(
          spec.commandLine(), table + " is the project itself; name another file for the table.");
    }
  }

  /**
   * Sees to it that a workbook has a name that opens as one, and is not written over the project.
   *
   * @throws ParameterException if the name does not fit
   */
  void workbook(Path out, CommandSpec spec) {
    if (!out.toString().toLowerCase(Locale.ROOT).endsWith(".xlsx")) {
      throw new ParameterException(
          spec.commandLine(), out + " is no name for a workbook; it must end in .xlsx.");
    }
    spare(out, spec);
  }

  private boolean isFile(Path other) {
    try {
      return Files.isSameFile(file, other);
    } catch (IOException notThere) {
      return false;
    }
  }
}
