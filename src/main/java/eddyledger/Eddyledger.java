package eddyledger;

import eddyledger.app.Examples;
import eddyledger.app.FaultReport;
import eddyledger.app.Projects;
import eddyledger.app.RecentFiles;
import eddyledger.app.Tables;
import eddyledger.app.Workbooks;
import eddyledger.command.MainCommand;
import eddyledger.file.ProjectReader;
import eddyledger.window.Services;
import eddyledger.window.WindowStart;
import java.io.Console;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.prefs.Preferences;

/** The program's entry: wires everything by constructor and hands over to the command line. */
public final class Eddyledger {
  private Eddyledger() {}

  /** Starts the program; ends the process with the exit code of the command. */
  public static void main(String[] arguments) {
    PrintWriter out = writer(System.out);
    PrintWriter err = writer(System.err);
    ProjectReader reader = new ProjectReader();
    Projects projects = new Projects(reader);
    Tables tables = new Tables();
    Workbooks workbooks = new Workbooks();
    WindowStart window =
        new WindowStart(
            () ->
                new Services(
                    projects,
                    tables,
                    workbooks,
                    new RecentFiles(),
                    new Examples(reader),
                    new FaultReport(),
                    Preferences.userRoot().node("eddyledger/window")));
    if (arguments.length == 0 || arguments[0].equals("window")) {
      window.prepare();
    }
    int code = new MainCommand(projects, tables, workbooks, window, out, err).run(arguments);
    System.exit(code);
  }

  /** A terminal is written to in its own encoding, a pipe or file in UTF-8. */
  private static PrintWriter writer(OutputStream stream) {
    Console console = System.console();
    Charset charset = console == null ? StandardCharsets.UTF_8 : console.charset();
    return new PrintWriter(new OutputStreamWriter(stream, charset), true);
  }
}
