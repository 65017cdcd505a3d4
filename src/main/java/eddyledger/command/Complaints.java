package eddyledger.command;

import eddyledger.app.FaultReport;
import eddyledger.app.WriteFailure;
import java.io.PrintWriter;
import picocli.CommandLine;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.ParseResult;

/** Turns what stopped a command into one readable block and an exit code; never a stack trace. */
final class Complaints implements IExecutionExceptionHandler {
  @Override
  public int handleExecutionException(Exception e, CommandLine command, ParseResult parsed) {
    PrintWriter err = command.getErr();
    if (e instanceof UnusableInput input) {
      err.println("The input cannot be used.");
      FindingsText.lines(input.findings()).forEach(err::println);
      return ExitCode.UNUSABLE;
    }
    if (e instanceof UnknownName) {
      err.println(e.getMessage());
      return ExitCode.USAGE;
    }
    if (e instanceof WriteFailure) {
      err.println(e.getMessage());
      return ExitCode.UNUSABLE;
    }
    return fault(e, err);
  }

  /** Says that the program itself is at fault, and where the report is. */
  static int fault(Throwable e, PrintWriter err) {
    err.println("Something went wrong inside the program; your files are as they were.");
    err.println(new FaultReport().write(e));
    return ExitCode.FAULT;
  }
}
