package eddyledger.command;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.SmallFile;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Files that cannot be read or written: exit code 2, a sentence, and nothing harmed. */
class UnusableInputTest {
  @TempDir private Path folder;

  @ParameterizedTest
  @ValueSource(strings = {"check", "ledger", "trace"})
  void noSuchFile(String command) {
    assertRefused(command, folder.resolve("none.eddyledger"), "There is no such file.");
  }

  @ParameterizedTest
  @ValueSource(strings = {"check", "ledger", "trace"})
  void aFolder(String command) {
    assertRefused(command, folder, "It is a folder, not a file.");
  }

  @ParameterizedTest
  @ValueSource(strings = {"check", "ledger", "trace"})
  void aFileCutOff(String command) {
    String text = SmallFile.text();
    Path cut = CommandRun.project(folder, text.substring(0, text.length() / 2));
    assertRefused(command, cut, "vehicle.eddyledger");
  }

  @ParameterizedTest
  @CsvSource({"check, 2", "ledger, 2", "trace, 7"})
  void aNewerVersion(String command, int version) {
    SmallFile newer = new SmallFile().with("format_version", Integer.toString(version));
    Path file = CommandRun.project(folder, newer.root().toString());
    assertRefused(command, file, "has format version " + version, "newer Eddyledger");
  }

  @ParameterizedTest
  @ValueSource(strings = {"conditions", "receivers", "tree"})
  void nothingToCompute(String group) {
    Path file = CommandRun.project(folder, new SmallFile().with(group, "[]").root().toString());
    CommandRun run = CommandRun.of("ledger", file);
    assertThat(run.code()).as(run.err()).isEqualTo(ExitCode.UNUSABLE);
    assertThat(run.out()).isEmpty();
    assertThat(run.err()).startsWith("The input cannot be used.").contains(group);
    assertThat(run.err()).doesNotContain("\tat ", "Exception");
  }

  private static void assertRefused(String command, Path file, String... words) {
    Object[] arguments =
        command.equals("trace")
            ? new Object[] {command, file, "window"}
            : new Object[] {command, file};
    String err = CommandRun.of(arguments).refused(ExitCode.UNUSABLE).err();
    assertThat(err).startsWith("The input cannot be used.").contains(words);
  }

  @Test
  void aTableIntoAFolderThatIsNotThere() {
    Path file = CommandRun.project(folder, SmallFile.text());
    Path table = folder.resolve("nowhere").resolve("table.csv");
    for (CommandRun run :
        new CommandRun[] {
          CommandRun.of("ledger", file, "--csv", table),
          CommandRun.of("trace", file, "window", "--csv", table)
        }) {
      run.complained(ExitCode.UNUSABLE);
      assertThat(run.err()).contains(table.toString(), "there is no such folder", "Make it");
      assertThat(run.out()).doesNotContain("Written:");
    }
    assertThat(table.getParent()).doesNotExist();
  }

  @Test
  void aTableInPlaceOfAFolderOrBelowAFile() throws IOException {
    Path file = CommandRun.project(folder, SmallFile.text());
    Path taken = Files.createDirectory(folder.resolve("taken"));
    Path inside = Files.writeString(taken.resolve("old.csv"), "old");
    CommandRun run = CommandRun.of("ledger", file, "--csv", taken).complained(ExitCode.UNUSABLE);
    assertThat(run.err()).contains(taken.toString(), "it is a folder", "name another file");
    CommandRun.of("ledger", file, "--csv", inside.resolve("table.csv"))
        .complained(ExitCode.UNUSABLE);
    assertThat(inside).hasContent("old");
    try (var left = Files.list(folder)) {
      assertThat(left).containsExactlyInAnyOrder(file, taken);
    }
  }
}
