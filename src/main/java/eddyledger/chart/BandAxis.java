package eddyledger.chart;

import eddyledger.quantity.Bands;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/**
 * The band axis of all pictures: the 28 bands at whole numbers from 0, one width each; then room
 * for labels, whose width is in pixels and so does not stretch with the picture, and in it, if
 * wanted, a place for a column over all bands.
 */
final class BandAxis extends NumberAxis {
  /** Where the column over all bands stands. */
  static final int ALL = Bands.COUNT;

  private static final double LAST_EDGE = Bands.COUNT - 0.5;
  private static final double LARGEST_SHARE_OF_ROOM = 0.42;
  private static final double LABEL_GAP = 3.0;
  private static final double ALL_WIDTH = 46.0;
  private static final double NARROW_ALL_WIDTH = 30.0;
  private static final double NARROW = 800.0;

  private final ChartStyle style;
  private final double room;
  private final double beforeAll;
  private final boolean all;

  /**
   * @param room room for labels right of the bands (and of the column over all bands), pixels
   * @param beforeAll room left of the column over all bands, pixels
   * @param all whether there is a column over all bands
   */
  BandAxis(ChartStyle style, double room, double beforeAll, boolean all) {
    this.style = style;
    this.room = room;
    this.beforeAll = beforeAll;
    this.all = all;
    setRange(-0.5, ALL + 1.0);
  }

  /** Right end of the bands, pixels. */
  double bandsEnd(Rectangle2D area) {
    double wanted = room + (all ? beforeAll + allWidth(area) : 0.0);
    return area.getMaxX() - Math.min(wanted, LARGEST_SHARE_OF_ROOM * area.getWidth());
  }

  /** Width of one band, pixels. */
  double bandWidth(Rectangle2D area) {
    return (bandsEnd(area) - area.getMinX()) / Bands.COUNT;
  }

  /** Width of the column over all bands, pixels. */
  double allWidth(Rectangle2D area) {
    return area.getWidth() < NARROW ? NARROW_ALL_WIDTH : ALL_WIDTH;
  }

  /** Left end of what is drawn right of bands and column, pixels. */
  double labelsStart(Rectangle2D area) {
    return bandsEnd(area) + (all ? beforeAll + allWidth(area) : 0.0);
  }

  @Override
  public double valueToJava2D(double value, Rectangle2D area, RectangleEdge edge) {
    if (value > LAST_EDGE) {
      return bandsEnd(area) + beforeAll + allWidth(area) / 2.0;
    }
    return area.getMinX() + (value + 0.5) * bandWidth(area);
  }

  @Override
  public double java2DToValue(double position, Rectangle2D area, RectangleEdge edge) {
    double value = (position - area.getMinX()) / bandWidth(area) - 0.5;
    return value > LAST_EDGE ? ALL : value;
  }

  @Override
  public List<NumberTick> refreshTicks(
      Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
    List<NumberTick> ticks = new ArrayList<>();
    int step = step(bandWidth(dataArea));
    // so that 1 kHz and the octaves around it are always among those shown
    int first = Bands.position("1000") % step;
    for (int band = first; band < Bands.COUNT; band += step) {
      ticks.add(tick(band, band == first ? LevelWords.bandWithUnit(band) : LevelWords.band(band)));
    }
    if (all) {
      ticks.add(tick(ALL, "all"));
    }
    return ticks;
  }

  private int step(double bandWidth) {
    for (int step : new int[] {1, 3}) {
      if (widest(step) + LABEL_GAP <= step * bandWidth) {
        return step;
      }
    }
    return 6;
  }

  /** The largest distance two labels that follow each other ask for, pixels. */
  private double widest(int step) {
    Font font = style.small();
    int first = Bands.position("1000") % step;
    double widest = 0.0;
    double before = Digits.width(font, LevelWords.bandWithUnit(first));
    for (int band = first + step; band < Bands.COUNT; band += step) {
      double here = Digits.width(font, LevelWords.band(band));
      widest = Math.max(widest, (before + here) / 2.0);
      before = here;
    }
    return widest;
  }

  private static NumberTick tick(int at, String text) {
    return new NumberTick(at, text, TextAnchor.TOP_CENTER, TextAnchor.TOP_CENTER, 0.0);
  }
}
