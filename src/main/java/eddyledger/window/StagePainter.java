package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.chart.Hatch;
import eddyledger.chart.Palette;
import eddyledger.present.StagePicture;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;

/** Paints the small picture of a stage. */
final class StagePainter {
  private static final double CAPTION = 16.0;
  private static final double GAP = 1.4;
  private static final double LEAST_CELL = 30.0;
  private static final double MOST_CELL = 72.0;
  private static final BasicStroke THIN = new BasicStroke(1f);
  private static final BasicStroke CURVE =
      new BasicStroke(1.6f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
  private static final BasicStroke DASHED =
      new BasicStroke(1f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER, 10f, new float[] {3f}, 0f);

  private final Graphics2D g;
  private final Palette palette;
  private final StagePicture picture;
  private final Rectangle2D plot;
  private final Font small = Theme.small();

  private StagePainter(Graphics2D g, StagePicture picture, Rectangle2D area) {
    this.g = g;
    this.picture = picture;
    palette = Theme.palette();
    plot =
        new Rectangle2D.Double(
            area.getX(), area.getY(), area.getWidth(), area.getHeight() - CAPTION);
  }

  static void paint(Graphics2D g, StagePicture picture, Rectangle2D area) {
    StagePainter painter = new StagePainter(g, picture, area);
    switch (picture.kind()) {
      case NONE -> painter.nothing();
      case BANDS -> painter.bands();
      case BARS -> painter.bars();
      case CURVES -> painter.curves();
      case PROFILE -> painter.profile();
    }
  }

  /** The band under a point of a picture of bands; -1 if there is none. */
  static int bandAt(StagePicture picture, Rectangle2D area, double x) {
    if (picture.kind() != StagePicture.Kind.BANDS) {
      return -1;
    }
    int count = picture.rows().get(0).length;
    int band = (int) Math.floor((x - area.getX()) / area.getWidth() * count);
    return band < 0 || band >= count ? -1 : band;
  }

  private void nothing() {
    g.setFont(small);
    g.setColor(palette.ink3());
    double width = Digits.width(small, picture.middle());
    g.drawString(
        picture.middle(),
        (float) (plot.getCenterX() - width / 2),
        (float) (plot.getCenterY() + CAPTION / 2 + 4));
  }

  private void bands() {
    double[] values = picture.rows().get(0);
    double cell = plot.getWidth() / values.length;
    for (int i = 0; i < values.length; i++) {
      double left = plot.getX() + i * cell;
      if (Double.isNaN(values[i])) {
        g.setPaint(Hatch.RISING.paint(palette.hairline(), palette.paper()));
        g.fill(new Rectangle2D.Double(left, plot.getY(), cell - GAP, plot.getHeight()));
      } else {
        g.setColor(i == picture.marked() ? palette.accent() : palette.bar());
        double top = Math.min(y(values[i]), plot.getMaxY() - 1.0);
        g.fill(new Rectangle2D.Double(left, top, cell - GAP, plot.getMaxY() - top));
      }
    }
    foot();
  }

  private void bars() {
    double[] values = picture.rows().get(0);
    double cell = Math.min(MOST_CELL, plot.getWidth() / Math.max(1, values.length));
    boolean named = cell >= LEAST_CELL;
    g.setFont(small);
    for (int i = 0; i < values.length; i++) {
      boolean marked = i == picture.marked();
      double left = plot.getX() + i * cell;
      double top = y(values[i]);
      g.setColor(marked ? palette.accent() : palette.elsewhere());
      g.fill(new Rectangle2D.Double(left, top, cell - 2, plot.getMaxY() - top));
      if (named) {
        g.setColor(marked ? palette.paper() : palette.ink2());
        String name = MarkupPainter.cut(small, picture.names().get(i), cell - 6);
        centred(name, left + (cell - 2) / 2, plot.getCenterY() + 6);
        g.setColor(marked ? palette.accent() : palette.ink2());
        String value = String.format(java.util.Locale.ROOT, "%.2f", values[i]);
        centred(value, left + (cell - 2) / 2, plot.getMaxY() + CAPTION - 3);
      }
    }
    if (!named) {
      foot();
    }
    // the vehicle's own speed, to see by which the flow is faster or slower
    double one = y(1.0);
    g.setStroke(DASHED);
    g.setColor(palette.ink3());
    g.draw(new Line2D.Double(plot.getX(), one, plot.getX() + cell * values.length - 2, one));
    g.setStroke(THIN);
  }

  private void centred(String text, double x, double baseline) {
    g.drawString(text, (float) (x - Digits.width(g.getFont(), text) / 2), (float) baseline);
  }

  private void curves() {
    foot();
    g.setStroke(CURVE);
    int count = picture.rows().size();
    double[] x = picture.x();
    for (int row = count - 1; row >= 0; row--) {
      double[] values = picture.rows().get(row);
      g.setColor(row == 0 && count > 1 ? palette.accent() : palette.bar());
      Path2D path = new Path2D.Double();
      for (int i = 0; i < values.length; i++) {
        if (i == 0) {
          path.moveTo(x(x[i]), y(values[i]));
        } else {
          path.lineTo(x(x[i]), y(values[i]));
        }
      }
      g.draw(path);
      label(row, values);
    }
    if (picture.marked() >= 0) {
      double px = x(x[picture.marked()]);
      double py = y(picture.rows().get(0)[picture.marked()]);
      g.setColor(palette.paper());
      g.fill(new Ellipse2D.Double(px - 5.5, py - 5.5, 11, 11));
      g.setColor(palette.accent());
      g.fill(new Ellipse2D.Double(px - 4, py - 4, 8, 8));
    }
    g.setStroke(THIN);
  }

  /** A curve's name stands above it: the first at the right, the second where it has fallen. */
  private void label(int row, double[] values) {
    String name = picture.names().get(row);
    if (name.isEmpty()) {
      return;
    }
    g.setFont(small);
    g.setColor(palette.ink2());
    double width = Digits.width(small, name);
    int at = row == 0 ? values.length * 5 / 8 : values.length * 3 / 10;
    double left = Math.min(x(picture.x()[at]), plot.getMaxX() - width);
    g.drawString(name, (float) (left + 4), (float) (Math.max(y(values[at]), plot.getY() + 10) - 4));
  }

  private void profile() {
    foot();
    double[] speeds = picture.x();
    double[] heights = picture.rows().get(0);
    double most = speeds[speeds.length - 1];
    double scale = 0.62 * plot.getWidth() / most;
    g.setColor(palette.hairline());
    for (int i = 12; i < heights.length; i += 7) {
      double y = y(heights[i]);
      g.draw(new Line2D.Double(plot.getX(), y, plot.getX() + speeds[i] * scale, y));
    }
    double[] lines = picture.rows().get(1);
    g.setFont(small);
    for (int i = 0; i < lines.length; i++) {
      double y = y(lines[i]);
      g.setColor(palette.ink3());
      g.setStroke(DASHED);
      double right = plot.getX() + 0.66 * plot.getWidth();
      g.draw(new Line2D.Double(plot.getX(), y, right, y));
      g.setColor(palette.ink2());
      g.drawString(
          picture.names().get(i), (float) (right + 4), (float) Math.min(y + 4, plot.getMaxY() - 3));
    }
    g.setColor(palette.bar());
    g.setStroke(CURVE);
    Path2D path = new Path2D.Double();
    path.moveTo(plot.getX(), plot.getMaxY());
    for (int i = 1; i < heights.length; i++) {
      path.lineTo(plot.getX() + speeds[i] * scale, y(heights[i]));
    }
    path.lineTo(plot.getX() + most * scale, plot.getY());
    g.draw(path);
    g.setStroke(THIN);
  }

  private void foot() {
    g.setStroke(THIN);
    g.setColor(palette.hairline());
    g.draw(new Line2D.Double(plot.getX(), plot.getMaxY(), plot.getMaxX(), plot.getMaxY()));
    g.setColor(palette.ink2());
    g.setFont(small);
    float baseline = (float) (plot.getMaxY() + CAPTION - 3);
    g.drawString(picture.left(), (float) plot.getX(), baseline);
    double right = plot.getMaxX() - Digits.width(small, picture.right());
    g.drawString(picture.right(), (float) right, baseline);
    Color middle = palette.ink2();
    g.setColor(middle);
    centred(picture.middle(), plot.getCenterX(), baseline);
  }

  private double y(double value) {
    double part = (value - picture.bottom()) / (picture.top() - picture.bottom());
    return plot.getMaxY() - plot.getHeight() * Math.max(0.0, Math.min(1.0, part));
  }

  private double x(double value) {
    double[] x = picture.x();
    return plot.getX() + plot.getWidth() * (value - x[0]) / (x[x.length - 1] - x[0]);
  }
}
