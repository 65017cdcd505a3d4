package eddyledger.window;

import eddyledger.chart.FillPaints;
import eddyledger.chart.Palette;
import eddyledger.chart.StackFill;
import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.Paint;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.HashMap;
import java.util.Map;

/** Paints the marks in the gutter in one palette. */
final class GutterPainter {
  private static final int LEFT = 4;
  private static final int WIDTH = 7;
  private static final int AIR = 2;

  private record Scaled(StackFill fill, double scale) {}

  private final Palette palette;
  private final FillPaints fills;
  private final Map<Scaled, Paint> paints = new HashMap<>();

  GutterPainter(Palette palette) {
    this.palette = palette;
    this.fills = new FillPaints(palette);
  }

  /**
   * Paints a mark into a line.
   *
   * @param top where the line stands in the table, so that patterns run on from line to line
   */
  void paint(Graphics2D g, GutterMark mark, int height, int top) {
    int from = mark.joinedAbove() ? 0 : AIR;
    int to = mark.joinedBelow() ? height : height - AIR;
    Scaled scaled = new Scaled(mark.fill(), g.getTransform().getScaleX());
    g.translate(0, -top);
    g.setPaint(paints.computeIfAbsent(scaled, it -> fills.of(it.fill(), it.scale())));
    g.fill(new Rectangle2D.Double(LEFT, (double) top + from, WIDTH, to - from));
    g.translate(0, top);
    if (fills.edged(mark.fill())) {
      outline(g, mark, from, to);
    }
  }

  private void outline(Graphics2D g, GutterMark mark, int from, int to) {
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
    g.setColor(palette.bar());
    g.setStroke(new BasicStroke(0.8f));
    g.draw(outline);
  }
}
