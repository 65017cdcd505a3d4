package eddyledger.chart;

import eddyledger.quantity.Bands;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.CrosshairState;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.AbstractXYItemRenderer;
import org.jfree.chart.renderer.xy.XYItemRendererState;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.data.xy.XYDataset;

/** Draws the allowed line: a step per band, and the overall level across its column. */
final class AllowedSteps extends AbstractXYItemRenderer {
  private static final double BEYOND_COLUMN = 8.0;
  private static final double BESIDE = 6.0;
  private static final double CLEAR = 12.0;
  private static final double ASCENT = 4.0;

  private final ChartStyle style;
  private final BandAxis axis;
  private final AllowedLine line;

  AllowedSteps(ChartStyle style, BandAxis axis, AllowedLine line) {
    this.style = style;
    this.axis = axis;
    this.line = line;
  }

  @Override
  public void drawItem(
      Graphics2D g2,
      XYItemRendererState state,
      Rectangle2D dataArea,
      PlotRenderingInfo info,
      XYPlot plot,
      ValueAxis domainAxis,
      ValueAxis rangeAxis,
      XYDataset dataset,
      int series,
      int item,
      CrosshairState crosshair,
      int pass) {
    // one line, drawn once
    if (item != dataset.getItemCount(series) - 1) {
      return;
    }
    Path2D path = new Path2D.Double();
    double[] first = steps(path, dataArea, rangeAxis, dataset, series);
    stroke(g2, path);
    if (first != null) {
      words(g2, dataArea, rangeAxis, dataset, series, first);
    }
  }

  /** Adds the steps; answers left end and height of the first one, null if there is none. */
  private double[] steps(
      Path2D path, Rectangle2D area, ValueAxis levels, XYDataset dataset, int series) {
    double half = axis.bandWidth(area) / 2.0;
    double[] first = null;
    boolean drawing = false;
    for (int i = 0; i < dataset.getItemCount(series); i++) {
      double level = dataset.getYValue(series, i);
      boolean overall = dataset.getXValue(series, i) >= BandAxis.ALL;
      if (Double.isNaN(level) || level < levels.getLowerBound()) {
        drawing = false;
        continue;
      }
      double x = axis.valueToJava2D(dataset.getXValue(series, i), area, RectangleEdge.BOTTOM);
      double y = levels.valueToJava2D(level, area, RectangleEdge.LEFT);
      double reach = overall ? axis.allWidth(area) / 2.0 + BEYOND_COLUMN : half;
      if (drawing && !overall) {
        path.lineTo(x - reach, y);
      } else {
        path.moveTo(x - reach, y);
      }
      path.lineTo(x + reach, y);
      drawing = true;
      if (first == null && !overall) {
        first = new double[] {x - reach, y};
      }
    }
    return first;
  }

  private void stroke(Graphics2D g2, Shape path) {
    g2.setPaint(style.palette().paper());
    g2.setStroke(style.halo());
    g2.draw(path);
    g2.setPaint(style.palette().ink());
    g2.setStroke(style.allowed());
    g2.draw(path);
  }

  /** Words beside the rising flank where there is room for them, else over the left end. */
  private void words(
      Graphics2D g2,
      Rectangle2D area,
      ValueAxis levels,
      XYDataset dataset,
      int series,
      double[] first) {
    double width = Digits.width(style.strongSmall(), line.words());
    double half = axis.bandWidth(area) / 2.0;
    if (width > axis.bandsEnd(area) - area.getMinX()) {
      return;
    }
    double x = first[0];
    double baseline = highest(area, levels, dataset, series, x, x + width) - BESIDE;
    for (int i = 0; i < Bands.COUNT; i++) {
      double right =
          axis.valueToJava2D(dataset.getXValue(series, i), area, RectangleEdge.BOTTOM)
              - half
              - BESIDE;
      double level = dataset.getYValue(series, i);
      if (!(level > levels.getLowerBound()) || right - width < area.getMinX()) {
        continue;
      }
      double y = levels.valueToJava2D(level, area, RectangleEdge.LEFT);
      if (highest(area, levels, dataset, series, right - width, right) - y > CLEAR) {
        x = right - width;
        baseline = y + ASCENT;
        break;
      }
    }
    g2.setFont(style.strongSmall());
    g2.setPaint(style.palette().ink());
    g2.drawString(line.words(), (float) x, (float) baseline);
  }

  /** How high line and columns reach between two places to the right, pixels downwards. */
  private double highest(
      Rectangle2D area, ValueAxis levels, XYDataset dataset, int series, double from, double to) {
    double half = axis.bandWidth(area) / 2.0;
    double top = area.getMaxY();
    for (int i = 0; i < Bands.COUNT; i++) {
      double x = axis.valueToJava2D(i, area, RectangleEdge.BOTTOM);
      double level = dataset.getYValue(series, i);
      if (level > levels.getLowerBound() && x + half > from && x - half < to) {
        double reached = level + line.excess();
        top = Math.min(top, levels.valueToJava2D(reached, area, RectangleEdge.LEFT));
      }
    }
    return line.exceeded() ? top - StackColumn.CAP : top;
  }
}
