package eddyledger.command;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.Projects;
import eddyledger.file.ProjectReader;
import eddyledger.file.SmallFile;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A fault of the program itself: exit code 70, a report file, and no stack trace. */
class InternalFaultTest {
  @TempDir private Path folder;

  @Test
  void anUnexpectedExceptionWhileReading() throws IOException {
    StringWriter out = new StringWriter();
    // an opener without a reader fails in a way that no caller expects
    Projects broken = new Projects(null);
    CommandRun run = CommandRun.of(broken, new PrintWriter(out), out, "check", "any.eddyledger");
    assertReported(run.refused(ExitCode.FAULT), NullPointerException.class);
  }

  @Test
  void anUnexpectedExceptionWhilePrinting() throws IOException {
    assertReported(printing(new IllegalStateException("made up")), IllegalStateException.class);
  }

  @Test
  void anErrorOfTheMachine() throws IOException {
    assertReported(printing(new StackOverflowError("made up")), StackOverflowError.class);
  }

  private CommandRun printing(Throwable fault) {
    Path file = CommandRun.project(folder, SmallFile.text());
    StringWriter out = new StringWriter();
    PrintWriter broken =
        new PrintWriter(out) {
          @Override
          public void println(String line) {
            if (fault instanceof Error error) {
              throw error;
            }
            throw (RuntimeException) fault;
          }
        };
    return CommandRun.of(new Projects(new ProjectReader()), broken, out, "ledger", file)
        .refused(ExitCode.FAULT);
  }

  private static void assertReported(CommandRun run, Class<?> fault) throws IOException {
    assertThat(run.err()).contains("inside the program", "your files are as they were");
    Matcher named = Pattern.compile("A report is in (.+\\.txt);").matcher(run.err());
    assertThat(named.find()).as(run.err()).isTrue();
    Path report = Path.of(named.group(1));
    try {
      assertThat(report).isRegularFile();
      assertThat(Files.readString(report)).contains(fault.getName(), "\tat eddyledger.", "Java ");
    } finally {
      Files.deleteIfExists(report);
    }
  }
}
