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

  /** A paint with lines or dots in one colour on another. */
  public TexturePaint paint(Color lines, Color behind) {
    // drawn larger than it is shown, so that it stays sharp on screens of high resolution
    int size = TILE * FINE;
    BufferedImage image = new BufferedImage(size, size, BufferedImage.TYPE_INT_ARGB);
    Graphics2D g = image.createGraphics();
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    g.setColor(behind);
    g.fillRect(0, 0, size, size);
    g.setColor(lines);
    g.setStroke(new BasicStroke(FINE));
    for (int shift = -size; shift <= size; shift += size) {
      switch (this) {
        case RISING -> g.draw(new Line2D.Double(shift - size, 2 * size, shift + 2 * size, -size));
        case FALLING -> g.draw(new Line2D.Double(shift - size, -size, shift + 2 * size, 2 * size));
        case DOTS -> {}
      }
    }
    if (this == DOTS) {
      double r = FINE * 0.8;
      g.fill(new Ellipse2D.Double(size * 0.25 - r, size * 0.25 - r, 2 * r, 2 * r));
      g.fill(new Ellipse2D.Double(size * 0.75 - r, size * 0.75 - r, 2 * r, 2 * r));
    }
    g.dispose();
    return new TexturePaint(image, new Rectangle2D.Double(0, 0, TILE, TILE));
  }
}
