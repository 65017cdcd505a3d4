package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Toolkit;
import java.awt.datatransfer.Clipboard;
import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.StringSelection;
import java.awt.event.KeyEvent;
import java.io.IOException;
import java.util.concurrent.atomic.AtomicReference;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** The trace follows what is done: edits, receivers, undo; and goes out as text. */
@WindowTest
class TraceFlowTest extends WindowFlow {
  private static final String PANEL = "upper-side-left-a";

  @BeforeEach
  void open() throws IOException {
    harness.openByDialog(Harness.example(folder));
    harness.clickTile("tile-hold-row-2");
    harness.clickRow(PANEL);
  }

  private void trace() {
    harness.press(KeyEvent.VK_T, KeyEvent.VK_CONTROL);
    harness.until("the trace shows", () -> harness.shows("trace"));
  }

  /** What the button puts on the clipboard, once the desktop has taken it over. */
  private String copied() {
    Clipboard clipboard = Toolkit.getDefaultToolkit().getSystemClipboard();
    clipboard.setContents(new StringSelection("nothing copied"), null);
    harness.window.button("trace.copy").click();
    AtomicReference<String> text = new AtomicReference<>();
    harness.until(
        "the account is on the clipboard",
        () -> {
          boolean there = clipboard.isDataFlavorAvailable(DataFlavor.stringFlavor);
          text.set(there ? (String) clipboard.getData(DataFlavor.stringFlavor) : "");
          return text.get().startsWith("Upper side left");
        });
    return text.get();
  }

  @Test
  void theAccountIsOfTheVehicleAsItWasEdited() {
    trace();
    assertThat(copied()).contains("61.0");
    harness.press(KeyEvent.VK_ESCAPE);
    hands.change("count", "66");
    assertThat(harness.row(PANEL)).contains("64.0 dB(A)");
    trace();
    assertThat(copied()).contains("64.0").doesNotContain("61.0 dB(A)");
    harness.press(KeyEvent.VK_Z, KeyEvent.VK_CONTROL);
    harness.ready();
    harness.untilShown("trace");
    assertThat(copied()).contains("61.0").doesNotContain("64.0 dB(A)");
  }

  @Test
  void theReceiverChangesOnTheTraceToo() {
    trace();
    assertThat(harness.window.label("trace.title").text()).contains("Upper side left, station A");
    assertThat(copied()).contains("Heard at Row 2, window seat in Holding");
    harness.press(KeyEvent.VK_F6);
    assertThat(copied()).contains("Heard at Row 9, window seat in Holding");
    harness.press(KeyEvent.VK_F7);
    assertThat(copied()).contains("Heard at Row 9, window seat in Cruise");
    harness.press(KeyEvent.VK_ESCAPE);
    assertThat(harness.selectedTile()).startsWith("Row 9, Cruise");
  }

  @Test
  void allNumbersAndStepsAreSwitched() {
    trace();
    harness.window.toggleButton("trace.show-numbers").click();
    harness.until("the numbers show", () -> !harness.shows("trace.stages"));
    harness.window.toggleButton("trace.show-steps").click();
    harness.until("the steps show", () -> harness.shows("trace.stages"));
    harness.window.button("trace.back").click();
    harness.untilShown("ledger");
    harness.until("the ledger has the focus", () -> hands.focused().equals("ledger"));
  }
}
