package eddyledger.chart;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Rectangle2D;
import java.awt.geom.RoundRectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;

/** Says in the middle of the bands why the selected row has no value. */
final class ReasonText extends AbstractXYAnnotation {
  private static final double SHARE = 0.7;
  private static final double LINE = 1.4;
  private static final double PAD = 8.0;
  private static final int MOST_LINES = 4;

  /** Where in the file: of use in a list of findings, not in a picture. */
  private static final String PLACE = "^[\\w.\\[\\]-]+ \\([^)]*\\): ";

  private final ChartStyle style;
  private final BandAxis axis;
  private final String reason;

  ReasonText(ChartStyle style, BandAxis axis, String reason) {
    this.style = style;
    this.axis = axis;
    this.reason = reason.replaceFirst(PLACE, "");
  }

  String reason() {
    return reason;
  }

  @Override
  public void draw(
      Graphics2D g2,
      XYPlot plot,
      Rectangle2D dataArea,
      ValueAxis domainAxis,
      ValueAxis rangeAxis,
      int rendererIndex,
      PlotRenderingInfo info) {
    Font font = style.body();
    double width = axis.bandsEnd(dataArea) - dataArea.getMinX();
    List<String> lines = lines(font, "No value: " + reason, width * SHARE);
    double height = lines.size() * font.getSize2D() * LINE;
    double middle = dataArea.getMinX() + width / 2.0;
    double top = dataArea.getCenterY() - height / 2.0;
    double widest = lines.stream().mapToDouble(line -> Digits.width(font, line)).max().orElse(0);
    Shape plate =
        new RoundRectangle2D.Double(
            middle - widest / 2.0 - 2.0 * PAD,
            top - PAD,
            widest + 4.0 * PAD,
            height + 2.0 * PAD,
            PAD,
            PAD);
    g2.setPaint(style.palette().paper());
    g2.fill(plate);
    g2.setPaint(style.palette().hairline());
    g2.setStroke(style.grid());
    g2.draw(plate);
    g2.setPaint(style.palette().ink());
    g2.setFont(font);
    for (int i = 0; i < lines.size(); i++) {
      double baseline = top + (i + 0.75) * font.getSize2D() * LINE;
      double x = middle - Digits.width(font, lines.get(i)) / 2.0;
      g2.drawString(lines.get(i), (float) x, (float) baseline);
    }
  }

  private static List<String> lines(Font font, String text, double room) {
    List<String> lines = new ArrayList<>();
    String line = "";
    for (String word : text.split(" ")) {
      String longer = line.isEmpty() ? word : line + " " + word;
      if (!line.isEmpty() && Digits.width(font, longer) > room) {
        lines.add(line);
        line = word;
      } else {
        line = longer;
      }
    }
    lines.add(line);
    if (lines.size() > MOST_LINES) {
      lines = lines.subList(0, MOST_LINES);
      lines.set(MOST_LINES - 1, lines.get(MOST_LINES - 1) + " \u2026");
    }
    return lines;
  }
}
