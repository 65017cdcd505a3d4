package eddyledger.chart;

import java.awt.BasicStroke;
import java.awt.Font;
import java.awt.RenderingHints;
import java.util.Map;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.DatasetRenderingOrder;
import org.jfree.chart.plot.SeriesRenderingOrder;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.ui.RectangleInsets;

/**
 * How every picture looks: the one place for background, axes, grid, fonts, strokes and smoothing.
 * Follows the theme by its palette.
 *
 * @param palette the colours
 * @param body the font of body text; axes and labels are one size smaller
 */
public record ChartStyle(Palette palette, Font body) {
  /** Width of a column of the stack, share of its band. */
  static final double COLUMN_SHARE = 0.8;

  private static final double TOP = 6.0;
  private static final double LEFT = 10.0;
  private static final double BOTTOM = 2.0;
  private static final double RIGHT = 8.0;
  private static final String STRONG_FAMILY = " SemiBold";

  /** Axes, units and labels. */
  public Font small() {
    return body.deriveFont(body.getSize2D() - 1.0f);
  }

  /** What stands out in body size: half bold where the family has it, else bold. */
  public Font strong() {
    return strong(body);
  }

  /** What stands out among labels. */
  public Font strongSmall() {
    return strong(small());
  }

  private static Font strong(Font font) {
    String family = font.getFamily() + STRONG_FAMILY;
    Font half = new Font(family, Font.PLAIN, font.getSize()).deriveFont(font.getSize2D());
    // an unknown family gives the system's dialogue font
    return half.getFamily().equals(family) ? half : font.deriveFont(Font.BOLD);
  }

  BasicStroke grid() {
    return new BasicStroke(1.0f);
  }

  BasicStroke allowed() {
    return line(1.6f, BasicStroke.JOIN_MITER);
  }

  /** Paper around the allowed line, so that it is seen over every fill. */
  BasicStroke halo() {
    return line(3.6f, BasicStroke.JOIN_MITER);
  }

  BasicStroke outline() {
    return line(1.5f, BasicStroke.JOIN_MITER);
  }

  /** Leader lines and the edges of hollow fills. */
  BasicStroke fine() {
    return line(0.8f, BasicStroke.JOIN_ROUND);
  }

  BasicStroke curve() {
    return line(1.6f, BasicStroke.JOIN_ROUND);
  }

  BasicStroke selectedCurve() {
    return line(2.6f, BasicStroke.JOIN_ROUND);
  }

  private static BasicStroke line(float width, int join) {
    int cap = join == BasicStroke.JOIN_ROUND ? BasicStroke.CAP_ROUND : BasicStroke.CAP_BUTT;
    return new BasicStroke(width, cap, join);
  }

  /** An empty plot with two axes: levels upwards, bands to the right. */
  XYPlot plot(BandAxis bands, LevelAxis levels) {
    style(bands);
    style(levels);
    XYPlot plot = new XYPlot();
    plot.setDomainAxis(bands);
    plot.setRangeAxis(levels);
    plot.setBackgroundPaint(palette.paper());
    plot.setOutlineVisible(false);
    plot.setInsets(RectangleInsets.ZERO_INSETS);
    plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
    plot.setDomainGridlinesVisible(false);
    plot.setDomainZeroBaselineVisible(false);
    plot.setRangeZeroBaselineVisible(false);
    plot.setRangeGridlinePaint(palette.grid());
    plot.setRangeGridlineStroke(grid());
    plot.setDatasetRenderingOrder(DatasetRenderingOrder.FORWARD);
    plot.setSeriesRenderingOrder(SeriesRenderingOrder.FORWARD);
    plot.setDomainPannable(false);
    plot.setRangePannable(false);
    return plot;
  }

  private void style(ValueAxis axis) {
    axis.setTickLabelFont(small());
    axis.setTickLabelPaint(palette.ink2());
    axis.setAxisLineVisible(false);
    axis.setTickMarksVisible(false);
    axis.setMinorTickMarksVisible(false);
    axis.setLabel(null);
    axis.setAutoRange(false);
  }

  /** The chart around a plot. */
  JFreeChart chart(XYPlot plot) {
    JFreeChart chart = new JFreeChart(null, body, plot, false);
    chart.setBackgroundPaint(palette.paper());
    chart.setBorderVisible(false);
    chart.setPadding(new RectangleInsets(TOP, LEFT, BOTTOM, RIGHT));
    RenderingHints hints = new RenderingHints(null);
    hints.putAll(
        Map.of(
            RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON,
            RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON,
            RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON,
            RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE));
    chart.setRenderingHints(hints);
    return chart;
  }
}
