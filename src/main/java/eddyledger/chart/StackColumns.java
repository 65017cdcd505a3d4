package eddyledger.chart;

import eddyledger.quantity.AWeighting;
import eddyledger.quantity.Decibels;
import java.awt.Graphics2D;
import java.awt.Paint;
import java.awt.Stroke;
import java.awt.geom.Line2D;
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

/**
 * Draws the columns of the stack: an item is a column, as high as its level, split by the energies
 * of the parts. The last column is that over all bands, with its labels.
 */
final class StackColumns extends AbstractXYItemRenderer {
  /** Lower columns carry no mark: what is allowed there lies below the picture. */
  private static final double SEEN = 6.0;

  private final ChartStyle style;
  private final BandAxis axis;
  private final StackParts parts;
  private final StackColumn column;
  private final StackLabels labels;
  private final boolean capped;

  StackColumns(
      ChartStyle style, BandAxis axis, StackParts parts, StackLabels labels, boolean capped) {
    this.style = style;
    this.axis = axis;
    this.parts = parts;
    this.labels = labels;
    this.capped = capped;
    column = new StackColumn(style, parts);
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
    boolean all = dataset.getXValue(series, item) >= BandAxis.ALL;
    double level = dataset.getYValue(series, item);
    double x = axis.valueToJava2D(dataset.getXValue(series, item), dataArea, RectangleEdge.BOTTOM);
    double width =
        all ? axis.allWidth(dataArea) : axis.bandWidth(dataArea) * ChartStyle.COLUMN_SHARE;
    double top =
        level > rangeAxis.getLowerBound()
            ? rangeAxis.valueToJava2D(level, dataArea, RectangleEdge.LEFT)
            : dataArea.getMaxY() - 1.0;
    Rectangle2D whole =
        new Rectangle2D.Double(x - width / 2.0, top, width, dataArea.getMaxY() - top);
    if (Double.isNaN(level)) {
      missing(g2, whole, all);
      if (all) {
        labels.withoutColumn(g2, whole, axis.labelsStart(dataArea), dataArea);
      }
      return;
    }
    if (level <= rangeAxis.getLowerBound()) {
      g2.setPaint(style.palette().bar());
      g2.fill(whole);
      return;
    }
    List<Rectangle2D> places = column.paint(g2, whole, energies(item, all));
    parts.outline().ifPresent(outline -> outline(g2, outline, places, whole, item, all));
    if (capped && whole.getHeight() > SEEN) {
      column.cap(g2, whole);
    }
    if (all) {
      labels.paint(g2, whole, places, axis.labelsStart(dataArea), dataArea);
    }
    if (state.getEntityCollection() != null) {
      tips(state.getEntityCollection(), places, dataset, item, all);
    }
  }

  private double[] energies(int item, boolean all) {
    return parts.parts().stream()
        .mapToDouble(part -> all ? part.energyA() : part.meanSquares().value(item))
        .toArray();
  }

  private void outline(
      Graphics2D g2,
      StackOutline outline,
      List<Rectangle2D> places,
      Rectangle2D whole,
      int item,
      boolean all) {
    double own = all ? outline.energyA() : outline.meanSquares().value(item);
    double sum = 0.0;
    for (double energy : energies(item, all)) {
      sum += Double.isNaN(energy) ? 0.0 : energy;
    }
    if (own > 0.0) {
      column.outline(g2, places, whole, own / sum);
    }
  }

  /** A band that nobody has a value for: a dash, and no column. */
  private void missing(Graphics2D g2, Rectangle2D whole, boolean all) {
    g2.setPaint(style.palette().ink3());
    g2.setFont(style.small());
    String text = all ? "not known" : "\u2014";
    double width = Digits.width(style.small(), text);
    double x = all ? whole.getMaxX() - width : whole.getCenterX() - width / 2.0;
    g2.drawString(text, (float) x, (float) (whole.getMaxY() - 4.0));
  }

  private void tips(
      EntityCollection entities,
      List<Rectangle2D> places,
      XYDataset dataset,
      int item,
      boolean all) {
    double weight = all ? 1.0 : AWeighting.energyRatios().value(item);
    double[] energies = energies(item, all);
    double sum = 0.0;
    for (double energy : energies) {
      sum += Double.isNaN(energy) ? 0.0 : energy;
    }
    String where = all ? "all bands" : LevelWords.bandWithUnit(item);
    for (int i = 0; i < energies.length; i++) {
      if (places.get(i) != null) {
        String level = LevelWords.level(Decibels.pressureLevel(weight * energies[i]));
        String share = LevelWords.share(energies[i] / sum);
        String known = parts.partial() ? " of what is known" : " of the energy";
        String tip =
            parts.parts().get(i).label() + ", " + where + ": " + level + " dB(A), " + share + known;
        entities.add(new XYItemEntity(places.get(i), dataset, 0, item, tip, null));
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
    g2.draw(new Line2D.Double(dataArea.getMinX(), y, axis.labelsStart(dataArea), y));
  }
}
