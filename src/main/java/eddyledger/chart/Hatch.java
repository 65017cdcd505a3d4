package eddyledger.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.TexturePaint;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;

/**
 * Fill patterns: kinds of contribution are told apart by them, and by word, not by colour alone.
 */
public enum Hatch {
  /** Lines rising to the right: a leak. */
  RISING,
  /** Lines falling to the right: the first other source. */
  FALLING,
  /** Dots: further other sources. */
  DOTS;

  private static final int TILE = 6;
  private static final int FINE = 4;

  /** A paint with lines or dots in one colour on another, sharp on screens of any resolution. */
  public TexturePaint paint(Color lines, Color behind) {
    return paint(lines, behind, FINE);
  }

  /**
   * A paint with lines or dots in one colour on another, smooth at one resolution.
   *
   * @param scale pixels of the device to one of the drawing
   */
  public TexturePaint paint(Color lines, Color behind, double scale) {
    // a paint is not smoothed: only a tile of whole pixels of the device comes out as it was drawn
    int size = (int) Math.max(TILE, Math.round(TILE * scale));
    double fine = (double) size / TILE;
    BufferedImage image = new BufferedImage(size, size, BufferedImage.TYPE_INT_ARGB);
    Graphics2D g = image.createGraphics();
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    g.setColor(behind);
    g.fillRect(0, 0, size, size);
    g.setColor(lines);
    g.setStroke(new BasicStroke((float) fine));
    for (int shift = -size; shift <= size; shift += size) {
      switch (this) {
        case RISING -> g.draw(new Line2D.Double(shift - size, 2 * size, shift + 2 * size, -size));
        case FALLING -> g.draw(new Line2D.Double(shift - size, -size, shift + 2 * size, 2 * size));
        case DOTS -> {}
      }
    }
    if (this == DOTS) {
      double r = fine * 0.95;
      g.fill(new Ellipse2D.Double(size * 0.25 - r, size * 0.25 - r, 2 * r, 2 * r));
      g.fill(new Ellipse2D.Double(size * 0.75 - r, size * 0.75 - r, 2 * r, 2 * r));
    }
    g.dispose();
    double shown = size / scale;
    return new TexturePaint(image, new Rectangle2D.Double(0, 0, shown, shown));
  }
}
