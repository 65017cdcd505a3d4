package eddyledger.chart;

import eddyledger.chart.SpectrumCurve.Role;
import eddyledger.quantity.Bands;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Paint;
import java.awt.Stroke;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.entity.EntityCollection;
import org.jfree.chart.entity.XYItemEntity;
import org.jfree.chart.plot.CrosshairState;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.renderer.xy.AbstractXYItemRenderer;
import org.jfree.chart.renderer.xy.XYItemRendererState;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.data.xy.XYDataset;

/** Draws the curves of the spectrum picture: a point per band, a gap where a band is missing. */
final class SpectrumCurves extends AbstractXYItemRenderer {
  private static final double POINT = 2.1;
  private static final double SELECTED_POINT = 2.9;

  private final ChartStyle style;
  private final BandAxis axis;
  private final List<SpectrumCurve> curves;
  private final CurveLabels labels;

  SpectrumCurves(ChartStyle style, BandAxis axis, List<SpectrumCurve> curves, CurveLabels labels) {
    this.style = style;
    this.axis = axis;
    this.curves = curves;
    this.labels = labels;
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
    // a curve is drawn as a whole, the labels once all curves are
    if (item != Bands.COUNT - 1) {
      return;
    }
    if (series == 0) {
      columns(g2, dataArea, rangeAxis, curves.get(0));
    }
    if (curves.get(series).role() != Role.TOTAL) {
      curve(g2, dataArea, rangeAxis, curves.get(series));
    }
    if (state.getEntityCollection() != null) {
      tips(state.getEntityCollection(), dataArea, rangeAxis, dataset, series);
    }
    if (series == curves.size() - 1) {
      labels.paint(g2, axis.bandsEnd(dataArea), dataArea, rangeAxis);
    }
  }

  /** The total stands behind the curves, in columns as in the stack. */
  private void columns(
      Graphics2D g2, Rectangle2D area, ValueAxis axisOfLevels, SpectrumCurve total) {
    double[] levels = total.levelsA();
    double width = axis.bandWidth(area) * ChartStyle.COLUMN_SHARE;
    g2.setPaint(style.palette().elsewhere());
    for (int band = 0; band < Bands.COUNT; band++) {
      if (levels[band] > axisOfLevels.getLowerBound()) {
        double y = axisOfLevels.valueToJava2D(levels[band], area, RectangleEdge.LEFT);
        double left = x(band, area) - width / 2.0;
        g2.fill(new Rectangle2D.Double(left, y, width, area.getMaxY() - y));
      }
    }
  }

  private void curve(Graphics2D g2, Rectangle2D area, ValueAxis axisOfLevels, SpectrumCurve curve) {
    boolean selected = curve.role() == Role.SELECTED;
    double[] levels = curve.levelsA();
    Path2D path = new Path2D.Double();
    boolean drawing = false;
    for (int band = 0; band < Bands.COUNT; band++) {
      if (Double.isNaN(levels[band])) {
        drawing = false;
        continue;
      }
      double x = x(band, area);
      double y = axisOfLevels.valueToJava2D(levels[band], area, RectangleEdge.LEFT);
      if (drawing) {
        path.lineTo(x, y);
      } else {
        path.moveTo(x, y);
      }
      drawing = true;
    }
    BasicStroke stroke = selected ? style.selectedCurve() : style.curve();
    g2.setPaint(style.palette().paper());
    g2.setStroke(new BasicStroke(stroke.getLineWidth() + 2.0f));
    g2.draw(path);
    g2.setPaint(colour(style.palette(), curve.role()));
    g2.setStroke(stroke);
    g2.draw(path);
    double r = selected ? SELECTED_POINT : POINT;
    for (int band = 0; band < Bands.COUNT; band++) {
      if (!Double.isNaN(levels[band])) {
        double y = axisOfLevels.valueToJava2D(levels[band], area, RectangleEdge.LEFT);
        g2.fill(new Ellipse2D.Double(x(band, area) - r, y - r, 2.0 * r, 2.0 * r));
      }
    }
  }

  private double x(int band, Rectangle2D area) {
    return axis.valueToJava2D(band, area, RectangleEdge.BOTTOM);
  }

  static Color colour(Palette palette, Role role) {
    return switch (role) {
      case TOTAL -> palette.elsewhere();
      case SECTION -> palette.ink2();
      case SELECTED -> palette.accent();
    };
  }

  private void tips(
      EntityCollection entities,
      Rectangle2D area,
      ValueAxis axisOfLevels,
      XYDataset dataset,
      int series) {
    SpectrumCurve curve = curves.get(series);
    double[] levels = curve.levelsA();
    double half = axis.bandWidth(area) / 2.0;
    for (int band = 0; band < Bands.COUNT; band++) {
      if (!Double.isNaN(levels[band])) {
        double y = axisOfLevels.valueToJava2D(levels[band], area, RectangleEdge.LEFT);
        Rectangle2D place = new Rectangle2D.Double(x(band, area) - half, y - 6.0, 2 * half, 12.0);
        String level = LevelWords.level(levels[band]);
        String tip =
            curve.row().name() + ", " + LevelWords.bandWithUnit(band) + ": " + level + " dB(A)";
        entities.add(new XYItemEntity(place, dataset, series, band, tip, null));
      }
    }
  }

  /** The grid ends where the labels begin. */
  @Override
  public void drawRangeLine(
      Graphics2D g2,
      XYPlot plot,
      ValueAxis levels,
      Rectangle2D dataArea,
      double value,
      Paint paint,
      Stroke stroke) {
    double y = levels.valueToJava2D(value, dataArea, RectangleEdge.LEFT);
    g2.setPaint(paint);
    g2.setStroke(stroke);
    g2.draw(new Line2D.Double(dataArea.getMinX(), y, axis.bandsEnd(dataArea), y));
  }
}
