package eddyledger.command;

import static eddyledger.command.CommandRun.EXAMPLE;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The workbook command: what it writes, prints and ends with. */
class WorkbookCommandTest {
  @TempDir private Path folder;

  @Test
  void theWorkbookIsWrittenAndSaid() throws IOException {
    Path out = folder.resolve("budget.xlsx");
    CommandRun run = CommandRun.of("workbook", EXAMPLE, out).done(ExitCode.DONE);
    assertThat(run.out())
        .startsWith("Written: " + out)
        .contains("0 errors, 2 warnings, 4 notes", "Budget figures for engineering use");
    try (XSSFWorkbook workbook = new XSSFWorkbook(Files.newInputStream(out))) {
      assertThat(workbook.getSheetName(0)).isEqualTo("summary");
    }
    assertThat(folder).isDirectoryContaining(file -> file.equals(out));
    try (var files = Files.list(folder)) {
      assertThat(files).as("no temporary is left").hasSize(1);
    }
  }

  @Test
  void aMissedTargetFailsOnlyIfAskedFor() {
    Path out = folder.resolve("budget.xlsx");
    CommandRun.of("workbook", EXAMPLE, out, "--fail-on", "target").done(ExitCode.FINDINGS);
    assertThat(out).exists();
  }

  @Test
  void theProjectItselfIsNeverWrittenOver() throws IOException {
    Path project = folder.resolve("vehicle.xlsx");
    Files.copy(Path.of(EXAMPLE), project);
    byte[] before = Files.readAllBytes(project);
    CommandRun run = CommandRun.of("workbook", project, project).refused(ExitCode.USAGE);
    assertThat(run.err()).contains("is the project itself");
    assertThat(Files.readAllBytes(project)).isEqualTo(before);
  }

  @Test
  void anotherEndingIsWrongUsage() {
    Path out = folder.resolve("budget.xls");
    CommandRun run = CommandRun.of("workbook", EXAMPLE, out).refused(ExitCode.USAGE);
    assertThat(run.err()).contains("must end in .xlsx");
    assertThat(folder).isEmptyDirectory();
  }

  @Test
  void aFolderThatIsNotThereIsSaid() {
    Path out = folder.resolve("none").resolve("budget.xlsx");
    CommandRun run = CommandRun.of("workbook", EXAMPLE, out).refused(ExitCode.UNUSABLE);
    assertThat(run.err()).contains("no such folder");
    assertThat(folder).isEmptyDirectory();
  }

  @Test
  void aFolderInItsPlaceIsSaidAndLeftAlone() throws IOException {
    Path out = Files.createDirectory(folder.resolve("budget.xlsx"));
    CommandRun run = CommandRun.of("workbook", EXAMPLE, out).refused(ExitCode.UNUSABLE);
    assertThat(run.err()).contains("it is a folder");
    assertThat(out).isEmptyDirectory();
  }
}
