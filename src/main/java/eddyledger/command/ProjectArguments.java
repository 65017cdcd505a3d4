package eddyledger.command;

import java.nio.file.Path;
import picocli.CommandLine.Option;
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
}
