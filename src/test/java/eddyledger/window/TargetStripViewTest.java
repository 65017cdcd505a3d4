package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.app.ProjectState;
import eddyledger.ledger.Ledger;
import eddyledger.present.TargetStripPresenter;
import java.awt.Component;
import java.awt.Container;
import java.awt.event.InputEvent;
import java.awt.event.MouseEvent;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BiConsumer;
import javax.accessibility.AccessibleState;
import javax.swing.JViewport;
import javax.swing.SwingUtilities;
import org.junit.jupiter.api.Test;

/** The tiles: clicks, keys, room, and what a screen reader is told. */
class TargetStripViewTest {
  private static final Ledger LEDGER = Ledger.of(Desk.example());
  private static final Ledger MANY = Ledger.of(RegionVehicles.many(Desk.example()));

  private static void with(
      ProjectState state, int width, BiConsumer<TargetStripView, List<TargetTileView>> test) {
    Desk.onEvents(
        () -> {
          TargetStripView view = new TargetStripView(new TargetStripPresenter(state));
          Desk.layOut(view, width, TileRow.HEIGHT);
          Desk.layOut(view, width, TileRow.HEIGHT);
          List<TargetTileView> tiles = new ArrayList<>();
          collect(view, tiles);
          test.accept(view, tiles);
        });
  }

  private static void collect(Container container, List<TargetTileView> tiles) {
    for (Component child : container.getComponents()) {
      if (child instanceof TargetTileView tile) {
        tiles.add(tile);
      } else if (child instanceof Container inner) {
        collect(inner, tiles);
      }
    }
  }

  @Test
  void tilesShareTheWidthEvenly() {
    with(
        Desk.with(LEDGER),
        1440,
        (view, tiles) -> {
          assertThat(tiles).hasSize(6);
          assertThat(tiles.get(0).getX()).isEqualTo(8);
          assertThat(tiles.get(5).getX() + tiles.get(5).getWidth()).isEqualTo(1432);
          assertThat(tiles).allMatch(tile -> Math.abs(tile.getWidth() - 230) <= 1);
        });
  }

  @Test
  void whereTheyDoNotFitTheyKeepTheirLeastWidthAndScroll() {
    ProjectState state = Desk.with(MANY);
    state.select(state.selection().at("cruise", "row-2"));
    with(
        state,
        1366,
        (view, tiles) -> {
          assertThat(tiles).hasSize(14).allMatch(tile -> tile.getWidth() == 200);
          JViewport port =
              (JViewport) SwingUtilities.getAncestorOfClass(JViewport.class, tiles.get(0));
          assertThat(port.getViewPosition().x).isZero();
          Desk.press(tiles.get(0), "END");
          assertThat(state.selection().receiverId()).isEqualTo("seat-14");
        });
  }

  @Test
  void clickEnterSpaceAndArrowsChoose() {
    ProjectState state = Desk.with(LEDGER);
    with(
        state,
        1440,
        (view, tiles) -> {
          tiles
              .get(2)
              .dispatchEvent(
                  new MouseEvent(
                      tiles.get(2),
                      MouseEvent.MOUSE_PRESSED,
                      0L,
                      InputEvent.BUTTON1_DOWN_MASK,
                      9,
                      9,
                      1,
                      false,
                      MouseEvent.BUTTON1));
          assertThat(state.selection().receiverId()).isEqualTo("row-16");
          assertThat(state.selection().conditionId()).isEqualTo("cruise");
          Desk.press(tiles.get(2), "RIGHT");
          assertThat(state.selection().conditionId()).isEqualTo("hold");
          assertThat(tiles.get(3).tile().selected()).isTrue();
          assertThat(tiles.get(2).tile().selected()).isFalse();
          Desk.press(tiles.get(3), "LEFT");
          Desk.press(tiles.get(1), "SPACE");
          assertThat(state.selection().receiverId()).isEqualTo("row-9");
          Desk.press(tiles.get(4), "ENTER");
          assertThat(state.selection().conditionId()).isEqualTo("hold");
          Desk.press(tiles.get(4), "HOME");
          assertThat(state.selection().conditionId()).isEqualTo("cruise");
          Desk.press(tiles.get(0), "LEFT");
          assertThat(tiles.get(0).tile().selected()).isTrue();
        });
  }

  @Test
  void aTileIsReadAsOneSentence() {
    ProjectState state = Desk.with(LEDGER);
    state.select(state.selection().at("cruise", "row-2"));
    with(
        state,
        1440,
        (view, tiles) -> {
          TargetTileView tile = tiles.get(0);
          assertThat(tile.getAccessibleContext().getAccessibleName())
              .startsWith("Row 2, Cruise: ")
              .contains(" dB(A), tight by ");
          assertThat(tile.getAccessibleContext().getAccessibleStateSet().toArray())
              .contains(AccessibleState.CHECKED);
          tiles.get(1).getAccessibleContext().getAccessibleAction().doAccessibleAction(0);
          assertThat(state.selection().receiverId()).isEqualTo("row-9");
          assertThat(tile.getAccessibleContext().getAccessibleStateSet().toArray())
              .doesNotContain(AccessibleState.CHECKED);
          assertThat(tile.getToolTipText(null))
              .startsWith("<html>Row 2, window seat<br>Cruise, M 0.74 at 10 700 m<br>")
              .contains("target 76.0 dB(A), reserve 1.0 dB: 75.0 dB(A) allowed");
        });
  }
}
