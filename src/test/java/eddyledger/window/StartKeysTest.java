package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.event.KeyEvent;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The start page by keyboard alone. */
@WindowTest
class StartKeysTest extends WindowFlow {
  private List<String> recent() {
    return List.of(harness.window.list("start.recent").contents());
  }

  /** Opens and closes a copy of the example so that it is among the recent files. */
  private Path remembered(String name) throws IOException {
    Path file = Files.copy(Path.of("examples", "quillon-82.eddyledger"), folder.resolve(name));
    harness.openByDialog(file);
    hands.clearDesk();
    return file;
  }

  @Test
  void newEmptyBeginsAVehicleToWhichAPanelCanBeAdded() {
    hands.tabTo("start.new");
    harness.press(KeyEvent.VK_SPACE);
    harness.until("it was tried", () -> hands.status().equals("Not computed: see the findings"));
    assertThat(hands.title()).isEqualTo("New vehicle, not saved yet – Eddyledger");
    assertThat(harness.row("new-vehicle")).doesNotContainPattern("\\d\\d\\.\\d");
    harness.press(KeyEvent.VK_P, KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT);
    harness.ready();
    assertThat(harness.row("panel-1")).containsPattern("New panel.*\\d\\d\\.\\d");
  }

  @Test
  void anExampleOpensByEnterAndHasNoFileYet() {
    hands.tabTo("start.example.quillon-82");
    harness.press(KeyEvent.VK_ENTER);
    harness.until("the desk shows", () -> harness.shows("ledger"));
    harness.ready();
    assertThat(hands.title()).isEqualTo("Quillon 82, not saved yet – Eddyledger");
    assertThat(harness.row("quillon-82")).contains("73.5");
  }

  @Test
  void theLatestFileOpensByEnterAtOnce() throws IOException {
    remembered("first.eddyledger");
    remembered("second.eddyledger");
    harness.until("the list has the focus", () -> hands.focused().equals("start.recent"));
    harness.press(KeyEvent.VK_ENTER);
    harness.until("it is open", () -> hands.title().startsWith("second.eddyledger"));
    harness.ready();
    hands.clearDesk();
    harness.until("the list has the focus", () -> hands.focused().equals("start.recent"));
    harness.press(KeyEvent.VK_DOWN);
    harness.press(KeyEvent.VK_ENTER);
    harness.until("it is open", () -> hands.title().startsWith("first.eddyledger"));
    harness.ready();
  }

  @Test
  void deleteTakesAFileOffTheListAndLeavesItWhereItIs() throws IOException {
    Path file = remembered("forgotten.eddyledger");
    int before = recent().size();
    harness.until("the list has the focus", () -> hands.focused().equals("start.recent"));
    harness.press(KeyEvent.VK_HOME);
    harness.press(KeyEvent.VK_DELETE);
    assertThat(recent()).hasSize(before - 1).noneMatch(line -> line.contains("forgotten"));
    assertThat(file).exists();
  }

  @Test
  void aFileThatIsGoneIsToldAndTheStartPageStays() throws IOException {
    Path file = remembered("gone.eddyledger");
    Files.delete(file);
    harness.until("the list has the focus", () -> hands.focused().equals("start.recent"));
    harness.press(KeyEvent.VK_HOME);
    harness.press(KeyEvent.VK_ENTER);
    assertThat(hands.dialogText())
        .startsWith("The file cannot be used")
        .contains(file.toString(), "There is no such file.");
    hands.answer("OK");
    harness.untilShown("start");
    assertThat(hands.title()).isEqualTo("Eddyledger");
  }
}
