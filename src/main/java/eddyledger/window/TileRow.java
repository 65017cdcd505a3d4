package eddyledger.window;

import java.awt.Component;
import java.awt.Container;
import java.awt.Dimension;
import java.awt.LayoutManager;
import java.awt.Rectangle;
import javax.swing.JPanel;
import javax.swing.Scrollable;

/**
 * The tiles side by side: as wide as there is room, within limits; where they do not fit, as narrow
 * as a tile can be, and the row is scrolled.
 */
final class TileRow extends JPanel implements Scrollable {
  /** Height of the strip, pixels. */
  static final int HEIGHT = 102;

  /** Free space left and right of the row, pixels. */
  static final int MARGIN = 8;

  private static final int TOP = 2;
  private static final int GAP = 8;
  private static final int NARROWEST = 200;
  private static final int WIDEST = 320;

  TileRow() {
    setOpaque(false);
    setLayout(new Tiles());
  }

  @Override
  public Dimension getPreferredScrollableViewportSize() {
    return new Dimension(2 * MARGIN + NARROWEST, HEIGHT);
  }

  @Override
  public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
    return NARROWEST / 2;
  }

  @Override
  public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
    return NARROWEST + GAP;
  }

  @Override
  public boolean getScrollableTracksViewportWidth() {
    return getParent() != null && getParent().getWidth() >= getPreferredSize().width;
  }

  @Override
  public boolean getScrollableTracksViewportHeight() {
    return true;
  }

  /** Lays the tiles out. */
  private static final class Tiles implements LayoutManager {
    @Override
    public void addLayoutComponent(String name, Component component) {}

    @Override
    public void removeLayoutComponent(Component component) {}

    @Override
    public Dimension preferredLayoutSize(Container parent) {
      int tiles = parent.getComponentCount();
      return new Dimension(2 * MARGIN + tiles * NARROWEST + Math.max(0, tiles - 1) * GAP, HEIGHT);
    }

    @Override
    public Dimension minimumLayoutSize(Container parent) {
      return preferredLayoutSize(parent);
    }

    @Override
    public void layoutContainer(Container parent) {
      int tiles = parent.getComponentCount();
      if (tiles == 0) {
        return;
      }
      int room = parent.getWidth() - 2 * MARGIN - (tiles - 1) * GAP;
      int each = Math.max(NARROWEST, Math.min(WIDEST, room / tiles));
      // what division leaves over goes to the first ones, a pixel each, so that both ends are even
      int over = each == room / tiles ? room % tiles : 0;
      int x = MARGIN;
      for (int i = 0; i < tiles; i++) {
        int width = each + (i < over ? 1 : 0);
        parent.getComponent(i).setBounds(x, TOP, width, HEIGHT - TOP);
        x += width + GAP;
      }
    }
  }
}
