package eddyledger.chart;

import eddyledger.ledger.State;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/** The labels at the column over all bands: what it is, what it may be, and its parts by name. */
final class StackLabels {
  private static final double LEADER = 20.0;
  private static final double ELBOW = 8.0;
  private static final double SAMPLE = 10.0;
  private static final double NAME_GAP = 7.0;
  private static final double LEFT_GAP = 14.0;
  private static final double LONGEST_NAME = 170.0;
  private static final double HANGING = 15.0;
  private static final double HUNG = 36.0;
  private static final double LINE = 1.28;
  private static final double BASELINE = 0.36;

  private final ChartStyle style;
  private final StackParts parts;
  private final Optional<AllowedLine> allowed;
  private final String total;
  private final double allowedShare;

  /**
   * @param total the overall level as text
   * @param allowedShare how high the allowed level stands in the plot, 0 to 1; NaN if none
   */
  StackLabels(
      ChartStyle style,
      StackParts parts,
      Optional<AllowedLine> allowed,
      String total,
      double allowedShare) {
    this.style = style;
    this.parts = parts;
    this.allowed = allowed;
    this.total = total;
    this.allowedShare = allowedShare;
  }

  /**
   * Room wanted left of the column, pixels.
   *
   * @param lastBands the highest level in the last bands, dB(A): over low bands, as they usually
   *     are, the words may hang
   */
  double before(double lastBands) {
    double widest = 0.0;
    if (allowed.isPresent() && allowed.get().overall() - lastBands > HANGING) {
      return HUNG;
    }
    if (allowed.isPresent()) {
      AllowedLine line = allowed.get();
      widest =
          Math.max(
              Digits.width(style.strongSmall(), line.overallWords()),
              Digits.width(style.strongSmall(), line.excessWords()));
    }
    return widest + 2.0 * LEFT_GAP;
  }

  /** Room wanted right of the column, pixels. */
  double after() {
    double widest = 0.0;
    for (StackPart part : parts.parts()) {
      widest = Math.max(widest, Digits.width(font(part), part.label()));
    }
    return LEADER + shareWidth() + NAME_GAP + Math.min(widest, LONGEST_NAME) + 2.0;
  }

  private double shareWidth() {
    return Digits.numberWidth(style.strongSmall(), "100 %");
  }

  private Font font(StackPart part) {
    return part.selected() ? style.strongSmall() : style.small();
  }

  void paint(
      Graphics2D g2, Rectangle2D whole, List<Rectangle2D> places, double x, Rectangle2D area) {
    level(g2, whole, area);
    allowed(g2, whole, area);
    names(g2, places, x, area);
  }

  /** Where the overall level is not known: what is allowed, and the parts with their fills. */
  void withoutColumn(Graphics2D g2, Rectangle2D whole, double x, Rectangle2D area) {
    allowed(g2, whole, area);
    FillPaints paints = new FillPaints(style.palette());
    double gap = style.small().getSize2D() * LINE;
    double y = area.getMaxY() - gap / 2.0;
    for (StackPart part : parts.parts()) {
      Rectangle2D sample = new Rectangle2D.Double(x + ELBOW, y - SAMPLE / 2.0, SAMPLE, SAMPLE);
      g2.setPaint(paints.of(part.fill(), g2.getTransform().getScaleX()));
      g2.fill(sample);
      if (paints.edged(part.fill())) {
        g2.setPaint(style.palette().bar());
        g2.setStroke(style.fine());
        g2.draw(sample);
      }
      Font font = font(part);
      double left = x + ELBOW + SAMPLE + NAME_GAP;
      g2.setFont(font);
      g2.setPaint(style.palette().ink());
      String name = Digits.fitted(font, part.label(), area.getMaxX() - left);
      g2.drawString(name, (float) left, (float) (y + BASELINE * font.getSize2D()));
      y -= gap;
    }
  }

