package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.event.KeyEvent;
import java.io.IOException;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** Typing at the sheet: what is inherited, what cannot be, units, ways back, one condition. */
@WindowTest
class SheetFlowTest extends WindowFlow {
  private static final String PANEL = "upper-side-left-a";

  @BeforeEach
  void open() throws IOException {
    harness.openByDialog(Harness.example(folder));
    harness.clickTile("tile-hold-row-2");
    harness.clickRow(PANEL);
  }

  private static String level(String row) {
    return row.split("\\|")[2];
  }

  @Test
  void aValueTypedOnASectionHoldsInAllPanelsBelowAndNowhereElse() {
    List<String> before = harness.rows();
    harness.clickRow("station-a");
    assertThat(hands.field("length")).isEqualTo("0.500");
    hands.change("length", "0.6");
    List<String> after = harness.rows();
    assertThat(after).hasSameSizeAs(before);
    for (int i = 0; i < before.size(); i++) {
      String name = before.get(i).substring(0, before.get(i).indexOf('|'));
      boolean within = name.contains("tation A") && !name.contains("panes");
      boolean total = i == 0;
      assertThat(level(after.get(i)).equals(level(before.get(i))))
          .as(before.get(i))
          .isEqualTo(!within && !total);
    }
    harness.clickRow(PANEL);
    assertThat(hands.field("length")).isEqualTo("0.600");
  }

  @Test
  void anInheritedValueIsTypedOverAndGoesBack() {
    String before = harness.row(PANEL);
    harness.untilHidden("sheet.length.back");
    hands.change("length", "0.4");
    assertThat(harness.row(PANEL)).isNotEqualTo(before);
    harness.window.button("sheet.length.back").click();
    harness.ready();
    assertThat(hands.field("length")).isEqualTo("0.500");
    assertThat(harness.row(PANEL)).isEqualTo(before);
    harness.untilHidden("sheet.length.back");
    assertThat(hands.title()).doesNotContain("changed");
  }

  @Test
  void escapeGivesBackWhatTheFieldHeld() {
    hands.typeInto("length", "0.44");
    harness.press(KeyEvent.VK_ESCAPE);
    harness.ready();
    assertThat(hands.field("length")).isEqualTo("0.500");
    assertThat(hands.title()).doesNotContain("changed");
  }

  @Test
  void anAllowanceTypedIsJudgedInTheLedger() {
    assertThat(harness.row(PANEL)).contains("61.0").doesNotContain("over", "inside", "tight");
    hands.change("allowance", "63.5");
    assertThat(harness.row(PANEL)).contains("63.5", "inside by 2.5 dB");
    hands.change("allowance", "61.5");
    assertThat(harness.row(PANEL)).contains("61.5", "tight by 0.5 dB");
    hands.change("allowance", "60");
    assertThat(harness.row(PANEL)).contains("60.0", "over by 1.0 dB");
    harness.window.button("sheet.allowance.back").click();
    harness.ready();
    assertThat(harness.row(PANEL)).doesNotContain("over", "60.0");
  }

  @Test
  void whatCannotBeIsToldUnderTheFieldAndTheLedgerKeepsTheLastValue() {
    String before = harness.row(PANEL);
    hands.typeInto("thickness", "-1");
    assertThat(hands.message("thickness"))
        .isEqualTo(
            "A thickness of −0.001 m is not between 0.00005 m and 0.2 m."
                + " Correct it: millimetres typed as metres?");
    hands.typeInto("thickness", "abc");
    assertThat(hands.message("thickness")).isEqualTo("“abc” is not a number.");
    hands.typeInto("thickness", "1,234");
    assertThat(hands.message("thickness"))
        .isEqualTo("“1,234” could be 1.234 or 1234. Type it without comma.");
    hands.typeInto("count", "2.5");
    assertThat(hands.message("count")).isEqualTo("Type a whole number.");
    assertThat(hands.field("thickness")).isEqualTo("1.4");
    harness.press(KeyEvent.VK_TAB);
    harness.ready();
    assertThat(harness.row(PANEL)).isEqualTo(before);
    assertThat(hands.title()).doesNotContain("changed");
  }

  @Test
  void aNumberInAnotherUnitIsConverted() {
    hands.typeInto("thickness", "0.055 in");
    harness.press(KeyEvent.VK_TAB);
    harness.ready();
    assertThat(hands.field("thickness")).isEqualTo("1.397");
    hands.typeInto("length", "1 ft");
    harness.press(KeyEvent.VK_TAB);
    harness.ready();
    assertThat(hands.field("length")).isEqualTo("0.3048");
    hands.typeInto("thickness", "3 kg");
    assertThat(hands.message("thickness")).startsWith("“kg” is not a unit for this.");
  }

  @Test
  void aValueForOneConditionLeavesTheOtherAlone() {
    String hold = harness.row(PANEL);
    harness.clickTile("tile-cruise-row-2");
    String cruise = harness.row(PANEL);
    harness.window.textBox("sheet.lossFactor").rightClick();
    harness.window.menuItem(hands.menuItem("Only in Cruise")).click();
    hands.change("lossFactor", "0.3");
    assertThat(harness.row(PANEL)).isNotEqualTo(cruise);
    harness.clickTile("tile-hold-row-2");
    assertThat(harness.row(PANEL)).isEqualTo(hold);
    harness.clickTile("tile-cruise-row-2");
    assertThat(hands.field("lossFactor")).isEqualTo("0.300");
    harness.window.button("sheet.lossFactor.back").click();
    harness.ready();
    assertThat(harness.row(PANEL)).isEqualTo(cruise);
  }

  @Test
  void aPanelThatCannotBeComputedSaysWhyAndTheSumsSayThatTheyArePartial() {
    String panel = harness.row(PANEL);
    String section = harness.row("station-a");
    String total = harness.row("quillon-82");
    hands.change("displacementThickness", "0.2 m");
    assertThat(harness.row(PANEL))
        .contains("thickness 0.047 m must be above the displacement thickness 0.2 m | — |");
    assertThat(harness.row("station-a")).contains("≥", "67.3 dB(A)");
    assertThat(harness.row("quillon-82")).contains("≥", "73.3 dB(A)");
    assertThat(harness.selectedTile()).contains("≥", "73.3 dB(A)", "1 of 61 missing");
    harness.press(KeyEvent.VK_TAB);
    harness.press(KeyEvent.VK_Z, KeyEvent.VK_CONTROL);
    harness.ready();
    assertThat(harness.row(PANEL)).isEqualTo(panel);
    assertThat(harness.row("station-a")).isEqualTo(section);
    assertThat(harness.row("quillon-82")).isEqualTo(total);
  }

  @Test
  void theOnlyQuantityOfALayerCannotBeTakenAway() {
    harness.clickRow("station-a");
    String before = harness.row(PANEL);
    String held = hands.field("layerThickness");
    hands.typeInto("layerThickness", "");
    harness.press(KeyEvent.VK_TAB);
    harness.ready();
    assertThat(hands.field("layerThickness")).isEqualTo(held);
    assertThat(harness.row(PANEL)).isEqualTo(before);
  }
}
