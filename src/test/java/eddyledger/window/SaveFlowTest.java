package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.file.ProjectReader;
import eddyledger.model.Vehicle;
import java.awt.event.KeyEvent;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** Saving: under another name, over other files, over what another program wrote. */
@WindowTest
class SaveFlowTest extends WindowFlow {
  private static final String OTHER = "what another program wrote";
  private Path example;

  @BeforeEach
  void open() throws IOException {
    example = Harness.example(folder);
    harness.openByDialog(example);
    harness.clickRow("upper-side-left-a");
    hands.change("name", "Other name");
  }

  private static Vehicle read(Path file) throws IOException {
    return new ProjectReader().read(file).vehicle().orElseThrow();
  }

  private static boolean renamed(Path file) throws IOException {
    return read(file).toString().contains("name=Other name");
  }

  private void saveAs(Path file) {
    harness.press(KeyEvent.VK_S, KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT);
    harness.type(file);
  }

  @Test
  void saveAsTakesTheNewFileAndLeavesTheOld() throws IOException {
    saveAs(folder.resolve("copy"));
    harness.until("saved", () -> hands.title().equals("copy.eddyledger – Eddyledger"));
    assertThat(renamed(folder.resolve("copy.eddyledger"))).isTrue();
    assertThat(renamed(example)).isFalse();
  }

  @Test
  void overAnotherFileOnlyAfterAQuestion() throws IOException {
    Path there = Files.writeString(folder.resolve("there.eddyledger"), OTHER);
    saveAs(there);
    assertThat(hands.dialogText()).startsWith("Overwrite the file?\nthere.eddyledger is there");
    hands.answer("Choose another");
    assertThat(there).hasContent(OTHER);
    Path another = folder.resolve("another.eddyledger");
    harness.type(another);
    harness.until("saved", () -> hands.title().equals("another.eddyledger – Eddyledger"));
    assertThat(there).hasContent(OTHER);

    saveAs(there);
    hands.answer("Overwrite");
    harness.until("saved", () -> hands.title().equals("there.eddyledger – Eddyledger"));
    assertThat(renamed(there)).isTrue();
  }

  @Test
  void whatAnotherProgramWroteIsNotLostWithoutAQuestion() throws IOException {
    Files.writeString(example, OTHER);
    harness.press(KeyEvent.VK_S, KeyEvent.VK_CONTROL);
    assertThat(hands.dialogText())
        .startsWith("The file was changed by another program\nquillon-82.eddyledger was written");
    hands.answer("Do not save");
    assertThat(example).hasContent(OTHER);
    assertThat(hands.title()).contains("changed");

    harness.press(KeyEvent.VK_S, KeyEvent.VK_CONTROL);
    hands.answer("Replace");
    harness.until("saved", () -> !hands.title().contains("changed"));
    assertThat(renamed(example)).isTrue();
    hands.change("name", "Third name");
    harness.press(KeyEvent.VK_S, KeyEvent.VK_CONTROL);
    harness.until("saved again", () -> !hands.title().contains("changed"));
  }

  @Test
  void notSavingOverOthersKeepsTheProjectOnTheDesk() throws IOException {
    Files.writeString(example, OTHER);
    harness.press(KeyEvent.VK_W, KeyEvent.VK_CONTROL);
    hands.answer("Save");
    hands.answer("Do not save");
    harness.untilShown("ledger");
    assertThat(hands.field("name")).isEqualTo("Other name");
  }

  @Test
  void aFolderThatIsGoneIsToldAndTheWorkKept() throws IOException {
    Path moved = Files.createDirectory(folder.resolve("moved"));
    Path file = moved.resolve("project.eddyledger");
    saveAs(file);
    harness.until("saved", () -> hands.title().startsWith("project.eddyledger –"));
    Files.delete(file);
    Files.delete(moved);
    hands.change("name", "Fourth name");
    harness.press(KeyEvent.VK_S, KeyEvent.VK_CONTROL);
    assertThat(hands.dialogText()).startsWith("Not saved").contains("there is no such folder");
    hands.answer("OK");
    assertThat(hands.title()).contains("changed");
    assertThat(hands.field("name")).isEqualTo("Fourth name");
  }

  @Test
  void aNewVehicleAsksForItsFileWhenItIsSaved() throws IOException {
    hands.clearDesk();
    harness.press(KeyEvent.VK_N, KeyEvent.VK_CONTROL);
    harness.until("the new vehicle", () -> hands.title().startsWith("New vehicle"));
    harness.press(KeyEvent.VK_P, KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT);
    harness.ready();
    harness.press(KeyEvent.VK_W, KeyEvent.VK_CONTROL);
    hands.answer("Save");
    Path first = folder.resolve("first.eddyledger");
    harness.type(first);
    harness.until("the start page", () -> harness.shows("start"));
    assertThat(read(first).toString()).contains("name=New panel");
  }

  @Test
  void aVehicleWithoutPanelsIsSavedAndOpenedAgain() {
    hands.clearDesk();
    harness.press(KeyEvent.VK_N, KeyEvent.VK_CONTROL);
    harness.until("the new vehicle", () -> hands.title().startsWith("New vehicle"));
    Path bare = folder.resolve("bare.eddyledger");
    saveAs(bare);
    harness.until("saved", () -> hands.title().equals("bare.eddyledger – Eddyledger"));
    hands.clearDesk();
    harness.press(KeyEvent.VK_O, KeyEvent.VK_CONTROL);
    harness.type(bare);
    harness.until("it is open", () -> hands.title().equals("bare.eddyledger – Eddyledger"));
  }
}
