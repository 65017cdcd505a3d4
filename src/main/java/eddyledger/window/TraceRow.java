package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.chart.Palette;
import eddyledger.present.LevelAxis;
import eddyledger.present.TraceAccount;
import eddyledger.present.TraceStage;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.function.IntConsumer;
import javax.accessibility.AccessibleRole;

/** One stage of a trace: its words, rule, numbers and notes, its picture, and the running level. */
final class TraceRow extends Painted {
  private static final double PICTURE_HEIGHT = 56.0;
  private static final double BAR = 9.0;
  private static final double TICK = 12.0;

  private transient TraceStage stage;
  private transient TraceAccount account;
  private final transient IntConsumer follow;

  /**
   * A row.
   *
   * @param account the account
   * @param stage the stage of it that is shown
   * @param follow called with a band that is clicked in the picture
   */
  TraceRow(TraceAccount account, TraceStage stage, IntConsumer follow) {
    super(AccessibleRole.LABEL);
    this.follow = follow;
    setFocusable(true);
    setToolTipText("");
    show(account, stage);
    listen();
  }

  /** Shows another stage; the focus stays where it is. */
  void show(TraceAccount other, TraceStage shown) {
    account = other;
    stage = shown;
    Theme.named(
        this, "trace.stage." + stage.number(), "Step " + stage.number() + ", " + stage.name());
    getAccessibleContext().setAccessibleDescription(String.join(". ", stage.lines()));
    repaint();
  }

  private void listen() {
    addFocusListener(
        new FocusAdapter() {
          @Override
          public void focusGained(FocusEvent event) {
            scrollRectToVisible(new java.awt.Rectangle(0, 0, getWidth(), getHeight()));
            repaint();
          }

          @Override
          public void focusLost(FocusEvent event) {
            repaint();
          }
        });
    addMouseListener(
        new MouseAdapter() {
          @Override
          public void mousePressed(MouseEvent event) {
            requestFocusInWindow();
            int band = band(event);
            if (band >= 0) {
              follow.accept(band);
            }
          }
        });
  }

  private int band(MouseEvent event) {
    Rectangle2D area = pictureArea(TraceColumns.of(getWidth()));
    return area.contains(event.getPoint())
        ? StagePainter.bandAt(stage.picture(), area, event.getX())
        : -1;
  }

  @Override
  public String getToolTipText(MouseEvent event) {
    int band = band(event);
    return band < 0 ? null : "Follow " + TraceAccount.bandNames().get(band);
  }

  /** Height the row needs at a width. */
  int heightFor(int width) {
    return (int) Math.ceil(new TraceWords(stage, TraceColumns.of(width)).height());
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics.create();
    Digits.smooth(g);
    Palette palette = Theme.palette();
    TraceColumns columns = TraceColumns.of(getWidth());
    g.setColor(palette.paper());
    g.fillRect(0, 0, getWidth(), getHeight());
    if (isFocusOwner()) {
      g.setColor(palette.selection());
      g.fillRect(
          TraceColumns.MARGIN - 8, 1, getWidth() - 2 * TraceColumns.MARGIN + 16, getHeight() - 2);
    }
    g.setColor(palette.hairline());
    g.fillRect(TraceColumns.MARGIN, getHeight() - 1, getWidth() - 2 * TraceColumns.MARGIN, 1);
    new TraceWords(stage, columns).paint(g, palette, getHeight());
    StagePainter.paint(g, stage.picture(), pictureArea(columns));
    level(g, palette, columns);
    g.dispose();
  }

  private Rectangle2D pictureArea(TraceColumns columns) {
    double top = (getHeight() - PICTURE_HEIGHT) / 2.0;
    return new Rectangle2D.Double(columns.picture(), top, columns.pictureWidth(), PICTURE_HEIGHT);
  }

  private void level(Graphics2D g, Palette palette, TraceColumns columns) {
    LevelAxis axis = account.axis();
    g.setStroke(new BasicStroke(1f));
    g.setColor(palette.grid());
    for (int tick : axis.ticks()) {
      double x = columns.at(axis, tick);
      g.draw(new Line2D.Double(x, 0, x, getHeight()));
    }
    double middle = getHeight() / 2.0;
    waterfall(g, palette, columns, middle);
    Font body = Theme.body();
    boolean last = stage.number() == account.stages().size();
    if (stage.kind() == TraceStage.LevelKind.NONE) {
      g.setFont(body);
      right(g, palette.ink3(), stage.levelText(), columns.level(), middle + 4);
      return;
    }
    g.setFont(body);
    right(g, palette.ink2(), stage.stepText(), columns.change(), middle + 1);
    g.setFont(last ? Theme.strong(13f) : body);
    right(g, palette.ink(), stage.levelText(), columns.level(), middle + 1);
    g.setFont(Theme.small());
    g.setColor(palette.ink2());
    double width = Digits.width(Theme.small(), stage.kind().word());
    g.drawString(stage.kind().word(), (float) (columns.level() - width), (float) (middle + 16));
  }

  private static void right(Graphics2D g, Color colour, String text, double x, double baseline) {
    g.setColor(colour);
    Digits.drawRight(g, text, x, baseline);
  }

  private void waterfall(Graphics2D g, Palette palette, TraceColumns columns, double middle) {
    LevelAxis axis = account.axis();
    List<TraceStage> stages = account.stages();
    int index = stage.number() - 1;
    double before = index == 0 ? Double.NaN : stages.get(index - 1).level();
    boolean follows = index + 1 < stages.size();
    if (Double.isFinite(before)) {
      double x = columns.at(axis, before);
      g.setColor(palette.ink3());
      g.draw(new Line2D.Double(x, 0, x, middle));
    }
    if (!Double.isFinite(stage.level())) {
      return;
    }
    double x = columns.at(axis, stage.level());
    if (follows && Double.isFinite(stages.get(index + 1).level())) {
      g.setColor(palette.ink3());
      g.draw(new Line2D.Double(x, middle, x, getHeight()));
    }
    if (Double.isFinite(before)) {
      double from = columns.at(axis, before);
      g.setColor(palette.bar());
      g.fill(new Rectangle2D.Double(Math.min(from, x), middle - BAR / 2, Math.abs(x - from), BAR));
    }
    g.setColor(palette.ink());
    g.setStroke(new BasicStroke(2f));
    g.draw(new Line2D.Double(x, middle - TICK / 2, x, middle + TICK / 2));
  }
}
