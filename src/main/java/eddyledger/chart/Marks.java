package eddyledger.chart;

import eddyledger.ledger.State;
import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;

/**
 * The mark of a state: over a triangle, tight a diamond, inside a disc, not known a ring. Always
 * shown with the word, so that nobody has to tell colours apart.
 */
public final class Marks {
  private Marks() {}

  /**
   * Paints the mark of a state around a point.
   *
   * @param state the state; null if it is not known
   * @param size width of the mark, pixels
   */
  public static void paint(
      Graphics2D g, Palette palette, State state, double x, double y, double size) {
    g.setColor(palette.stateMark(state));
    double r = size / 2.0;
    if (state == null) {
      g.setStroke(new BasicStroke(1.3f));
      g.draw(new Ellipse2D.Double(x - r + 0.7, y - r + 0.7, size - 1.4, size - 1.4));
      return;
    }
    switch (state) {
      case OVER -> g.fill(closed(x, y - r, x + r * 1.1, y + r * 0.8, x - r * 1.1, y + r * 0.8));
      case TIGHT -> g.fill(closed(x, y - r * 1.1, x + r * 1.1, y, x, y + r * 1.1, x - r * 1.1, y));
      case INSIDE -> g.fill(new Ellipse2D.Double(x - r, y - r, size, size));
    }
  }

  private static Path2D closed(double... points) {
    Path2D path = new Path2D.Double();
    path.moveTo(points[0], points[1]);
    for (int i = 2; i < points.length; i += 2) {
      path.lineTo(points[i], points[i + 1]);
    }
    path.closePath();
    return path;
  }
}
