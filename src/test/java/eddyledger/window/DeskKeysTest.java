package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.event.KeyEvent;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** Looking around at the desk: targets, pictures, findings, regions on the whole desk. */
@WindowTest
class DeskKeysTest extends WindowFlow {
  private static final List<String> TILES =
      List.of(
          "tile-cruise-row-2",
          "tile-cruise-row-9",
          "tile-cruise-row-16",
          "tile-hold-row-2",
          "tile-hold-row-9",
          "tile-hold-row-16");

  @BeforeEach
  void open() throws IOException {
    harness.openByDialog(Harness.example(folder));
  }

  private String ruling() {
    return hands.showing(TargetTileView.class).stream()
        .filter(tile -> tile.tile().selected())
        .map(TargetTileView::getName)
        .findFirst()
        .orElseThrow();
  }

  @Test
  void aTileThatIsClickedRulesTheDesk() {
    assertThat(ruling()).as("the worst margin at first").isEqualTo("tile-hold-row-2");
    harness.clickTile("tile-cruise-row-16");
    assertThat(ruling()).isEqualTo("tile-cruise-row-16");
    assertThat(harness.row("quillon-82")).contains("74.8 dB(A)");
    assertThat(harness.row("station-a")).contains("| 48.0 |");
    harness.until(
        "the focus is in " + "tile-cruise-row-16",
        () -> hands.focused().equals("tile-cruise-row-16"));
  }

  @Test
  void arrowsHomeAndEndWalkTheTiles() {
    harness.clickTile(TILES.get(0));
    for (int i = 1; i < TILES.size(); i++) {
      harness.press(KeyEvent.VK_RIGHT);
      assertThat(ruling()).isEqualTo(TILES.get(i));
    }
    harness.press(KeyEvent.VK_RIGHT);
    assertThat(ruling()).as("the last stays").isEqualTo(TILES.get(5));
    harness.press(KeyEvent.VK_LEFT);
    assertThat(ruling()).isEqualTo(TILES.get(4));
    harness.press(KeyEvent.VK_HOME);
    assertThat(ruling()).isEqualTo(TILES.get(0));
    harness.press(KeyEvent.VK_END);
    assertThat(ruling()).isEqualTo(TILES.get(5));
    assertThat(hands.focused()).isEqualTo(TILES.get(5));
  }

  @Test
  void receiverAndConditionGoRound() {
    harness.clickTile("tile-hold-row-16");
    harness.press(KeyEvent.VK_F6);
    assertThat(ruling()).isEqualTo("tile-hold-row-2");
    harness.press(KeyEvent.VK_F7);
    assertThat(ruling()).isEqualTo("tile-cruise-row-2");
    harness.press(KeyEvent.VK_F7);
    assertThat(ruling()).isEqualTo("tile-hold-row-2");
  }

  @Test
  void theWorstMarginIsOneKeyAway() {
    harness.clickTile("tile-cruise-row-9");
    harness.clickRow("station-e");
    harness.press(KeyEvent.VK_J, KeyEvent.VK_CONTROL);
    harness.until("the focus is in " + "ledger", () -> hands.focused().equals("ledger"));
    int row = harness.window.table("ledger").target().getSelectedRow();
    assertThat(row).isNotNegative();
    String worst = harness.rows().get(row);
    assertThat(worst).contains("over by");
    double most =
        harness.rows().stream()
            .filter(it -> it.contains("over by "))
            .mapToDouble(it -> Double.parseDouble(it.replaceAll(".*over by ([0-9.]+) dB.*", "$1")))
            .max()
            .orElseThrow();
    assertThat(worst).contains("over by " + most + " dB");
  }

  @Test
  void thePictureIsSwitchedByItsTabsAndDescribesTheSelection() {
    harness.clickRow("upper-side-left-a");
    harness.window.toggleButton("picture.spectrum").click();
    assertThat(hands.picture())
        .startsWith("Level in each band at Row 2")
        .contains("Upper side left", "61.0 dB(A)");
    harness.window.toggleButton("picture.stack").click();
    assertThat(hands.picture()).startsWith("What makes each band at Row 2").contains("73.5 dB(A)");
    harness.clickRow("crown-a");
    assertThat(hands.picture()).contains("Crown");
  }

  @Test
  void theWalkThroughTheFindingsGoesToRowAndField() throws IOException {
    hands.clearDesk();
    Path faulty = folder.resolve("faulty.eddyledger");
    String own = "\"id\": \"upper-side-left-a\",";
    Files.writeString(
        faulty,
        Files.readString(folder.resolve("quillon-82.eddyledger"))
            .replace(own, own + " \"length_m\": 900, \"width_m\": 0.18,"));
    harness.openByDialog(faulty);
    harness.clickRow("station-e");
    harness.press(KeyEvent.VK_F8);
    assertThat(hands.field("name")).isEqualTo("Upper side left, station A");
    harness.until("the field has the focus", () -> hands.focused().equals("sheet.length"));
    assertThat(hands.message("length")).startsWith("A size of 900 m is not between");
    harness.press(KeyEvent.VK_F8);
    assertThat(hands.focused()).isNotEqualTo("sheet.length");
    harness.press(KeyEvent.VK_F8, KeyEvent.VK_SHIFT);
    harness.until("the field has the focus", () -> hands.focused().equals("sheet.length"));
    harness.window.button("findings.close").click();
    harness.untilHidden("findings.list");
  }

  @Test
  void aFindingThatIsClickedIsGoneTo() {
    harness.window.button("status.findings").click();
    String[] lines = harness.window.list("findings.list").contents();
    int crown =
        Arrays.asList(lines)
            .indexOf(
                Arrays.stream(lines)
                    .filter(line -> line.contains("subject=crown-a"))
                    .findFirst()
                    .orElseThrow());
    harness.window.list("findings.list").clickItem(crown);
    assertThat(hands.field("name")).isEqualTo("Crown, station A");
  }

  @Test
  void eachRegionTakesTheWholeDeskAndGivesItBack() {
    String[] regions = {"ledger", "sheet", "picture"};
    int[] keys = {KeyEvent.VK_1, KeyEvent.VK_2, KeyEvent.VK_3};
    for (int i = 0; i < regions.length; i++) {
      harness.press(keys[i], KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT);
      for (String region : regions) {
        if (region.equals(regions[i])) {
          harness.untilShown(region);
        } else {
          harness.untilHidden(region);
        }
      }
      harness.press(keys[i], KeyEvent.VK_CONTROL, KeyEvent.VK_SHIFT);
      for (String region : regions) {
        harness.untilShown(region);
      }
    }
    harness.window.button("picture.whole").click();
    harness.untilHidden("ledger");
    harness.window.button("picture.whole").click();
    harness.untilShown("ledger");
    harness.press(KeyEvent.VK_2, KeyEvent.VK_CONTROL);
    harness.until("the focus is in " + "sheet.name", () -> hands.focused().equals("sheet.name"));
    harness.press(KeyEvent.VK_1, KeyEvent.VK_CONTROL);
    harness.until("the focus is in " + "ledger", () -> hands.focused().equals("ledger"));
  }
}
