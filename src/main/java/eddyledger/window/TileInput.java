package eddyledger.window;

import java.awt.Container;
import java.awt.event.ActionEvent;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import javax.swing.AbstractAction;
import javax.swing.JComponent;
import javax.swing.KeyStroke;
import javax.swing.SwingUtilities;

/** Mouse and keys of a tile. */
final class TileInput {
  /** Moves from one tile to another. */
  @FunctionalInterface
  interface Move {
    /** Goes from a position to another, which may lie beyond the ends. */
    void go(int from, int to);
  }

  private TileInput() {}

  /** Click, Enter and Space choose; arrows, Home and End move. */
  static void install(TargetTileView tile, Move move) {
    tile.addMouseListener(
        new MouseAdapter() {
          @Override
          public void mousePressed(MouseEvent event) {
            if (SwingUtilities.isLeftMouseButton(event)) {
              tile.choose();
              tile.requestFocusInWindow();
            }
          }
        });
    tile.addFocusListener(
        new FocusAdapter() {
          @Override
          public void focusGained(FocusEvent event) {
            tile.repaint();
          }

          @Override
          public void focusLost(FocusEvent event) {
            tile.repaint();
          }
        });
    key(tile, "ENTER", tile::choose);
    key(tile, "SPACE", tile::choose);
    key(tile, "LEFT", () -> move.go(position(tile), position(tile) - 1));
    key(tile, "RIGHT", () -> move.go(position(tile), position(tile) + 1));
    key(tile, "HOME", () -> move.go(position(tile), 0));
    key(tile, "END", () -> move.go(position(tile), Integer.MAX_VALUE));
  }

  private static int position(TargetTileView tile) {
    Container row = tile.getParent();
    return row.getComponentZOrder(tile);
  }

  private static void key(JComponent component, String stroke, Runnable action) {
    component.getInputMap().put(KeyStroke.getKeyStroke(stroke), stroke);
    component
        .getActionMap()
        .put(
            stroke,
            new AbstractAction() {
              @Override
              public void actionPerformed(ActionEvent event) {
                action.run();
              }
            });
  }
}
