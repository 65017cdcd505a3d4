package eddyledger.window;

import eddyledger.chart.Hatch;
import eddyledger.chart.Palette;
import eddyledger.present.BandScale;
import eddyledger.present.BandStrip;
import eddyledger.quantity.Bands;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;

/** Paints the bars of a band strip. */
final class BandStripPainter {
  private static final int LEFT = 6;
  private static final double GAP = 1.4;
  private static final double AIR = 3.0;
  private static final BasicStroke EDGE = new BasicStroke(0.9f);

  private final Palette palette;
  private final Hatching hatch;
  private final Hatching peakHatch;

  BandStripPainter(Palette palette) {
    this.palette = palette;
    this.hatch = new Hatching(Hatch.RISING, palette.bar());
    this.peakHatch = new Hatching(Hatch.RISING, palette.peakBar());
  }

  /** Where the middle of a band stands in a cell of a width, pixels. */
  static double middle(int band, int width) {
    return LEFT + (band + 0.5) * pitch(width) - GAP / 2.0;
  }

  /** Where the last bar ends. */
  static double end(int width) {
    return LEFT + Bands.COUNT * pitch(width) - GAP;
  }

  /** Where the first bar begins. */
  static double start() {
    return LEFT;
  }

  // whole pixels, so that all bars look the same
  private static int pitch(int width) {
    return Math.max(3, (width - 2 * LEFT) / Bands.COUNT);
  }

  /** Paints the bars of a strip into a cell. */
  void paint(Graphics2D g, BandStrip strip, BandScale scale, boolean stale, int width, int height) {
    int pitch = pitch(width);
    double bottom = height - AIR;
    double most = bottom - AIR;
    for (int band = 0; band < Bands.COUNT; band++) {
      double level = strip.levels().value(band);
      if (Double.isNaN(level)) {
        continue;
      }
      double high = scale.height(level) * most;
      double x = LEFT + (double) band * pitch;
      boolean peak = band == strip.peak() && !stale;
      bar(g, strip.fill(), peak, new Rectangle2D.Double(x, bottom - high, pitch - GAP, high));
    }
  }

  private void bar(Graphics2D g, BandStrip.Fill fill, boolean peak, Rectangle2D.Double bar) {
    Color ink = peak ? palette.peakBar() : palette.bar();
    if (bar.height < 1.0) {
      // below the scale there is still something
      g.setColor(palette.hairline());
      g.fill(new Rectangle2D.Double(bar.x, bar.getMaxY() - 1.0, bar.width, 1.0));
      return;
    }
    switch (fill) {
      case SOLID -> {
        g.setColor(ink);
        g.fill(bar);
      }
      case HATCHED -> {
        g.setColor(palette.grid());
        g.fill(bar);
        g.setPaint((peak ? peakHatch : hatch).on(g));
        g.fill(bar);
        g.setColor(ink);
        g.fill(new Rectangle2D.Double(bar.x, bar.y, bar.width, 1.0));
      }
      case HOLLOW -> {
        g.setColor(ink);
        g.setStroke(EDGE);
        double half = EDGE.getLineWidth() / 2.0;
        double inner = Math.max(0.1, bar.height - 2.0 * half);
        g.draw(new Rectangle2D.Double(bar.x + half, bar.y + half, bar.width - 2.0 * half, inner));
      }
    }
  }
}
