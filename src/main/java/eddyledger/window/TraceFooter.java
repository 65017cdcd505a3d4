package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.chart.Marks;
import eddyledger.chart.Palette;
import eddyledger.present.TraceTotal;
import java.awt.Dimension;
import java.awt.Font;
import java.awt.Graphics;
import java.awt.Graphics2D;
import javax.accessibility.AccessibleRole;

/** The bottom line of a trace: all bands together, and how they stand. */
final class TraceFooter extends Painted {
  private static final int HEIGHT = 44;
  private static final int BASELINE = 28;
  private static final double MARK = 9.0;

  private transient TraceTotal total;
  private int columnsWidth;

  TraceFooter() {
    super(AccessibleRole.LABEL);
    setFocusable(true);
    setPreferredSize(new Dimension(TraceColumns.LEAST_WIDTH, HEIGHT));
    Theme.named(this, "trace.total", "All bands together");
  }

  void show(TraceTotal shown) {
    total = shown;
    getAccessibleContext().setAccessibleDescription(shown.line());
    repaint();
  }

  /** Width of the page above, so that the columns stand in line beside a scroll bar. */
  void columnsWidth(int width) {
    columnsWidth = width;
    repaint();
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    if (total == null) {
      return;
    }
    Graphics2D g = (Graphics2D) graphics.create();
    Digits.smooth(g);
    Palette palette = Theme.palette();
    int width = columnsWidth > 0 ? columnsWidth : getWidth();
    TraceColumns columns = TraceColumns.of(width);
    g.setColor(palette.paper());
    g.fillRect(0, 0, getWidth(), HEIGHT);
    g.setColor(palette.ink());
    g.fillRect(TraceColumns.MARGIN, 0, width - 2 * TraceColumns.MARGIN, 1);
    g.fillRect(TraceColumns.MARGIN, 3, width - 2 * TraceColumns.MARGIN, 1);
    Font strong = Theme.strong(13f);
    g.setFont(strong);
    g.drawString(total.heading(), (float) columns.step(), BASELINE);
    judgement(g, palette, columns);
    g.setFont(Theme.body());
    g.setColor(palette.ink2());
    double room = columns.change() - columns.picture() - 40;
    g.drawString(
        MarkupPainter.cut(Theme.body(), total.share(), room), (float) columns.picture(), BASELINE);
    g.setColor(palette.ink());
    g.setFont(Theme.strong(16f));
    Digits.drawRight(g, total.level(), columns.level(), BASELINE + 1);
    g.dispose();
  }

  private void judgement(Graphics2D g, Palette palette, TraceColumns columns) {
    Font body = Theme.body();
    g.setFont(body);
    g.setColor(total.judged() ? palette.ink() : palette.ink2());
    double x = columns.rule();
    g.drawString(total.allowance(), (float) x, BASELINE);
    if (!total.judged()) {
      return;
    }
    x += Digits.width(body, total.allowance() + " ");
    Font strong = Theme.strong(12f);
    g.setFont(strong);
    g.setColor(palette.stateText(total.state()));
    Digits.drawLeft(g, total.margin(), x, BASELINE);
    x += Digits.numberWidth(strong, total.margin()) + 12;
    Marks.paint(g, palette, total.state(), x, BASELINE - 4.5, MARK);
    g.setFont(strong);
    g.setColor(palette.stateText(total.state()));
    g.drawString(total.stateWord(), (float) (x + 9), BASELINE);
  }
}
