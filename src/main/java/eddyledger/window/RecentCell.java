package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.chart.Marks;
import eddyledger.chart.Palette;
import eddyledger.present.RecentLine;
import eddyledger.present.RecentLine.Count;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import javax.accessibility.AccessibleRole;
import javax.swing.JList;
import javax.swing.ListCellRenderer;

/** Paints a file opened lately: band strip, name, folder, what it holds, when, targets by state. */
final class RecentCell extends Painted implements ListCellRenderer<RecentLine> {
  /** Height of a line, pixels. */
  static final int HEIGHT = 66;

  private static final int ARC = 6;
  private static final int STRIP = 12;
  private static final double STRIP_WIDTH = 96.0;
  private static final double STRIP_HEIGHT = 36.0;
  private static final int TEXT = 128;
  private static final int RIGHT = 14;
  private static final int FIRST = 29;
  private static final int SECOND = 48;

  /** The strip shows so many decibels below its highest band. */
  private static final double SPAN = 45.0;

  private transient RecentLine line;
  private boolean selected;
  private boolean focused;

  RecentCell() {
    super(AccessibleRole.LABEL);
    setPreferredSize(new Dimension(640, HEIGHT));
  }

  @Override
  public Component getListCellRendererComponent(
      JList<? extends RecentLine> list,
      RecentLine shown,
      int index,
      boolean chosen,
      boolean hasFocus) {
    line = shown;
    selected = chosen;
    focused = chosen && list.isFocusOwner();
    getAccessibleContext().setAccessibleName(shown.spoken());
    setToolTipText(shown.file().toString());
    return this;
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics.create();
    Digits.smooth(g);
    Palette palette = Theme.palette();
    g.setColor(palette.paper());
    g.fillRect(0, 0, getWidth(), HEIGHT);
    if (selected) {
      g.setColor(palette.selection());
      g.fillRoundRect(0, 0, getWidth(), HEIGHT, ARC, ARC);
      if (focused) {
        g.setColor(palette.accent());
        g.drawRoundRect(0, 0, getWidth() - 1, HEIGHT - 1, ARC, ARC);
      }
    } else {
      g.setColor(palette.hairline());
      g.fillRect(0, HEIGHT - 1, getWidth(), 1);
    }
    strip(g, palette);
    double counts = counts(g, palette);
    words(g, palette, counts);
    g.dispose();
  }

  private void words(Graphics2D g, Palette palette, double right) {
    g.setFont(Theme.body());
    g.setColor(palette.ink2());
    double whenWidth = Digits.numberWidth(g.getFont(), line.when());
    Digits.drawRight(g, line.when(), getWidth() - RIGHT, FIRST);
    double room = getWidth() - RIGHT - whenWidth - 16 - TEXT;
    String name = MarkupPainter.cut(Theme.strong(13f), line.name(), room);
    g.setFont(Theme.strong(13f));
    g.setColor(line.missing() ? palette.ink3() : palette.ink());
    g.drawString(name, TEXT, FIRST);
    double after = Digits.width(g.getFont(), name) + 12;
    g.setFont(Theme.small());
    g.setColor(palette.ink2());
    if (room - after > 40) {
      String folder = MarkupPainter.cut(Theme.small(), line.folder(), room - after);
      g.drawString(folder, (float) (TEXT + after), FIRST);
    }
    g.setFont(Theme.body());
    String description = MarkupPainter.cut(Theme.body(), line.description(), right - TEXT - 16);
    g.drawString(description, TEXT, SECOND);
  }

  /** Paints the counts from the right and says where they begin. */
  private double counts(Graphics2D g, Palette palette) {
    double x = getWidth() - RIGHT;
    g.setFont(Theme.body());
    List<Count> counts = line.counts();
    for (int i = counts.size() - 1; i >= 0; i--) {
      Count count = counts.get(i);
      g.setColor(palette.stateText(count.state()));
      double width = Digits.numberWidth(g.getFont(), count.text());
      Digits.drawRight(g, count.text(), x, SECOND);
      Marks.paint(g, palette, count.state(), x - width - 9, SECOND - 4.5, 8);
      x -= width + 13 + 14;
    }
    return x;
  }

  private void strip(Graphics2D g, Palette palette) {
    BandSpectrum levels = line.levels();
    int peak = -1;
    for (int band = 0; band < Bands.COUNT; band++) {
      if (levels.has(band) && (peak < 0 || levels.value(band) > levels.value(peak))) {
        peak = band;
      }
    }
    double cell = STRIP_WIDTH / Bands.COUNT;
    double foot = (HEIGHT + STRIP_HEIGHT) / 2.0;
    for (int band = 0; band < Bands.COUNT && peak >= 0; band++) {
      if (levels.has(band)) {
        double below = levels.value(peak) - levels.value(band);
        double height = Math.max(1.0, STRIP_HEIGHT * (1.0 - below / SPAN));
        g.setColor(
            line.missing() ? palette.hairline() : band == peak ? palette.peakBar() : palette.bar());
        g.fill(new Rectangle2D.Double(STRIP + band * cell, foot - height, cell - 1.0, height));
      }
    }
    if (peak < 0) {
      g.setColor(palette.hairline());
      g.fill(new Rectangle2D.Double(STRIP, foot - 1, STRIP_WIDTH, 1));
    }
  }
}
