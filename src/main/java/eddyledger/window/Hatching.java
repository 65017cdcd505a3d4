package eddyledger.window;

import eddyledger.chart.Hatch;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Paint;
import java.util.HashMap;
import java.util.Map;

/** A pattern in one colour on whatever is behind it, made once for each resolution. */
final class Hatching {
  private static final Color CLEAR = new Color(0, true);

  private final Hatch hatch;
  private final Color lines;
  private final Map<Double, Paint> paints = new HashMap<>();

  Hatching(Hatch hatch, Color lines) {
    this.hatch = hatch;
    this.lines = lines;
  }

  /** The paint for what is drawn on. */
  Paint on(Graphics2D g) {
    double scale = g.getTransform().getScaleX();
    return paints.computeIfAbsent(scale, it -> hatch.paint(lines, CLEAR, it));
  }
}
