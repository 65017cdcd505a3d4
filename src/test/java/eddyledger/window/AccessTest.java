package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Component;
import java.awt.KeyboardFocusManager;
import java.awt.event.KeyEvent;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import javax.swing.JScrollPane;
import javax.swing.JSplitPane;
import org.assertj.swing.edt.GuiActionRunner;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Names for screen readers, and where the Tab key goes. */
@WindowTest
class AccessTest {
  @TempDir private Path folder;
  private Harness harness;

  @BeforeEach
  void open() {
    harness = new Harness(1440, 900);
  }

  @AfterEach
  void close() {
    harness.close();
  }

  /** What the keyboard can reach and a reader would have to name. */
  private List<String> unnamed() {
    return GuiActionRunner.execute(
        () ->
            Harness.all(harness.window.target()).stream()
                .filter(Component::isShowing)
                .filter(Component::isFocusable)
                .filter(c -> c.isEnabled() && c.getAccessibleContext() != null)
                .filter(AccessTest::isControl)
                .filter(AccessTest::nameless)
                .map(c -> c.getClass().getName() + " " + c.getName() + " " + c.getBounds())
                .toList());
  }

  private static boolean isControl(Component c) {
    return c instanceof javax.swing.AbstractButton
        || c instanceof javax.swing.text.JTextComponent
        || c instanceof javax.swing.JComboBox
        || c instanceof javax.swing.JTable
        || c instanceof javax.swing.JList
        || c instanceof javax.swing.JToggleButton;
  }

  private static boolean nameless(Component c) {
    String name = c.getAccessibleContext().getAccessibleName();
    boolean partOfAnother =
        c.getParent() instanceof javax.swing.JComboBox
            || c.getParent() instanceof javax.swing.JScrollBar
            || c.getParent() instanceof JSplitPane
            || c.getParent() instanceof JScrollPane
            || c.getClass().getName().contains("FlatTitlePane");
    return !partOfAnother && (name == null || name.isBlank());
  }

  @Test
  void everyControlOfEveryPageIsNamed() throws IOException {
    assertThat(unnamed()).as("start page").isEmpty();
    harness.openByDialog(Harness.example(folder));
    for (String row :
        List.of("quillon-82", "station-a", "upper-side-left-a", "propulsion-row-2-hold")) {
      harness.select(row);
      assertThat(unnamed()).as("desk, " + row).isEmpty();
    }
    harness.press(KeyEvent.VK_F8);
    assertThat(unnamed()).as("findings").isEmpty();
    harness.select("upper-side-left-a");
    harness.press(KeyEvent.VK_T, KeyEvent.VK_CONTROL);
    assertThat(unnamed()).as("trace").isEmpty();
  }

  private String focused() {
    return GuiActionRunner.execute(
        () -> {
          Component owner = KeyboardFocusManager.getCurrentKeyboardFocusManager().getFocusOwner();
          while (owner != null && owner.getName() == null) {
            owner = owner.getParent();
          }
          return owner == null ? "" : Objects.toString(owner.getName());
        });
  }

  private List<String> tabs(int steps) {
    List<String> names = new ArrayList<>();
    for (int i = 0; i < steps; i++) {
      names.add(focused());
      harness.press(KeyEvent.VK_TAB);
    }
    return names;
  }

  @Test
  void theTabKeyGoesThroughTheDeskInReadingOrder() throws IOException {
    harness.openByDialog(Harness.example(folder));
    harness.select("upper-side-left-a");
    harness.window.table("ledger").focus();
    List<String> names = tabs(16);
    assertThat(names.get(0)).isEqualTo("ledger");
    List<String> sheet = names.stream().filter(name -> name.startsWith("sheet.")).toList();
    assertThat(names).containsSubsequence("ledger", "picture.stack", "sheet.name");
    assertThat(sheet).startsWith("sheet.name", "sheet.count", "sheet.length", "sheet.width");
  }

  @Test
  void theStartPageBeginsAtItsButtons() {
    List<String> names = tabs(3);
    assertThat(names).contains("start.new", "start.open");
  }
}
