package eddyledger.app;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is kept of an internal fault, and what is said where nothing can be kept. */
class FaultReportTest {
  @TempDir private Path folder;

  private List<Path> reports() throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.toList();
    }
  }

  @Test
  void theReportHoldsFaultAndCauseAndIsNamed() throws IOException {
    Throwable fault = new IllegalStateException("made up", new ArithmeticException("behind it"));
    String sentence = new FaultReport(folder).write(fault);
    Path report = reports().get(0);
    assertThat(reports()).hasSize(1);
    assertThat(report.getFileName().toString()).matches("eddyledger-fault-.*\\.txt");
    assertThat(sentence)
        .isEqualTo(
            "A report is in " + report + "; please send it to whoever looks after the program.");
    assertThat(Files.readString(report))
        .startsWith("Eddyledger, internal fault at 20")
        .contains("Java " + System.getProperty("java.version"), System.getProperty("os.name"))
        .contains("java.lang.IllegalStateException: made up", "Caused by: ", "behind it")
        .contains("\tat eddyledger.app.FaultReportTest.");
  }

  @Test
  void everyFaultHasItsOwnReport() throws IOException {
    FaultReport report = new FaultReport(folder);
    String first = report.write(new IllegalStateException("one"));
    String second = report.write(new IllegalStateException("two"));
    assertThat(first).isNotEqualTo(second);
    assertThat(reports()).hasSize(2);
  }

  @Test
  void whereNoReportCanBeWrittenTheSentenceSaysTheFault() throws IOException {
    Path nowhere = folder.resolve("none");
    String sentence = new FaultReport(nowhere).write(new IllegalStateException("made up"));
    assertThat(sentence)
        .startsWith("No report could be written (")
        .contains(nowhere.toString())
        .endsWith("What it would say: java.lang.IllegalStateException: made up");
    assertThat(reports()).isEmpty();
  }
}
