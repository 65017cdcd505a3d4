package eddyledger;

import eddyledger.app.Projects;
import eddyledger.app.Tables;
import eddyledger.app.Workbooks;
import eddyledger.command.MainCommand;
import eddyledger.file.ProjectReader;
import java.io.Console;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;

/** The program's entry: wires everything by constructor and hands over to the command line. */
public final class Eddyledger {
  private Eddyledger() {}

  /** Starts the program; ends the process with the exit code of the command. */
  public static void main(String[] arguments) {
    PrintWriter out = writer(System.out);
    PrintWriter err = writer(System.err);
    Projects projects = new Projects(new ProjectReader());
    int code = new MainCommand(projects, new Tables(), new Workbooks(), out, err).run(arguments);
    System.exit(code);
  }

  /** A terminal is written to in its own encoding, a pipe or file in UTF-8. */
  private static PrintWriter writer(OutputStream stream) {
    Console console = System.console();
    Charset charset = console == null ? StandardCharsets.UTF_8 : console.charset();
    return new PrintWriter(new OutputStreamWriter(stream, charset), true);
  }
}
