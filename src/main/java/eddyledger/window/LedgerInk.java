package eddyledger.window;

import eddyledger.chart.Marks;
import eddyledger.chart.Palette;
import eddyledger.ledger.State;
import eddyledger.present.LedgerColumn;
import eddyledger.present.LedgerHeading;
import eddyledger.present.LedgerLine;
import eddyledger.present.LedgerLine.Twig;
import eddyledger.present.Verdict;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;

/** Paints the cells of the ledger in one palette. */
final class LedgerInk {
  /** Width of the bar left of the selected line while the ledger has the focus, pixels. */
  private static final int FOCUS = 2;

  private static final int TEXT = 15;
  private static final double SMALL_SHARE = 0.01;
  private static final BasicStroke CHEVRON =
      new BasicStroke(1.3f, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);

  private final Palette palette;
  private final Lettering lettering;
  private final BandStripPainter strips;
  private final GutterPainter gutter;
  private final Font body = Theme.body();
  private final Font strong = Theme.strong(12);
  private final Font small = Theme.small();

  LedgerInk(Palette palette, Lettering lettering) {
    this.palette = palette;
    this.lettering = lettering;
    this.strips = new BandStripPainter(palette);
    this.gutter = new GutterPainter(palette);
  }

  Palette palette() {
    return palette;
  }

  /** Paints a column of a line into a cell of a size. */
  void paint(
      Graphics2D g, LedgerLine line, LedgerColumn column, LedgerHeading heading, int w, int h) {
    boolean stale = heading.stale();
    Color ink = stale ? palette.ink2() : palette.ink();
    Font font = line.sum() ? strong : body;
    switch (column) {
      case NAME -> name(g, line, font, w);
      case BANDS -> bands(g, line, heading, w, h);
      case LEVEL -> {
        boolean none = line.level().length() < 2;
        number(g, font, none ? palette.ink3() : ink, line.level(), w - LedgerCells.PAD);
      }
      case SHARE -> share(g, line, ink, w);
      case ALLOWANCE -> number(g, font, ink, line.allowance(), w - LedgerCells.PAD);
      case MARGIN -> margin(g, line.verdict(), stale);
      case LAY_UP -> text(g, line.layUp(), w);
      case MASS -> number(g, font, palette.ink(), line.mass(), w - LedgerCells.PAD);
      case SUPPLIER -> text(g, line.supplier(), w);
    }
    if (line.ruled()) {
      g.setColor(palette.hairline());
      g.fillRect(0, 0, w, 1);
    }
  }

  /** Paints a mark of the gutter into a line that stands at a height in the table. */
  void gutter(Graphics2D g, GutterMark mark, int height, int top) {
    gutter.paint(g, mark, height, top);
  }

  /** Paints what marks the selected line while the ledger has the focus. */
  void focus(Graphics2D g, int height) {
    g.setColor(palette.accent());
    g.fillRect(0, 0, FOCUS, height);
  }

  private void name(Graphics2D g, LedgerLine line, Font font, int w) {
    int x = LedgerCells.textLeft(line);
    if (line.twig() != Twig.LEAF) {
      chevron(g, line.twig() == Twig.OPEN, LedgerCells.chevron(line), 11.0);
    }
    boolean dim = !line.strip().drawn() && line.twig() == Twig.LEAF;
    Color ink = dim ? palette.ink2() : palette.ink();
    double used =
        lettering.fitted(g, font, ink, line.name(), x, TEXT, LedgerCells.nameRoom(line, w));
    double left = x + used + LedgerCells.PAD;
    if (!line.kind().isEmpty()) {
      double room = w - left - LedgerCells.PAD;
      lettering.fitted(g, small, palette.ink2(), line.kind(), left, TEXT, room);
    }
  }

  private void chevron(Graphics2D g, boolean open, double x, double y) {
    Path2D path = new Path2D.Double();
    if (open) {
      path.moveTo(x - 3.5, y - 1.75);
      path.lineTo(x, y + 1.75);
      path.lineTo(x + 3.5, y - 1.75);
    } else {
      path.moveTo(x - 1.75, y - 3.5);
      path.lineTo(x + 1.75, y);
      path.lineTo(x - 1.75, y + 3.5);
    }
    g.setColor(palette.ink2());
    g.setStroke(CHEVRON);
    g.draw(path);
  }

  private void bands(Graphics2D g, LedgerLine line, LedgerHeading heading, int w, int h) {
    if (line.strip().drawn()) {
      strips.paint(g, line.strip(), heading.scale(), heading.stale(), w, h);
      return;
    }
    double x = BandStripPainter.start();
    double room = w - x - LedgerCells.PAD;
    Color ink = heading.stale() ? palette.ink2() : palette.stateText(State.OVER);
    boolean fault = line.twig() == Twig.LEAF && !line.reason().isEmpty();
    lettering.fitted(g, small, fault ? ink : palette.ink2(), line.strip().reason(), x, TEXT, room);
  }

  private void share(Graphics2D g, LedgerLine line, Color ink, int w) {
    if (line.share().isEmpty()) {
      return;
    }
    int end = LedgerCells.SHARE_END;
    String number = line.share().replace(" %", "");
    number(g, body, line.bar() < SMALL_SHARE ? palette.ink2() : ink, number, end);
    lettering.left(g, small, palette.ink2(), "%", end + 4.0, TEXT);
    double from = end + 20.0;
    double length = w - LedgerCells.PAD - from;
    g.setColor(palette.grid());
    g.fill(new Rectangle2D.Double(from, 10.5, length, 1.0));
    g.setColor(line.sum() ? ink : palette.ink2());
    g.fill(new Rectangle2D.Double(from, 9.5, Math.max(1.0, length * line.bar()), 3.0));
  }

  private void margin(Graphics2D g, Verdict verdict, boolean stale) {
    State state = verdict.state();
    Color text = palette.stateText(stale ? null : state);
    if (state == null) {
      lettering.left(g, small, palette.ink2(), verdict.word(), LedgerCells.MARGIN_START, TEXT);
      return;
    }
    Font font = state == State.OVER ? strong : body;
    number(g, font, text, verdict.number(), LedgerCells.MARGIN_END);
    double mark = LedgerCells.MARGIN_END + 12.0;
    Marks.paint(g, palette, state, mark, 11.0, 7.0);
    lettering.left(g, small, text, verdict.word(), mark + 9.0, TEXT);
  }

  private void text(Graphics2D g, String text, int w) {
    double room = w - 2.0 * LedgerCells.PAD;
    lettering.fitted(g, body, palette.ink(), text, LedgerCells.PAD, TEXT, room);
  }

  private void number(Graphics2D g, Font font, Color ink, String number, double right) {
    if (!number.isEmpty()) {
      lettering.number(g, font, ink, number, right, TEXT);
    }
  }
}
