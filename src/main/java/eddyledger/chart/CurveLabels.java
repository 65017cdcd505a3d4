package eddyledger.chart;

import eddyledger.chart.SpectrumCurve.Role;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.ui.RectangleEdge;

/** Names and overall levels of curves at their right ends, pushed apart. */
final class CurveLabels {
  private static final double LEADER = 34.0;
  private static final double SAMPLE = 17.0;
  private static final double NAME_GAP = 7.0;
  private static final double LONGEST_NAME = 190.0;
  private static final double LINE = 1.3;
  private static final double BASELINE = 0.36;

  private final ChartStyle style;
  private final List<SpectrumCurve> curves;
  private final List<String> names;

  /** A label with the place its curve ends. */
  private record Label(SpectrumCurve curve, String name, double end) {
    boolean strong() {
      return curve.role() == Role.SELECTED;
    }
  }

  /** Labels of curves; names in the order of the curves. */
  CurveLabels(ChartStyle style, List<SpectrumCurve> curves, List<String> names) {
    this.style = style;
    this.curves = curves;
    this.names = names;
  }

  /** Room wanted right of the bands, pixels. */
  double room() {
    double widest = 0.0;
    for (String name : names) {
      widest = Math.max(widest, Digits.width(style.strongSmall(), name));
    }
    return LEADER + levelWidth() + NAME_GAP + Math.min(widest, LONGEST_NAME) + 2.0;
  }

  private double levelWidth() {
    double widest = 0.0;
    for (SpectrumCurve curve : curves) {
      widest = Math.max(widest, Digits.numberWidth(style.strongSmall(), curve.level()));
    }
    return widest;
  }

  void paint(Graphics2D g2, double x, Rectangle2D area, ValueAxis axis) {
    List<Label> labels = new ArrayList<>();
    for (int i = 0; i < curves.size(); i++) {
      SpectrumCurve curve = curves.get(i);
      double last = last(curve.levelsA());
      if (!Double.isNaN(last)) {
        double y = axis.valueToJava2D(last, area, RectangleEdge.LEFT);
        labels.add(new Label(curve, names.get(i), y));
      }
    }
    labels.sort(Comparator.comparingDouble(Label::end));
    double gap = style.small().getSize2D() * LINE;
    double[] wanted =
        labels.stream().mapToDouble(label -> Math.min(label.end(), area.getMaxY())).toArray();
    double[] rows =
        LabelRows.apart(wanted, gap, area.getMinY() + gap / 2.0, area.getMaxY() - gap / 2.0);
    for (int i = 0; i < rows.length; i++) {
      paint(g2, labels.get(i), x, rows[i], area);
    }
  }

  private void paint(Graphics2D g2, Label label, double x, double to, Rectangle2D area) {
    sample(g2, label, x, to);
    if (label.end() < area.getMaxY()) {
      Path2D leader = new Path2D.Double();
      leader.moveTo(x + 1.0, label.end());
      leader.lineTo(x + 4.0, label.end());
      leader.lineTo(x + SAMPLE - 4.0, to);
      leader.lineTo(x + SAMPLE - 1.0, to);
      g2.setPaint(style.palette().ink3());
      g2.setStroke(style.fine());
      g2.draw(leader);
    }
    Font font = label.strong() ? style.strongSmall() : style.small();
    g2.setFont(font);
    g2.setPaint(label.strong() ? style.palette().accent() : style.palette().ink());
    double baseline = to + BASELINE * font.getSize2D();
    double numberEnd = x + LEADER + levelWidth();
    Digits.drawRight(g2, label.curve().level(), numberEnd, baseline);
    String name = Digits.fitted(font, label.name(), area.getMaxX() - numberEnd - NAME_GAP);
    g2.drawString(name, (float) (numberEnd + NAME_GAP), (float) baseline);
  }

  /** A piece of the curve, or for columns a small square. */
  private void sample(Graphics2D g2, Label label, double x, double y) {
    g2.setPaint(SpectrumCurves.colour(style.palette(), label.curve().role()));
    if (label.curve().role() == Role.TOTAL) {
      g2.fill(new Rectangle2D.Double(x + SAMPLE + 1.0, y - 4.0, 10.0, 8.0));
    } else {
      g2.setStroke(label.strong() ? style.selectedCurve() : style.curve());
      g2.draw(new Line2D.Double(x + SAMPLE + 1.0, y, x + SAMPLE + 11.0, y));
    }
  }

  private static double last(double[] levels) {
    double last = Double.NaN;
    for (double level : levels) {
      last = Double.isNaN(level) ? last : level;
    }
    return last;
  }
}
