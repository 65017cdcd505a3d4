package eddyledger.window;

import eddyledger.chart.Digits;
import java.awt.BasicStroke;
import java.awt.Component;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import javax.swing.Icon;

/** An arrow that turns back: the way from an own value to the one that held before. */
final class BackIcon implements Icon {
  private static final int SIZE = 11;

  @Override
  public void paintIcon(Component component, Graphics graphics, int x, int y) {
    Graphics2D g = (Graphics2D) graphics.create();
    Digits.smooth(g);
    g.translate(x, y);
    g.setColor(component.getForeground());
    g.setStroke(new BasicStroke(1.3f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND));
    Path2D arrow = new Path2D.Double();
    arrow.moveTo(4.5, 1.5);
    arrow.lineTo(1.5, 4.5);
    arrow.lineTo(4.5, 7.5);
    arrow.moveTo(1.5, 4.5);
    arrow.lineTo(7.0, 4.5);
    arrow.curveTo(11.2, 4.5, 11.2, 10.5, 7.0, 10.5);
    arrow.lineTo(5.5, 10.5);
    g.draw(arrow);
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
