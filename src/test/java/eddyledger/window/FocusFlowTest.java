package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Component;
import java.awt.event.KeyEvent;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.swing.JLabel;
import javax.swing.JTable;
import javax.swing.text.JTextComponent;
import org.assertj.swing.edt.GuiActionRunner;
import org.junit.jupiter.api.Test;

/** Keyboard and screen reader: no trap, the same way back, and a name for all there is. */
@WindowTest
class FocusFlowTest extends WindowFlow {
  private void desk() throws IOException {
    harness.openByDialog(Harness.example(folder));
    harness.clickTile("tile-hold-row-2");
    harness.clickRow("upper-side-left-a");
  }

  /** The names that Tab comes by until it is where it began. */
  private List<String> round(int... held) {
    List<String> names = new ArrayList<>();
    String first = hands.focused();
    for (int i = 0; i < 100; i++) {
      names.add(hands.focused());
      harness.press(KeyEvent.VK_TAB, held);
      if (hands.focused().equals(first)) {
        return names;
      }
    }
    throw new AssertionError("Tab does not come round: " + names);
  }

  @Test
  void tabGoesRoundTheWholeDeskAndShiftTabTheSameWayBack() throws IOException {
    desk();
    harness.press(KeyEvent.VK_F8);
    harness.until("findings", () -> harness.shows("findings.list"));
    harness.press(KeyEvent.VK_1, KeyEvent.VK_CONTROL);
    List<String> there = round();
    assertThat(there)
        .contains(
            "tile-hold-row-2",
            "ledger",
            "picture.stack",
            "sheet.name",
            "sheet.trace",
            "findings.list",
            "findings.close",
            "status.findings")
        .doesNotContain("");
    List<String> back = round(KeyEvent.VK_SHIFT);
    Collections.reverse(back);
    Collections.rotate(back, 1);
    assertThat(back).isEqualTo(there);
  }

  @Test
  void tabGoesRoundTheStartPage() {
    hands.tabTo("start.new");
    List<String> there = round();
    assertThat(there).containsSubsequence("start.new", "start.open");
    assertThat(there).contains("start.example.quillon-82");
  }

  @Test
  void tabGoesRoundTheTrace() throws IOException {
    desk();
    harness.press(KeyEvent.VK_T, KeyEvent.VK_CONTROL);
    harness.until("the trace shows", () -> harness.shows("trace"));
    hands.tabTo("trace.band");
    List<String> there = round();
    assertThat(there)
        .containsSubsequence(
            "trace.band", "trace.show-steps", "trace.copy", "trace.back", "trace.total")
        .doesNotContain("ledger", "");
  }

  @Test
  void tilesCellsFieldsAndPictureSpeak() throws IOException {
    desk();
    for (TargetTileView tile : hands.showing(TargetTileView.class)) {
      AccessibleContext spoken = tile.getAccessibleContext();
      assertThat(spoken.getAccessibleName()).contains("dB(A)", "by");
      assertThat(spoken.getAccessibleRole()).isEqualTo(AccessibleRole.TOGGLE_BUTTON);
    }
    assertThat(harness.selectedTile()).startsWith("Row 2, Holding: 73.5 dB(A)");
    JTable table = harness.window.table("ledger").target();
    String cell =
        GuiActionRunner.execute(
            () ->
                table
                    .getAccessibleContext()
                    .getAccessibleChild(2)
                    .getAccessibleContext()
                    .getAccessibleName());
    assertThat(cell).isEqualTo("73.5 dB(A)");
    assertThat(hands.picture()).contains("73.5 dB(A)", "Top to bottom");
    List<Component> labelled =
        hands.showing(JLabel.class).stream()
            .map(JLabel::getLabelFor)
            .filter(java.util.Objects::nonNull)
            .toList();
    assertThat(hands.showing(JTextComponent.class).stream().filter(Component::isFocusable))
        .isNotEmpty()
        .allSatisfy(field -> assertThat(labelled).contains(field));
  }
}
