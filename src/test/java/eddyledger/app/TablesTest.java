package eddyledger.app;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import eddyledger.file.LedgerCsv;
import eddyledger.file.SmallFile;
import eddyledger.file.TraceCsv;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.Trace;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.assertj.core.api.ThrowableAssert.ThrowingCallable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Tables are written whole or not at all; a failure is told in a sentence and harms nothing. */
class TablesTest {
  private static final Ledger LEDGER = Ledger.of(new SmallFile().vehicle());
  private static final Trace TRACE = LEDGER.trace("window", "cruise", "driver").orElseThrow();

  private final Tables tables = new Tables();

  @TempDir private Path folder;

  private List<Path> left() throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.toList();
    }
  }

  @Test
  void theOldTableIsReplaced() throws IOException {
    Path file = Files.writeString(folder.resolve("table.csv"), "old");
    tables.writeLedger(LEDGER.sheets(), file);
    assertThat(Files.readString(file)).isEqualTo(LedgerCsv.text(LEDGER.sheets()));
    tables.writeTrace(TRACE, file);
    assertThat(Files.readString(file)).isEqualTo(TraceCsv.text(TRACE));
    assertThat(left()).containsExactly(file);
  }

  @Test
  void intoAFolderThatIsNotThere() throws IOException {
    Path file = folder.resolve("none").resolve("table.csv");
    for (ThrowingCallable write : writing(file)) {
      assertThatThrownBy(write)
          .isInstanceOf(WriteFailure.class)
          .hasMessage(
              file + " cannot be written: there is no such folder. Make it, or name another.")
          .hasCauseInstanceOf(IOException.class);
    }
    assertThat(left()).isEmpty();
  }

  @Test
  void inPlaceOfAFolder() throws IOException {
    Path inside = Files.writeString(folder.resolve("old.csv"), "old");
    for (ThrowingCallable write : writing(folder)) {
      assertThatThrownBy(write)
          .isInstanceOf(WriteFailure.class)
          .hasMessage(
              folder
                  + " cannot be written: "
                  + folder
                  + ": it is a folder. Close it elsewhere, check your rights, or name another"
                  + " file.");
    }
    assertThat(inside).hasContent("old");
    assertThat(left()).containsExactly(inside);
  }

  @Test
  void whereNothingNewCanBeMadeTheOldTableStays() throws IOException {
    assumeTrue(System.getProperty("os.name").equals("Linux"), "paths have another greatest length");
    // so deep that the old table's path is still allowed, and that of a temporary file no more
    Path deep = folder;
    while (deep.toString().length() < 4070) {
      int more = Math.min(200, 4075 - deep.toString().length() - 1);
      deep = deep.resolve("d".repeat(more));
    }
    Path file = Files.createDirectories(deep).resolve("old.csv");
    Files.writeString(file, "old");
    for (ThrowingCallable write : writing(file)) {
      assertThatThrownBy(write)
          .isInstanceOf(WriteFailure.class)
          .hasMessageStartingWith(file + " cannot be written: ")
          .hasMessageEndingWith("check your rights, or name another file.");
    }
    assertThat(Files.readString(file)).isEqualTo("old");
    try (Stream<Path> files = Files.list(deep)) {
      assertThat(files).containsExactly(file);
    }
  }

  private List<ThrowingCallable> writing(Path file) {
    return List.of(
        () -> tables.writeLedger(LEDGER.sheets(), file), () -> tables.writeTrace(TRACE, file));
  }
}
