package eddyledger.command;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Opens the window. */
@Command(
    name = "window",
    mixinStandardHelpOptions = true,
    description = "Opens the window, with a project if one is named; ends when it is closed.")
final class WindowCommand implements Callable<Integer> {
  private final WindowStarter starter;

  @Parameters(
      index = "0",
      arity = "0..1",
      paramLabel = "FILE",
      description = "Project file (.eddyledger).")
  private Path file;

  @Spec private CommandSpec spec;

  WindowCommand(WindowStarter starter) {
    this.starter = starter;
  }

  @Override
  public Integer call() {
    if (!starter.possible()) {
      throw new ParameterException(
          spec.commandLine(),
          "There is no display to open a window on; the other commands need none.");
    }
    starter.open(file);
    return ExitCode.DONE;
  }
}
