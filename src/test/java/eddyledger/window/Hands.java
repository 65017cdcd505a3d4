package eddyledger.window;

import java.awt.Component;
import java.awt.Dialog;
import java.awt.KeyboardFocusManager;
import java.awt.Window;
import java.awt.event.KeyEvent;
import java.awt.event.MouseEvent;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Collectors;
import javax.swing.AbstractButton;
import javax.swing.JMenuItem;
import javax.swing.JTable;
import javax.swing.SwingUtilities;
import javax.swing.table.JTableHeader;
import javax.swing.text.JTextComponent;
import org.assertj.swing.core.GenericTypeMatcher;
import org.assertj.swing.edt.GuiActionRunner;
import org.jfree.chart.ChartPanel;

/** What one does at the desk again and again: fields, dialogs, the focus. */
final class Hands {
  private final Harness harness;

  Hands(Harness harness) {
    this.harness = harness;
  }

  /** The dialog that is open, if there is one. */
  private Optional<Dialog> dialog() {
    return Arrays.stream(harness.window.target().getOwnedWindows())
        .filter(Dialog.class::isInstance)
        .filter(Window::isShowing)
        .map(Dialog.class::cast)
        .findFirst();
  }

  boolean dialogOpen() {
    return GuiActionRunner.execute(() -> dialog().isPresent());
  }

  /** Waits for a dialog; its title and all its text. */
  String dialogText() {
    harness.until("a dialog is open", this::dialogOpen);
    return GuiActionRunner.execute(
        () -> {
          Dialog open = dialog().orElseThrow();
          return open.getTitle()
              + "\n"
              + Harness.all(open).stream()
                  .filter(JTextComponent.class::isInstance)
                  .map(c -> ((JTextComponent) c).getText())
                  .collect(Collectors.joining("\n"));
        });
  }

  /** Waits for a dialog, clicks its button of these words, and waits until it has gone. */
  void answer(String words) {
    harness.until("a dialog is open", this::dialogOpen);
    Dialog open = GuiActionRunner.execute(() -> dialog().orElseThrow());
    AbstractButton button =
        GuiActionRunner.execute(
            () ->
                Harness.all(open).stream()
                    .filter(AbstractButton.class::isInstance)
                    .map(AbstractButton.class::cast)
                    .filter(it -> words.equals(it.getText()))
                    .findFirst()
                    .orElseThrow(() -> new AssertionError("no button " + words)));
    harness.robot().click(button);
    harness.until("the dialog is gone", () -> !open.isShowing());
    harness.robot().waitForIdle();
  }

  /** Takes the project off the desk without saving it, whatever is open. */
  void clearDesk() {
    for (int i = 0; i < 8 && (dialogOpen() || !title().equals("Eddyledger")); i++) {
      if (!dialogOpen()) {
        // a menu that is open would take the next key
        harness.press(KeyEvent.VK_ESCAPE);
        harness.press(KeyEvent.VK_W, KeyEvent.VK_CONTROL);
        harness.until("it is asked or done", () -> dialogOpen() || title().equals("Eddyledger"));
      } else if (dialogText().startsWith("Save the changes?")) {
        answer("Discard");
      } else {
        Dialog open = GuiActionRunner.execute(() -> dialog().orElseThrow());
        harness.press(KeyEvent.VK_ESCAPE);
        harness.until("the dialog is gone", () -> !open.isShowing());
      }
    }
    harness.robot().waitForIdle();
  }

  /** What the title bar says. */
  String title() {
    return GuiActionRunner.execute(() -> harness.window.target().getTitle());
  }

  /** Types over what a field of the sheet holds, key by key. */
  void typeInto(String key, String text) {
    harness.window.textBox("sheet." + key).click();
    harness.press(KeyEvent.VK_A, KeyEvent.VK_CONTROL);
    harness.window.textBox("sheet." + key).enterText(text);
    harness.robot().waitForIdle();
  }

  /** Types over what a field holds and waits for the levels. */
  void change(String key, String text) {
    typeInto(key, text);
    harness.ready();
  }

  /** The text of a field of the sheet. */
  String field(String key) {
    return harness.window.textBox("sheet." + key).text();
  }

  /** What stands below a field of the sheet; empty if nothing does. */
  String message(String key) {
    Component field = harness.window.textBox("sheet." + key).target();
    return GuiActionRunner.execute(
        () ->
            Harness.all(SwingUtilities.getAncestorOfClass(SheetRowView.class, field)).stream()
                .filter(WrapText.class::isInstance)
                .filter(Component::isShowing)
                .map(c -> ((WrapText) c).getText())
                .collect(Collectors.joining(" ")));
  }

  /** The words of the line at the bottom. */
  String status() {
    return harness.window.label("status.ready").text();
  }

  /** Name of the nearest component with a name around the one that has the focus. */
  String focused() {
    return GuiActionRunner.execute(
        () -> {
          Component owner = KeyboardFocusManager.getCurrentKeyboardFocusManager().getFocusOwner();
          while (owner != null && owner.getName() == null) {
            owner = owner.getParent();
          }
          return owner == null ? "" : Objects.toString(owner.getName());
        });
  }

  /** Presses Tab until a component of this name has the focus. */
  void tabTo(String name) {
    for (int i = 0; i < 80 && !focused().equals(name); i++) {
      harness.press(KeyEvent.VK_TAB);
    }
    if (!focused().equals(name)) {
      throw new AssertionError("Tab never comes to " + name);
    }
  }

  /** The showing components of a type. */
  <T extends Component> List<T> showing(Class<T> type) {
    return GuiActionRunner.execute(
        () ->
            Harness.all(harness.window.target()).stream()
                .filter(type::isInstance)
                .filter(Component::isShowing)
                .map(type::cast)
                .toList());
  }

  /** Finds an entry of a menu by its words. */
  GenericTypeMatcher<JMenuItem> menuItem(String words) {
    return new GenericTypeMatcher<>(JMenuItem.class, true) {
      @Override
      protected boolean isMatching(JMenuItem item) {
        return words.equals(item.getText());
      }
    };
  }

  /** What the picture says to those who cannot see it. */
  String picture() {
    ChartPanel chart = showing(ChartPanel.class).get(0);
    return GuiActionRunner.execute(() -> chart.getAccessibleContext().getAccessibleDescription());
  }

  /** What stands over the names of the ledger, in full. */
  String ledgerHeading() {
    JTable table = harness.window.table("ledger").target();
    return GuiActionRunner.execute(
        () -> {
          JTableHeader header = table.getTableHeader();
          return header.getToolTipText(
              new MouseEvent(header, MouseEvent.MOUSE_MOVED, 0, 0, 20, 8, 0, false));
        });
  }
}
