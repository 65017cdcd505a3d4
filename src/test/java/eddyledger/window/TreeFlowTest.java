package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.event.KeyEvent;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** Many steps at the tree and the sheet, all the way back and forth again. */
@WindowTest
class TreeFlowTest extends WindowFlow {
  private static final String PANEL = "upper-side-left-a";

  @BeforeEach
  void open() throws IOException {
    harness.openByDialog(Harness.example(folder));
    harness.clickTile("tile-hold-row-2");
    harness.clickRow(PANEL);
  }

  private void key(int key, int... held) {
    harness.press(key, held);
    harness.ready();
  }

  /** What the whole ledger says, whatever is open. */
  private List<String> ledger() {
    harness.openAllRows();
    return harness.rows();
  }

  @Test
  void everyStepIsTakenBackAndDoneAgainInOrder() {
    List<Runnable> steps =
        List.of(
            () -> hands.change("thickness", "2"),
            () -> key(KeyEvent.VK_D, KeyEvent.VK_CONTROL),
            () -> hands.change("count", "4"),
            () -> key(KeyEvent.VK_P, KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT),
            () -> hands.change("name", "Extra"),
            () -> key(KeyEvent.VK_DELETE, KeyEvent.VK_CONTROL),
            () -> key(KeyEvent.VK_G, KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT));
    List<List<String>> states = new ArrayList<>();
    states.add(ledger());
    for (Runnable step : steps) {
      step.run();
      states.add(ledger());
      assertThat(states.get(states.size() - 1)).isNotEqualTo(states.get(states.size() - 2));
    }
    for (int i = steps.size() - 1; i >= 0; i--) {
      key(KeyEvent.VK_Z, KeyEvent.VK_CONTROL);
      assertThat(ledger()).as("before step " + i).isEqualTo(states.get(i));
    }
    assertThat(hands.title()).doesNotContain("changed");
    key(KeyEvent.VK_Z, KeyEvent.VK_CONTROL);
    assertThat(ledger()).as("nothing is left to undo").isEqualTo(states.get(0));
    for (int i = 1; i < states.size(); i++) {
      key(KeyEvent.VK_Y, KeyEvent.VK_CONTROL);
      assertThat(ledger()).as("after step " + i).isEqualTo(states.get(i));
    }
    assertThat(hands.title()).contains("changed");
  }

  @Test
  void aCopyIsBesideItsPanelAndJustAsLoud() {
    String level = harness.row(PANEL).split("\\|")[2];
    key(KeyEvent.VK_D, KeyEvent.VK_CONTROL);
    assertThat(hands.field("name")).isEqualTo("Upper side left, station A, copy");
    String copy = harness.rows().stream().filter(row -> row.contains("copy")).findFirst().get();
    assertThat(copy.split("\\|")[2]).isEqualTo(level);
    key(KeyEvent.VK_DELETE, KeyEvent.VK_CONTROL);
    assertThat(harness.rows()).noneMatch(row -> row.contains("copy"));
  }

  @Test
  void aSectionThatIsTakenOutTakesItsPanelsAlong() {
    harness.clickRow("station-a");
    key(KeyEvent.VK_DELETE, KeyEvent.VK_CONTROL);
    assertThat(harness.rows()).noneMatch(row -> row.contains("tation A"));
    assertThat(harness.row("quillon-82")).doesNotContain("73.5");
    assertThat(hands.field("name")).isEqualTo("Quillon 82");
    key(KeyEvent.VK_Z, KeyEvent.VK_CONTROL);
    assertThat(harness.row(PANEL)).contains("61.0 dB(A)");
    assertThat(harness.row("quillon-82")).contains("73.5 dB(A)");
  }

  @Test
  void aNewStepForgetsWhatWasTakenBack() {
    hands.change("count", "12");
    key(KeyEvent.VK_Z, KeyEvent.VK_CONTROL);
    assertThat(harness.menuText("menu.edit", "menu.edit.redo"))
        .startsWith("Redo count of Upper side left");
    hands.change("thickness", "1.5");
    assertThat(harness.menuText("menu.edit", "menu.edit.redo")).isEqualTo("Redo");
    key(KeyEvent.VK_Y, KeyEvent.VK_CONTROL);
    assertThat(hands.field("count")).isEqualTo("33");
  }
}
