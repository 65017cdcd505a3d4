package eddyledger.window;

import eddyledger.app.Example;
import eddyledger.chart.Palette;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;

/** Line drawings of kinds of vehicle, of no vehicle in particular. */
final class LineArt {
  private static final double WIDTH = 128.0;
  private static final double HEIGHT = 68.0;
  private static final int WINDOWS = 10;
  private static final BasicStroke LINE =
      new BasicStroke(1.3f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);

  private LineArt() {}

  /** Paints a drawing in the middle of an area. */
  static void paint(Graphics2D graphics, Example.Drawing drawing, Rectangle2D area) {
    Graphics2D g = (Graphics2D) graphics.create();
    double scale = Math.min(area.getWidth() / WIDTH, area.getHeight() / HEIGHT);
    AffineTransform place =
        AffineTransform.getTranslateInstance(
            area.getCenterX() - WIDTH * scale / 2, area.getCenterY() - HEIGHT * scale / 2);
    place.scale(scale, scale);
    g.transform(place);
    g.setStroke(LINE);
    switch (drawing) {
      case AIRCRAFT -> aircraft(g, Theme.palette());
      case SPECTRUM -> spectrum(g, Theme.palette());
    }
    g.dispose();
  }

  private static void aircraft(Graphics2D g, Palette palette) {
    Path2D fin = new Path2D.Double();
    fin.moveTo(94, 27);
    fin.lineTo(109, 6);
    fin.lineTo(118, 6);
    fin.lineTo(115, 24);
    outline(g, palette, fin);
    Path2D body = new Path2D.Double();
    body.moveTo(6, 39);
    body.curveTo(8, 33, 17, 27, 30, 27);
    body.lineTo(94, 27);
    body.curveTo(104, 27, 114, 24.5, 123, 23);
    body.curveTo(120, 31, 104, 45, 84, 46);
    body.lineTo(24, 46);
    body.curveTo(13, 46, 6, 43, 6, 39);
    body.closePath();
    outline(g, palette, body);
    Color glass = glass(palette);
    g.setColor(glass);
    for (int i = 0; i < WINDOWS; i++) {
      g.fill(new RoundRectangle2D.Double(35 + 6.4 * i, 32, 3.2, 4.6, 2.6, 2.6));
    }
    Path2D front = new Path2D.Double();
    front.moveTo(15.5, 31.5);
    front.lineTo(21.5, 31.5);
    front.lineTo(21.5, 35);
    front.lineTo(11.5, 35);
    front.closePath();
    g.fill(front);
    Path2D tail = new Path2D.Double();
    tail.moveTo(102, 32);
    tail.lineTo(121, 30);
    tail.lineTo(125, 33);
    tail.lineTo(106, 36);
    tail.closePath();
    outline(g, palette, tail);
    outline(g, palette, new RoundRectangle2D.Double(46, 47, 20, 8.5, 8, 8));
    Path2D wing = new Path2D.Double();
    wing.moveTo(48, 42);
    wing.lineTo(72, 42);
    wing.lineTo(92, 59);
    wing.lineTo(84, 60);
    wing.closePath();
    outline(g, palette, wing);
  }

  private static void spectrum(Graphics2D g, Palette palette) {
    double[] heights = {10, 16, 24, 33, 40, 44, 41, 36, 30, 24, 18, 13, 9};
    g.setColor(palette.bar());
    for (int i = 0; i < heights.length; i++) {
      g.fill(new Rectangle2D.Double(18 + 7.2 * i, 58 - heights[i], 5, heights[i]));
    }
    g.setColor(palette.ink3());
    g.draw(new Line2D.Double(14, 59, 114, 59));
  }

  private static void outline(Graphics2D g, Palette palette, Shape shape) {
    g.setColor(palette.ground());
    g.fill(shape);
    g.setColor(palette.ink3());
    g.draw(shape);
  }

  private static Color glass(Palette palette) {
    Color blue = palette.series().get(1);
    return new Color(blue.getRed(), blue.getGreen(), blue.getBlue(), palette.dark() ? 170 : 130);
  }
}
