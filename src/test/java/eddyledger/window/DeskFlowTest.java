package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.ProjectReader;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.Way;
import eddyledger.model.Vehicle;
import java.awt.event.KeyEvent;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.apache.poi.ss.usermodel.Workbook;
import org.apache.poi.ss.usermodel.WorkbookFactory;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A day at the desk, by keys and mouse: open, change, look, undo, save, reopen, export. */
@WindowTest
class DeskFlowTest {
  private static final String PANEL = "upper-side-left-a";

  @TempDir private Path folder;
  private Harness harness;
  private Path example;

  @BeforeEach
  void open() throws IOException {
    harness = new Harness(1440, 900);
    example = Harness.example(folder);
    harness.openByDialog(example);
  }

  @AfterEach
  void close() {
    harness.close();
  }

  private String level() {
    return harness.window.label("sheet.level").text();
  }

  private void typeThickness(String text) {
    harness.window.textBox("sheet.thickness").click().selectAll().enterText(text);
    harness.ready();
  }

  @Test
  void aThicknessIsChangedUndoneRedoneSavedReopenedAndExported() throws IOException {
    harness.clickRow(PANEL);
    String before = harness.row(PANEL);
    String stripBefore = harness.strip(PANEL);
    String tileBefore = harness.selectedTile();

    typeThickness("2.8");
    String after = harness.row(PANEL);
    assertThat(after).isNotEqualTo(before);
    assertThat(harness.strip(PANEL)).isNotEqualTo(stripBefore);
    assertThat(harness.selectedTile()).isNotEqualTo(tileBefore);
    assertThat(harness.window.target().getTitle()).contains("changed");

    harness.press(KeyEvent.VK_Z, KeyEvent.VK_CONTROL);
    harness.ready();
    assertThat(harness.row(PANEL)).isEqualTo(before);
    assertThat(harness.window.target().getTitle()).doesNotContain("changed");

    harness.press(KeyEvent.VK_Y, KeyEvent.VK_CONTROL);
    harness.ready();
    assertThat(harness.row(PANEL)).isEqualTo(after);

    harness.press(KeyEvent.VK_S, KeyEvent.VK_CONTROL);
    harness.until("saved", () -> !harness.window.target().getTitle().contains("changed"));
    Vehicle saved = new ProjectReader().read(example).vehicle().orElseThrow();
    double level =
        Ledger.of(saved)
            .sheet("hold", "row-2")
            .orElseThrow()
            .row(PANEL, Way.ALL)
            .orElseThrow()
            .levelA();
    assertThat(after).contains(String.format("%.1f", level));

    harness.press(KeyEvent.VK_W, KeyEvent.VK_CONTROL);
    harness.openByDialog(example);
    harness.clickTile("tile-hold-row-2");
    harness.clickRow(PANEL);
    assertThat(harness.row(PANEL)).isEqualTo(after);

    Path workbook = folder.resolve("budget.xlsx");
    harness.press(KeyEvent.VK_E, KeyEvent.VK_CONTROL);
    harness.type(workbook);
    harness.until("the workbook is written", () -> Files.exists(workbook));
    try (Workbook read = WorkbookFactory.create(workbook.toFile())) {
      assertThat(read.getNumberOfSheets()).isGreaterThanOrEqualTo(5);
    }
  }

  @Test
  void typingANumberIsOneStepAndNamedInTheMenu() {
    harness.clickRow(PANEL);
    typeThickness("2.85");
    assertThat(harness.menuText("menu.edit", "menu.edit.undo"))
        .startsWith("Undo thickness of Upper side left, station A");
    harness.press(KeyEvent.VK_Z, KeyEvent.VK_CONTROL);
    harness.ready();
    assertThat(harness.menuText("menu.edit", "menu.edit.undo")).isEqualTo("Undo");
    assertThat(harness.window.textBox("sheet.thickness").text()).isEqualTo("1.4");
  }

  @Test
  void quittingWithUnsavedWorkAsksAndCancelKeepsTheWindow() {
    harness.clickRow(PANEL);
    typeThickness("2.8");
    harness.press(KeyEvent.VK_Q, KeyEvent.VK_CONTROL);
    harness.window.dialog().button(harness.labelled("Cancel")).click();
    assertThat(harness.closed()).isFalse();
    harness.press(KeyEvent.VK_Q, KeyEvent.VK_CONTROL);
    harness.window.dialog().button(harness.labelled("Discard")).click();
    harness.until("closed", harness::closed);
  }

  @Test
  void theKeysWalkTheDesk() {
    String first = harness.selectedTile();
    harness.press(KeyEvent.VK_F6);
    assertThat(harness.selectedTile()).isNotEqualTo(first);
    String condition = harness.selectedTile();
    harness.press(KeyEvent.VK_F7);
    assertThat(harness.selectedTile()).isNotEqualTo(condition);

    harness.press(KeyEvent.VK_F8);
    harness.untilShown("findings.list");
    assertThat(harness.window.list("findings.list").target().getSelectedIndex()).isZero();
    harness.press(KeyEvent.VK_F8);
    assertThat(harness.window.list("findings.list").target().getSelectedIndex()).isEqualTo(1);

    assertThat(harness.window.toggleButton("picture.stack").target().isSelected()).isTrue();
    harness.press(KeyEvent.VK_P, KeyEvent.VK_CONTROL);
    assertThat(harness.window.toggleButton("picture.spectrum").target().isSelected()).isTrue();

    harness.press(KeyEvent.VK_3, KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT);
    harness.untilHidden("ledger");
    harness.press(KeyEvent.VK_3, KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT);
    harness.untilShown("ledger");
  }

  @Test
  void theTraceOpensAndGoesBack() {
    harness.clickRow(PANEL);
    harness.press(KeyEvent.VK_T, KeyEvent.VK_CONTROL);
    harness.untilHidden("ledger");
    harness.untilShown("trace.back");
    harness.press(KeyEvent.VK_ESCAPE);
    harness.untilShown("ledger");
  }

  @Test
  void aPanelIsAddedAndTakenOut() {
    harness.press(KeyEvent.VK_P, KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT);
    harness.ready();
    assertThat(harness.window.textBox("sheet.name").text()).isEqualTo("New panel");
    harness.press(KeyEvent.VK_DELETE, KeyEvent.VK_CONTROL);
    harness.ready();
    assertThat(harness.rows()).noneMatch(row -> row.contains("New panel"));
  }
}
