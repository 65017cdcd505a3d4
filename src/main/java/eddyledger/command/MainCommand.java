package eddyledger.command;

import eddyledger.app.Projects;
import eddyledger.app.Tables;
import eddyledger.app.Workbooks;
import java.io.PrintWriter;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** The program's command line with all its commands. */
@Command(
    name = "eddyledger",
    mixinStandardHelpOptions = true,
    versionProvider = Version.class,
    description = {
      "Predicts what the flow over every panel of a vehicle adds to the level at every seat,",
      "and holds the sum against targets."
    },
    footer = {
      "",
      "Exit codes: 0 done; 1 done, with findings or a missed target (see --fail-on); 2 the input"
          + " cannot be used; 64 wrong usage; 70 internal fault."
    })
public final class MainCommand implements Runnable {
  private final CommandLine line;
  private final WindowStarter window;

  /**
   * The command line.
   *
   * @param projects opens project files
   * @param tables writes tables
   * @param workbooks writes workbooks
   * @param window opens the window
   * @param out where results go
   * @param err where complaints go
   */
  public MainCommand(
      Projects projects,
      Tables tables,
      Workbooks workbooks,
      WindowStarter window,
      PrintWriter out,
      PrintWriter err) {
    this.window = window;
    line =
        new CommandLine(this)
            .addSubcommand(new CheckCommand(projects))
            .addSubcommand(new LedgerCommand(projects, tables, workbooks))
            .addSubcommand(new TraceCommand(projects, tables))
            .addSubcommand(new WorkbookCommand(projects, workbooks))
            .addSubcommand(new WindowCommand(window));
    line.setOut(out);
    line.setErr(err);
    line.setCaseInsensitiveEnumValuesAllowed(true);
    line.setParameterExceptionHandler(new UsageFaults());
    line.setExecutionExceptionHandler(new Complaints());
    line.setUsageHelpAutoWidth(true);
  }

  /** Runs the command line and gives its exit code; never throws. */
  public int run(String... arguments) {
    int code = execute(arguments);
    line.getOut().flush();
    line.getErr().flush();
    return code;
  }

  private int execute(String... arguments) {
    try {
      return line.execute(arguments);
    } catch (Error e) {
      // the parser hands on exceptions only
      return Complaints.fault(e, line.getErr());
    }
  }

  /** Without a command the window opens, or help is given where there is no display. */
  @Override
  public void run() {
    if (window.possible()) {
      window.open(null);
    } else {
      line.usage(line.getOut());
    }
  }
}
