package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.event.KeyEvent;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import javax.swing.JButton;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** Files that cannot be used, and unsaved work when something else is to come on the desk. */
@WindowTest
class OpenFlowTest extends WindowFlow {
  private static final String PANEL = "upper-side-left-a";
  private Path example;

  @BeforeEach
  void open() throws IOException {
    example = Harness.example(folder);
    harness.openByDialog(example);
  }

  private void edit() {
    harness.clickRow(PANEL);
    hands.change("count", "9");
    assertThat(hands.title()).isEqualTo("quillon-82.eddyledger, changed – Eddyledger");
  }

  private boolean onFile() {
    return text().contains("\"count\": 9,");
  }

  private String text() {
    try {
      return Files.readString(example);
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }

  private void openOther(Path file) {
    harness.press(KeyEvent.VK_O, KeyEvent.VK_CONTROL);
    harness.type(file);
  }

  @Test
  void everythingWrongWithAFileIsToldAndTheDeskStaysAsItIs() throws IOException {
    Path broken = folder.resolve("broken.eddyledger");
    Files.writeString(
        broken,
        text()
            .replace("\"id\": \"row-9\"", "\"id\": \"row 9\"")
            .replace("\"id\": \"pane-8\"", "\"id\": \"skin-1-2\"")
            .replace("\"volume_m3\": 19,", "\"volume_m3\": \"nineteen\","));
    String before = harness.row(PANEL);
    openOther(broken);
    assertThat(hands.dialogText())
        .startsWith("The file cannot be used")
        .contains("receivers[1]", "The id \"row 9\" cannot be used.")
        .contains("constructions[3]", "stands already at constructions[0]")
        .contains("zones[3]", "volume_m3");
    hands.answer("OK");
    assertThat(hands.title()).isEqualTo("quillon-82.eddyledger – Eddyledger");
    assertThat(harness.row(PANEL)).isEqualTo(before);
    assertThat(hands.status()).isEqualTo("Ready");
  }

  @Test
  void aTextThatIsNoProjectIsToldWithItsPlace() throws IOException {
    Path broken = folder.resolve("torn.eddyledger");
    Files.writeString(broken, text().substring(0, 3000));
    openOther(broken);
    assertThat(hands.dialogText())
        .startsWith("The file cannot be used")
        .containsPattern("line \\d+");
    hands.answer("OK");
    harness.untilShown("ledger");
  }

  @Test
  void openingAsksAndCancelKeepsTheWork() {
    edit();
    harness.press(KeyEvent.VK_O, KeyEvent.VK_CONTROL);
    assertThat(hands.dialogText())
        .isEqualTo("Save the changes?\nThe changes to quillon-82.eddyledger are in no file yet.");
    hands.answer("Cancel");
    assertThat(hands.dialogOpen()).isFalse();
    assertThat(hands.title()).contains("changed");
    assertThat(hands.field("count")).isEqualTo("9");
  }

  @Test
  void newWithSaveWritesTheFileFirst() {
    edit();
    harness.press(KeyEvent.VK_N, KeyEvent.VK_CONTROL);
    hands.answer("Save");
    harness.until("the new vehicle", () -> hands.title().startsWith("New vehicle"));
    assertThat(onFile()).isTrue();
  }

  @Test
  void closingWithDiscardLeavesTheFileAsItWas() {
    String before = text();
    edit();
    harness.press(KeyEvent.VK_W, KeyEvent.VK_CONTROL);
    hands.answer("Discard");
    harness.until("the start page", () -> harness.shows("start"));
    assertThat(text()).isEqualTo(before);
  }

  @Test
  void escapeInTheQuestionIsCancel() {
    edit();
    harness.press(KeyEvent.VK_W, KeyEvent.VK_CONTROL);
    hands.dialogText();
    harness.press(KeyEvent.VK_ESCAPE);
    harness.until("the dialog is gone", () -> !hands.dialogOpen());
    assertThat(hands.title()).contains("changed");
  }

  @Test
  void theCloseButtonOfTheWindowAsks() {
    edit();
    Optional<JButton> close =
        hands.showing(JButton.class).stream()
            .filter(it -> "Close".equals(it.getAccessibleContext().getAccessibleName()))
            .filter(it -> it.getName() == null || !it.getName().startsWith("findings"))
            .findFirst();
    harness.robot().click(close.orElseThrow());
    assertThat(hands.dialogText()).startsWith("Save the changes?");
    hands.answer("Cancel");
    assertThat(harness.closed()).isFalse();
    assertThat(harness.window.target().isShowing()).isTrue();
    assertThat(hands.field("count")).isEqualTo("9");
  }

  @Test
  void nothingIsAskedWhereNothingWasChanged() {
    edit();
    harness.press(KeyEvent.VK_Z, KeyEvent.VK_CONTROL);
    harness.ready();
    harness.press(KeyEvent.VK_W, KeyEvent.VK_CONTROL);
    harness.until("the start page", () -> harness.shows("start"));
    assertThat(hands.dialogOpen()).isFalse();
  }
}
