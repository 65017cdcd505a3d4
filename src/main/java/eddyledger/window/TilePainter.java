package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.chart.Marks;
import eddyledger.chart.Palette;
import eddyledger.present.TargetTile;
import eddyledger.present.Verdict;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.RoundRectangle2D;

/** Paints tiles of the target strip in one palette. */
final class TilePainter {
  /** Height of a tile that is not chosen, pixels; a chosen one runs on into the ledger. */
  private static final int HEIGHT = 92;

  private static final int PAD = 12;
  private static final int ARC = 6;
  private static final int TOP_EDGE = 3;
  private static final int FIRST = 20;
  private static final int SECOND = 49;
  private static final int SCALE = 62;
  private static final int THIRD = 84;
  private static final int GAP = 6;
  private static final String UNIT = "dB(A)";

  /** Stands behind numbers that are being computed anew. */
  private static final String MARK = " \u2026";

  private static final double CONDITION_SHARE = 0.4;

  private final Palette palette;
  private final Lettering lettering;
  private final TileScalePainter scale;

  TilePainter(Palette palette, Lettering lettering) {
    this.palette = palette;
    this.lettering = lettering;
    this.scale = new TileScalePainter(palette);
  }

  /** Whether it paints in a palette. */
  boolean in(Palette other) {
    return palette == other;
  }

  /** Paints a tile of a size. */
  void paint(Graphics2D g, TargetTile tile, int width, int height, boolean focused) {
    Digits.smooth(g);
    double right = width - (double) PAD;
    Color ground = ground(g, tile, width, height);
    first(g, tile, right);
    second(g, tile, right);
    scale.paint(g, tile, PAD, SCALE, right - PAD, ground);
    lettering.left(g, Theme.small(), palette.ink2(), tile.target(), PAD, THIRD);
    lettering.right(g, Theme.small(), palette.ink2(), tile.range(), right, THIRD);
    if (focused) {
      g.setColor(palette.accent());
      g.setStroke(new BasicStroke(1f));
      g.draw(new RoundRectangle2D.Double(3.5, 6.5, width - 7.0, HEIGHT - 10.0, ARC, ARC));
    }
  }

  private Color ground(Graphics2D g, TargetTile tile, int width, int height) {
    double right = width - 0.5;
    g.setStroke(new BasicStroke(1f));
    if (!tile.selected()) {
      Color ground = Mix.half(palette.ground(), palette.paper());
      RoundRectangle2D edge =
          new RoundRectangle2D.Double(0.5, 0.5, right - 0.5, HEIGHT - 1.0, ARC, ARC);
      g.setColor(ground);
      g.fill(edge);
      g.setColor(palette.hairline());
      g.draw(edge);
      return ground;
    }
    g.setColor(palette.paper());
    g.fillRect(0, 0, width, height);
    g.setColor(palette.hairline());
    Path2D sides = new Path2D.Double();
    sides.moveTo(0.5, 0.0);
    sides.lineTo(0.5, height);
    sides.moveTo(right, 0.0);
    sides.lineTo(right, height);
    g.draw(sides);
    g.setColor(palette.ink());
    g.fillRect(0, 0, width, TOP_EDGE);
    return palette.paper();
  }

  /** Place and condition; another target that is not met, else what is missing or the reserve. */
  private void first(Graphics2D g, TargetTile tile, double edge) {
    Font strong = Theme.strong(12);
    double names =
        lettering.width(strong, tile.place())
            + GAP
            + lettering.width(Theme.body(), tile.condition());
    double right = edge;
    double corner = lettering.width(Theme.small(), tile.corner());
    double other = tile.others() == null ? 0.0 : otherWidth(tile);
    boolean both = names + corner + other + 2.0 * GAP + GAP <= edge - PAD;
    if (tile.others() == null || both) {
      lettering.right(g, Theme.small(), palette.ink2(), tile.corner(), right, FIRST);
      right -= corner + (tile.corner().isEmpty() ? 0 : GAP + GAP);
    }
    if (tile.others() != null) {
      other(g, tile, right);
      right -= other + GAP;
    }
    names(g, tile, right - PAD);
  }

  /** The place has the most of the room, but never all of it: two seats may differ in condition. */
  private void names(Graphics2D g, TargetTile tile, double room) {
    Font strong = Theme.strong(12);
    double condition = lettering.width(Theme.body(), tile.condition());
    double kept = Math.min(condition, room * CONDITION_SHARE);
    double x = PAD;
    x +=
        lettering.fitted(g, strong, palette.ink(), tile.place(), x, FIRST, room - kept - GAP) + GAP;
    double left = PAD + room - x;
    lettering.fitted(g, Theme.body(), palette.ink2(), tile.condition(), x, FIRST, left);
  }

  private double otherWidth(TargetTile tile) {
    return lettering.width(Theme.strong(11), tile.others().text()) + 13.0;
  }

  private void other(Graphics2D g, TargetTile tile, double right) {
    Color ink = tile.stale() ? palette.ink2() : palette.stateText(tile.others().state());
    lettering.right(g, Theme.strong(11), ink, tile.others().text(), right, FIRST);
    double mark = right - otherWidth(tile) + 4.0;
    Marks.paint(g, palette, tile.others().state(), mark, FIRST - 4.0, 7.0);
  }

  private void second(Graphics2D g, TargetTile tile, double right) {
    Color ink = tile.stale() ? palette.ink2() : palette.ink();
    double x = PAD;
    if (!tile.bound().isEmpty()) {
      Font sign = Theme.plain(18);
      lettering.left(g, sign, ink, tile.bound(), x, SECOND);
      x += lettering.width(sign, tile.bound()) + GAP;
    }
    Font large = Theme.strong(24);
    g.setFont(large);
    g.setColor(tile.counted() ? ink : palette.ink3());
    Digits.drawLeft(g, tile.level(), x, SECOND);
    x += Digits.numberWidth(large, tile.level()) + GAP;
    double room = verdict(g, tile, right) - GAP - x;
    String unit = tile.stale() ? UNIT + MARK : UNIT;
    if (tile.counted()) {
      // where all do not fit, the unit is what everyone knows
      boolean fits = lettering.width(Theme.small(), unit) <= room;
      String shown = fits ? unit : tile.stale() ? MARK.strip() : "";
      lettering.left(g, Theme.small(), palette.ink2(), shown, x, SECOND);
    }
  }

  /** Paints the verdict up to the right edge; where it begins. */
  private double verdict(Graphics2D g, TargetTile tile, double edge) {
    Verdict verdict = tile.verdict();
    Color text = palette.stateText(tile.stale() ? null : verdict.state());
    double right = edge;
    Font word = Theme.strong(12);
    lettering.right(g, word, text, verdict.word(), right, SECOND);
    if (verdict.state() == null) {
      return right - lettering.width(word, verdict.word());
    }
    right -= lettering.width(word, verdict.word()) + 11.0;
    Marks.paint(g, palette, verdict.state(), right, SECOND - 4.5, 9.0);
    right -= 11.0;
    Font large = Theme.strong(16);
    lettering.number(g, large, text, verdict.number(), right, SECOND);
    return right - Digits.numberWidth(large, verdict.number());
  }
}
