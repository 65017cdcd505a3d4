package eddyledger.chart;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/** Levels upwards, with a line and a number at tens (at twenties if it is low). */
final class LevelAxis extends NumberAxis {
  private static final double CLOSEST = 14.0;

  LevelAxis(LevelScale scale) {
    setRange(scale.lower(), scale.upper());
  }

  @Override
  public List<NumberTick> refreshTicks(
      Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
    double perTen = dataArea.getHeight() * 10.0 / getRange().getLength();
    int step = perTen < CLOSEST ? 20 : 10;
    List<NumberTick> ticks = new ArrayList<>();
    int first = (int) Math.round(getLowerBound());
    for (int level = first; level <= getUpperBound(); level += step) {
      String text = level < 0 ? "\u2212" + -level : String.valueOf(level);
      ticks.add(new NumberTick(level, text, TextAnchor.CENTER_RIGHT, TextAnchor.CENTER_RIGHT, 0.0));
    }
    return ticks;
  }
}
