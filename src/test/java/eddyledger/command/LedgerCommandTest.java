package eddyledger.command;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.Projects;
import eddyledger.app.Tables;
import eddyledger.app.Workbooks;
import eddyledger.file.ProjectReader;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The ledger and trace commands on the example: what they print, write and end with. */
class LedgerCommandTest {
  private static final String EXAMPLE = "examples/quillon-82.eddyledger";

  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();

  private int run(String... arguments) {
    Projects projects = new Projects(new ProjectReader());
    return new MainCommand(
            projects,
            new Tables(),
            new Workbooks(),
            new NoDisplay(),
            new PrintWriter(out),
            new PrintWriter(err))
        .run(arguments);
  }

  @Test
  void theWorstMarginIsMarkedOnceAndTheRangeStandsBelow() {
    assertThat(run("ledger", EXAMPLE, "--condition", "cruise", "--receiver", "row-9")).isZero();
    assertThat(out.toString()).containsOnlyOnce("<- worst margin").doesNotContain("-0.0 ");
    assertThat(out.toString())
        .contains("model range of the total", "orders-1-1", "orders-2-1-correlation-length")
        .contains("spectrum-goody", "spectrum-efimtsov", "half-power-width", "Budget figures");
    assertThat(err.toString()).isEmpty();
  }

  @Test
  void aMissedTargetFailsOnlyIfAskedFor() {
    assertThat(run("ledger", EXAMPLE, "--fail-on", "target")).isEqualTo(ExitCode.FINDINGS);
    assertThat(run("check", EXAMPLE, "--fail-on", "warning")).isEqualTo(ExitCode.FINDINGS);
    assertThat(run("check", EXAMPLE)).isZero();
  }

  @Test
  void tablesAreWrittenWhereAsked(@TempDir Path folder) throws IOException {
    Path ledger = folder.resolve("ledger.csv");
    Path trace = folder.resolve("trace.csv");
    assertThat(run("ledger", EXAMPLE, "--csv", ledger.toString())).isZero();
    assertThat(run("trace", EXAMPLE, "crown-c", "--csv", trace.toString())).isZero();
    assertThat(Files.readString(ledger)).contains("cruise,row-2,", "hold,row-16,");
    assertThat(Files.readString(trace)).startsWith("band,x,").contains("\r\n12500,11,");
    assertThat(out.toString()).contains("Worst margin: row-2 in hold.");
  }

  @Test
  void theWorkbookIsWrittenBesideTheTable(@TempDir Path folder) {
    Path workbook = folder.resolve("budget.xlsx");
    assertThat(run("ledger", EXAMPLE, "--workbook", workbook.toString())).isZero();
    assertThat(workbook).isNotEmptyFile();
    assertThat(out.toString()).contains("Written: " + workbook, "<- worst margin");
    assertThat(run("ledger", EXAMPLE, "--workbook", folder.resolve("budget.ods").toString()))
        .isEqualTo(ExitCode.USAGE);
    assertThat(err.toString()).contains("must end in .xlsx");
  }

  @Test
  void withoutADisplayTheWindowIsRefusedAndNothingElse() {
    assertThat(run("window", EXAMPLE)).isEqualTo(ExitCode.USAGE);
    assertThat(err.toString()).contains("no display");
    assertThat(run()).isZero();
    assertThat(out.toString()).contains("Usage: eddyledger");
  }

  @Test
  void aTableThatCannotBeWrittenIsSaidAndHarmsNothing(@TempDir Path folder) {
    String nowhere = folder.resolve("none").resolve("ledger.csv").toString();
    assertThat(run("ledger", EXAMPLE, "--csv", nowhere)).isEqualTo(ExitCode.UNUSABLE);
    assertThat(err.toString()).contains("no such folder").doesNotContain("\tat ", "Exception");
    assertThat(folder).isEmptyDirectory();
  }

  @Test
  void everyCommandHasHelp() {
    for (String command : new String[] {"check", "ledger", "trace", "workbook", "window"}) {
      assertThat(run(command, "--help")).isZero();
    }
    assertThat(out.toString()).contains("--condition", "--csv", "--fail-on", "PANEL-ID");
  }
}
