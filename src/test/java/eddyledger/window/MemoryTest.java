package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.chart.Palette;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.Point;
import java.awt.event.KeyEvent;
import java.io.IOException;
import java.nio.file.Path;
import java.util.prefs.Preferences;
import javax.swing.plaf.basic.BasicSplitPaneDivider;
import org.assertj.swing.core.MouseButton;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What the window keeps from one day to the next. */
@WindowTest
class MemoryTest {
  @TempDir private Path folder;

  private static Dimension size(Harness harness, String name) {
    return Harness.all(harness.window.target()).stream()
        .filter(c -> name.equals(c.getName()))
        .map(Component::getSize)
        .findFirst()
        .orElseThrow();
  }

  private static void drag(Harness harness, boolean across, int by) {
    BasicSplitPaneDivider divider =
        new Hands(harness)
            .showing(BasicSplitPaneDivider.class).stream()
                .filter(it -> it.getWidth() < it.getHeight() == across)
                .findFirst()
                .orElseThrow();
    Point at = divider.getLocationOnScreen();
    Point grip = new Point(at.x + divider.getWidth() / 2, at.y + divider.getHeight() / 2);
    harness.robot().pressMouse(grip, MouseButton.LEFT_BUTTON);
    for (int step = 1; step <= 4; step++) {
      int moved = by * step / 4;
      harness.robot().moveMouse(grip.x + (across ? moved : 0), grip.y + (across ? 0 : moved));
    }
    harness.robot().releaseMouse(MouseButton.LEFT_BUTTON);
    harness.robot().waitForIdle();
  }

  @Test
  void sizeSplitsThemeAndRecentFilesAreThereAgain() throws IOException {
    Path example = Harness.example(folder);
    Preferences store = Harness.freshStore(Palette.LIGHT);
    Harness first = new Harness(store);
    first.window.moveTo(new Point(40, 30));
    first.window.resizeTo(new Dimension(1300, 820));
    first.until("resized", () -> first.window.target().getWidth() == 1300);
    first.openByDialog(example);
    int ledgerBefore = size(first, "ledger").width;
    drag(first, true, -90);
    drag(first, false, -70);
    Dimension sheet = size(first, "sheet");
    Dimension picture = size(first, "picture");
    assertThat(size(first, "ledger").width).isLessThan(ledgerBefore);
    first.window.menuItem("menu.view").click();
    first.window.menuItem("menu.view.dark").click();
    first.press(KeyEvent.VK_Q, KeyEvent.VK_CONTROL);
    first.until("closed", first::closed);
    first.leave();

    try (Harness second = new Harness(store)) {
      assertThat(second.window.target().getSize()).isEqualTo(new Dimension(1300, 820));
      assertThat(Theme.palette()).isSameAs(Palette.DARK);
      assertThat(second.window.list("start.recent").contents())
          .singleElement()
          .asString()
          .contains("quillon-82.eddyledger");
      Hands hands = new Hands(second);
      second.until("the list has the focus", () -> hands.focused().equals("start.recent"));
      second.press(KeyEvent.VK_ENTER);
      second.until("the desk shows", () -> second.shows("ledger"));
      second.ready();
      assertThat(size(second, "sheet").width).isEqualTo(sheet.width);
      assertThat(size(second, "picture").height)
          .isCloseTo(picture.height, org.assertj.core.data.Offset.offset(LedgerCells.ROW));
    }
  }
}
