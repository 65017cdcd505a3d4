package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.chart.Palette;
import eddyledger.present.LevelAxis;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import javax.accessibility.AccessibleRole;

/** The heading over the columns of a trace, with the axis of the running level. */
final class TraceHeading extends Painted {
  private static final int HEIGHT = 30;
  private static final int BASELINE = 19;

  private transient LevelAxis axis;

  TraceHeading() {
    super(AccessibleRole.LABEL);
    Theme.named(this, "trace.heading", "Columns: step, rule, picture, running level");
    setPreferredSize(new Dimension(TraceColumns.LEAST_WIDTH, HEIGHT));
  }

  void show(LevelAxis shown) {
    axis = shown;
    repaint();
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics.create();
    Digits.smooth(g);
    Palette palette = Theme.palette();
    g.setColor(palette.paper());
    g.fillRect(0, 0, getWidth(), HEIGHT);
    TraceColumns columns = TraceColumns.of(getWidth());
    g.setFont(Theme.small());
    g.setColor(palette.ink2());
    g.drawString("Step", (float) columns.step(), BASELINE);
    g.drawString("Rule, and its numbers", (float) columns.rule(), BASELINE);
    g.drawString("Picture", (float) columns.picture(), BASELINE);
    right(g, "Step, dB", columns.change());
    right(g, "Level, dB", columns.level());
    if (axis != null) {
      for (int tick : axis.ticks()) {
        String text = tick < 0 ? "−" + -tick : Integer.toString(tick);
        boolean first = tick == axis.ticks().get(0);
        double x = columns.at(axis, tick);
        double width = Digits.width(g.getFont(), text);
        g.drawString(first ? text + " dB" : text, (float) (x - width / 2), BASELINE);
      }
    }
    g.setColor(palette.hairline());
    g.fillRect(TraceColumns.MARGIN, HEIGHT - 1, getWidth() - 2 * TraceColumns.MARGIN, 1);
    g.dispose();
  }

  private static void right(Graphics2D g, String text, double x) {
    g.drawString(text, (float) (x - Digits.width(g.getFont(), text)), BASELINE);
  }
}