  /** The level over the column. */
  private void level(Graphics2D g2, Rectangle2D whole, Rectangle2D area) {
    Font font = style.strongSmall();
    double line = line(area);
    double top = whole.getMinY() - 6.0;
    // a label just over the column would stand on the line
    boolean crossed = line < whole.getMinY() && line > top - font.getSize2D() - 2.0;
    g2.setFont(font);
    g2.setPaint(style.palette().ink());
    double right = whole.getCenterX() + Digits.numberWidth(font, total) / 2.0;
    Digits.drawRight(g2, total, right, crossed ? line - 5.0 : top);
  }

  /** What is allowed, left of the column at the height of the line; inside the picture always. */
  private void allowed(Graphics2D g2, Rectangle2D whole, Rectangle2D area) {
    if (allowed.isEmpty()) {
      return;
    }
    Font font = style.strongSmall();
    double size = font.getSize2D();
    double lines = allowed.get().excessWords().isEmpty() ? 1.0 : 1.0 + LINE;
    double line = Math.min(line(area), area.getMaxY() - lines * size);
    double right = whole.getMinX() - LEFT_GAP + 2.0;
    g2.setFont(font);
    g2.setPaint(style.palette().ink());
    right(g2, allowed.get().overallWords(), right, line + BASELINE * size);
    g2.setPaint(style.palette().stateText(State.OVER));
    right(g2, allowed.get().excessWords(), right, line + (BASELINE + LINE) * size);
  }

  private double line(Rectangle2D area) {
    return area.getMaxY() - allowedShare * area.getHeight();
  }

  private static void right(Graphics2D g2, String text, double x, double baseline) {
    g2.drawString(text, (float) (x - Digits.width(g2.getFont(), text)), (float) baseline);
  }

  private void names(Graphics2D g2, List<Rectangle2D> places, double x, Rectangle2D area) {
    double gap = style.small().getSize2D() * LINE;
    double top = area.getMinY() + gap / 2.0;
    double bottom = area.getMaxY() - gap / 2.0 + 2.0;
    List<Integer> shown = shown(places, LabelRows.room(gap, top, bottom));
    double[] wanted = shown.stream().mapToDouble(i -> places.get(i).getCenterY()).toArray();
    double[] rows = LabelRows.apart(wanted, gap, top, bottom);
    for (int i = 0; i < rows.length; i++) {
      name(g2, parts.parts().get(shown.get(i)), x, wanted[i], rows[i], area.getMaxX());
    }
  }

  /** Positions of the parts with a label, top to bottom; the smallest go first if it is tight. */
  private List<Integer> shown(List<Rectangle2D> places, int room) {
    List<Integer> shown = new ArrayList<>();
    for (int i = 0; i < places.size(); i++) {
      if (places.get(i) != null) {
        shown.add(i);
      }
    }
    Comparator<Integer> important =
        Comparator.comparing((Integer i) -> !parts.parts().get(i).selected())
            .thenComparing(i -> -parts.parts().get(i).share());
    shown.sort(important);
    List<Integer> kept = new ArrayList<>(shown.subList(0, Math.min(room, shown.size())));
    kept.sort(Collections.reverseOrder());
    return kept;
  }

  private void name(Graphics2D g2, StackPart part, double x, double from, double to, double end) {
    Path2D leader = new Path2D.Double();
    leader.moveTo(x + 2.0, from);
    leader.lineTo(x + ELBOW - 2.0, from);
    leader.lineTo(x + ELBOW + 4.0, to);
    leader.lineTo(x + LEADER - 4.0, to);
    g2.setPaint(style.palette().ink3());
    g2.setStroke(style.fine());
    g2.draw(leader);
    Font font = font(part);
    g2.setFont(font);
    double baseline = to + BASELINE * font.getSize2D();
    double numberEnd = x + LEADER + shareWidth();
    g2.setPaint(part.selected() ? style.palette().ink() : style.palette().ink2());
    Digits.drawRight(g2, LevelWords.share(part.share()), numberEnd, baseline);
    g2.setPaint(style.palette().ink());
    double room = end - numberEnd - NAME_GAP;
    g2.drawString(
        Digits.fitted(font, part.label(), room), (float) (numberEnd + NAME_GAP), (float) baseline);
  }
}
