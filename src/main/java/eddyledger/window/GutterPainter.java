package eddyledger.window;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;

/** Paints the marks in the gutter. */
final class GutterPainter {
  private static final int LEFT = 4;
  private static final int WIDTH = 7;
  private static final int AIR = 2;
  private static final int PATTERN = 6;

  private GutterPainter() {}

  /**
   * Paints a mark into a line.
   *
   * @param top where the line stands in the table, so that patterns run on from line to line
   * @param edge colour of an edge
   */
  static void paint(Graphics2D g, GutterMark mark, int height, int top, Color edge) {
    int from = mark.joinedAbove() ? 0 : AIR;
    int to = mark.joinedBelow() ? height : height - AIR;
    int shift = top % PATTERN;
    g.translate(0, -shift);
    g.setPaint(mark.paint());
    g.fill(new Rectangle2D.Double(LEFT, from + shift, WIDTH, to - from));
    g.translate(0, shift);
    if (mark.edged()) {
      outline(g, mark, from, to, edge);
    }
  }

  private static void outline(Graphics2D g, GutterMark mark, int from, int to, Color edge) {
    double left = LEFT + 0.4;
    double right = LEFT + WIDTH - 0.4;
    Path2D outline = new Path2D.Double();
    outline.moveTo(left, to);
    outline.lineTo(left, from);
    outline.moveTo(right, from);
    outline.lineTo(right, to);
    if (!mark.joinedAbove()) {
      outline.moveTo(left, from + 0.4);
      outline.lineTo(right, from + 0.4);
    }
    if (!mark.joinedBelow()) {
      outline.moveTo(left, to - 0.4);
      outline.lineTo(right, to - 0.4);
    }
    g.setColor(edge);
    g.setStroke(new BasicStroke(0.8f));
    g.draw(outline);
  }
}
