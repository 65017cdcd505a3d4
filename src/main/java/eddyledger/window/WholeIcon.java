package eddyledger.window;

import eddyledger.chart.Digits;
import java.awt.BasicStroke;
import java.awt.Component;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import javax.swing.Icon;

/** Two arrows out of the middle: take the whole desk. */
final class WholeIcon implements Icon {
  private static final int SIZE = 14;

  @Override
  public void paintIcon(Component owner, Graphics graphics, int x, int y) {
    Graphics2D g = (Graphics2D) graphics.create(x, y, SIZE, SIZE);
    Digits.smooth(g);
    g.setColor(Theme.palette().ink2());
    g.setStroke(new BasicStroke(1.3f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
    arrow(g, 8, 6, 12.2, 1.8);
    arrow(g, 6, 8, 1.8, 12.2);
    g.dispose();
  }

  private static void arrow(Graphics2D g, double fromX, double fromY, double x, double y) {
    double back = Math.signum(fromX - x) * 3.6;
    g.draw(new Line2D.Double(fromX, fromY, x, y));
    g.draw(new Line2D.Double(x, y, x + back, y));
    g.draw(new Line2D.Double(x, y, x, y - Math.signum(y - fromY) * 3.6));
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
