package eddyledger.command;

import java.io.PrintWriter;
import picocli.CommandLine;
import picocli.CommandLine.IParameterExceptionHandler;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** Says what is wrong with the words of a command line, and where help is. */
final class UsageFaults implements IParameterExceptionHandler {
  @Override
  public int handleParseException(ParameterException e, String[] arguments) {
    CommandLine command = e.getCommandLine();
    PrintWriter err = command.getErr();
    err.println(e.getMessage());
    UnmatchedArgumentException.printSuggestions(e, err);
    err.println("Try '" + command.getCommandSpec().qualifiedName() + " --help' for what it takes.");
    return ExitCode.USAGE;
  }
}
