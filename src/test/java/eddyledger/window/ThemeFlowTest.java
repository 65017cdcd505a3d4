package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.chart.Palette;
import java.awt.Color;
import java.awt.Component;
import java.awt.Point;
import java.awt.image.BufferedImage;
import java.io.IOException;
import org.assertj.swing.edt.GuiActionRunner;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** Light and dark, changed while work is on the desk. */
@WindowTest
class ThemeFlowTest extends WindowFlow {
  @BeforeEach
  void open() throws IOException {
    harness.openByDialog(Harness.example(folder));
    harness.clickTile("tile-hold-row-2");
    harness.clickRow("upper-side-left-a");
  }

  private void theme(String name) {
    harness.window.menuItem("menu.view").click();
    harness.window.menuItem("menu.view." + name).click();
    harness.robot().waitForIdle();
  }

  /** The colour of a component near its upper left corner. */
  private Color paper(String name) {
    return GuiActionRunner.execute(
        () -> {
          Component part =
              Harness.all(harness.window.target()).stream()
                  .filter(c -> name.equals(c.getName()) && c.isShowing())
                  .findFirst()
                  .orElseThrow();
          BufferedImage image =
              new BufferedImage(part.getWidth(), part.getHeight(), BufferedImage.TYPE_INT_RGB);
          part.paint(image.createGraphics());
          return new Color(image.getRGB(3, 3));
        });
  }

  /** What is on the screen, not what would be painted now. */
  private Color onScreen(String name) {
    Component part =
        hands.showing(Component.class).stream()
            .filter(c -> name.equals(c.getName()))
            .findFirst()
            .orElseThrow();
    Point at = GuiActionRunner.execute(part::getLocationOnScreen);
    try {
      return new java.awt.Robot().getPixelColor(at.x + 3, at.y + 3);
    } catch (java.awt.AWTException e) {
      throw new AssertionError(e);
    }
  }

  @Test
  void changingTheThemeRepaintsAndKeepsSelectionAndText() {
    String row = harness.row("upper-side-left-a");
    String tile = harness.selectedTile();
    int selected = harness.window.table("ledger").target().getSelectedRow();
    hands.typeInto("name", "Half a na");
    for (String name : new String[] {"dark", "light"}) {
      Palette palette = name.equals("dark") ? Palette.DARK : Palette.LIGHT;
      theme(name);
      harness.until(
          "the sheet is repainted in " + name, () -> onScreen("sheet").equals(palette.paper()));
      assertThat(paper("sheet")).isEqualTo(palette.paper());
      assertThat(paper("picture")).isEqualTo(palette.paper());
      assertThat(hands.field("name")).isEqualTo("Half a na");
      assertThat(harness.window.textBox("sheet.name").target().getForeground())
          .isEqualTo(palette.ink());
      assertThat(harness.row("upper-side-left-a").split("\\|")[2]).isEqualTo(row.split("\\|")[2]);
      assertThat(harness.selectedTile()).isEqualTo(tile);
      assertThat(harness.window.table("ledger").target().getSelectedRow()).isEqualTo(selected);
    }
    assertThat(Theme.palette()).isSameAs(Palette.LIGHT);
  }
}
