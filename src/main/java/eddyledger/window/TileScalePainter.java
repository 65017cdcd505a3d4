package eddyledger.window;

import eddyledger.chart.Hatch;
import eddyledger.chart.Marks;
import eddyledger.chart.Palette;
import eddyledger.ledger.State;
import eddyledger.present.TargetTile;
import eddyledger.present.TileScale;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;

/** Paints a tile's scale: target, reserve, level and model range on one line. */
final class TileScalePainter {
  private static final double TICK = 6.0;
  private static final double HATCH = 4.5;
  private static final double DOT = 8.0;
  private static final double HALO = 1.5;
  private static final double BRACKET = 7.5;
  private static final double CAP = 2.5;

  private final Palette palette;
  private final Hatching reserve;

  TileScalePainter(Palette palette) {
    this.palette = palette;
    this.reserve = new Hatching(Hatch.RISING, palette.ink3());
  }

  /** Paints from x to x + width around y; on a ground of the colour given. */
  void paint(Graphics2D g, TargetTile tile, double x, double y, double width, Color ground) {
    TileScale scale = tile.scale();
    g.setColor(palette.hairline());
    g.fill(new Rectangle2D.Double(x, y - 0.75, width, 1.5));
    if (scale.hasTarget()) {
      double target = x + width * scale.target();
      double allowed = x + width * scale.allowed();
      g.setPaint(ground);
      g.fill(new Rectangle2D.Double(allowed, y - HATCH, target - allowed, 2.0 * HATCH));
      g.setPaint(reserve.on(g));
      g.fill(new Rectangle2D.Double(allowed, y - HATCH, target - allowed, 2.0 * HATCH));
      g.setColor(palette.ink());
      g.fill(new Rectangle2D.Double(target - 0.75, y - TICK, 1.5, 2.0 * TICK));
    }
    if (scale.hasRange()) {
      bracket(g, x + width * scale.from(), x + width * scale.to(), y + BRACKET);
    }
    if (scale.hasLevel()) {
      dot(g, tile.verdict().state(), tile.stale(), x + width * scale.level(), y, ground);
    }
  }

  private void bracket(Graphics2D g, double from, double to, double y) {
    g.setColor(palette.ink2());
    g.setStroke(new BasicStroke(1.5f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_MITER));
    g.draw(new Line2D.Double(from, y, to, y));
    g.draw(new Line2D.Double(from, y - CAP, from, y + CAP));
    g.draw(new Line2D.Double(to, y - CAP, to, y + CAP));
  }

  private void dot(Graphics2D g, State state, boolean stale, double x, double y, Color ground) {
    double halo = DOT + 2.0 * HALO;
    g.setColor(ground);
    g.fill(new Ellipse2D.Double(x - halo / 2.0, y - halo / 2.0, halo, halo));
    if (state == null || stale) {
      Marks.paint(g, palette, null, x, y, DOT);
      return;
    }
    // on the scale the place says what the mark's shape says elsewhere
    g.setColor(palette.stateMark(state));
    g.fill(new Ellipse2D.Double(x - DOT / 2.0, y - DOT / 2.0, DOT, DOT));
  }
}
