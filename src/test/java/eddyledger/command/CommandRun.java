package eddyledger.command;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.Projects;
import eddyledger.app.Tables;
import eddyledger.app.Workbooks;
import eddyledger.file.ProjectReader;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;

/**
 * What one run of the command line left behind.
 *
 * @param code exit code
 * @param out standard output
 * @param err standard error
 */
record CommandRun(int code, String out, String err) {
  static final String EXAMPLE = "examples/quillon-82.eddyledger";

  /** Runs the whole command line, as the program does. */
  static CommandRun of(Object... arguments) {
    StringWriter out = new StringWriter();
    return of(new Projects(new ProjectReader()), new PrintWriter(out), out, arguments);
  }

  /** Runs it with another opener and another standard output. */
  static CommandRun of(
      Projects projects, PrintWriter writer, StringWriter out, Object... arguments) {
    StringWriter err = new StringWriter();
    String[] words = Arrays.stream(arguments).map(String::valueOf).toArray(String[]::new);
    PrintWriter complaints = new PrintWriter(err);
    int code =
        new MainCommand(
                projects, new Tables(), new Workbooks(), new NoDisplay(), writer, complaints)
            .run(words);
    return new CommandRun(code, out.toString(), err.toString());
  }

  /** Writes a project into a folder. */
  static Path project(Path folder, String text) {
    try {
      return Files.writeString(folder.resolve("vehicle.eddyledger"), text);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The command was done: nothing on standard error. */
  CommandRun done(int expected) {
    assertThat(err).isEmpty();
    assertThat(code).as(out).isEqualTo(expected);
    assertThat(out).isNotBlank().doesNotContain("\tat ", "Exception", "-0.0 ", "NaN", "Infinity");
    return this;
  }

  /** The command was refused: nothing on standard output, one readable block on the other. */
  CommandRun refused(int expected) {
    assertThat(out).isEmpty();
    return complained(expected);
  }

  /** The command ended with a complaint, whatever was printed before. */
  CommandRun complained(int expected) {
    assertThat(code).as(err).isEqualTo(expected);
    assertThat(err).isNotBlank().doesNotContain("\tat ", "Exception", "java.");
    assertThat(err.strip().lines()).noneMatch(String::isBlank).hasSizeLessThan(12);
    assertThat(out).doesNotContain("\tat ", "Exception");
    return this;
  }

  List<String> lines() {
    return out.lines().toList();
  }
}
