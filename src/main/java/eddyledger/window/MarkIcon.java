package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.chart.Marks;
import eddyledger.ledger.State;
import java.awt.Component;
import java.awt.Graphics;
import java.awt.Graphics2D;
import javax.swing.Icon;

/** The mark of a state beside its word. */
record MarkIcon(State state) implements Icon {
  private static final int SIZE = 10;
  private static final double MARK = 7.0;

  @Override
  public void paintIcon(Component component, Graphics graphics, int x, int y) {
    Graphics2D g = (Graphics2D) graphics.create();
    Digits.smooth(g);
    Marks.paint(g, Theme.palette(), state, x + SIZE / 2.0, y + SIZE / 2.0, MARK);
    g.dispose();
  }

  @Override
  public int getIconWidth() {
    return SIZE;
  }

  @Override
  public int getIconHeight() {
    return SIZE;
  }
}
