package eddyledger.chart;

import eddyledger.ledger.State;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;

/** Paints one column of the stack, split by energy. */
final class StackColumn {
  /** Height of the mark on a column that stands over what is allowed, pixels. */
  static final double CAP = 3.0;

  private static final double SEEN = 0.6;

  private final ChartStyle style;
  private final StackParts parts;
  private final FillPaints paints;

  StackColumn(ChartStyle style, StackParts parts) {
    this.style = style;
    this.parts = parts;
    paints = new FillPaints(style.palette());
  }

  /**
   * Paints a column.
   *
   * @param whole the column, pixels
   * @param energies energy of each part, NaN where it has no value
   * @return what each part takes of the column; null where it has no value
   */
  List<Rectangle2D> paint(Graphics2D g2, Rectangle2D whole, double[] energies) {
    double sum = 0.0;
    for (double energy : energies) {
      sum += Double.isNaN(energy) ? 0.0 : energy;
    }
    List<Rectangle2D> places = new ArrayList<>();
    double bottom = whole.getMaxY();
    for (int i = 0; i < energies.length; i++) {
      if (Double.isNaN(energies[i]) || !(sum > 0.0)) {
        places.add(null);
        continue;
      }
      double height = whole.getHeight() * energies[i] / sum;
      Rectangle2D place =
          new Rectangle2D.Double(whole.getX(), bottom - height, whole.getWidth(), height);
      part(g2, parts.parts().get(i).fill(), place);
      places.add(place);
      bottom -= height;
    }
    return places;
  }

  private void part(Graphics2D g2, StackFill fill, Rectangle2D place) {
    g2.setPaint(paints.of(fill, g2.getTransform().getScaleX()));
    g2.fill(place);
    g2.setStroke(style.fine());
    if (paints.edged(fill)) {
      g2.setPaint(style.palette().bar());
      g2.draw(place);
    } else if (place.getHeight() > SEEN) {
      g2.setPaint(style.palette().paper());
      double top = place.getMinY();
      g2.draw(new Line2D.Double(place.getMinX(), top, place.getMaxX(), top));
    }
  }

  /** Paints the outline of the selected row in a column already painted. */
  void outline(Graphics2D g2, List<Rectangle2D> places, Rectangle2D whole, double share) {
    int from = parts.outline().orElseThrow().part();
    double bottom = whole.getMaxY();
    for (int i = 0; i < from; i++) {
      bottom -= places.get(i) == null ? 0.0 : places.get(i).getHeight();
    }
    double height = whole.getHeight() * share;
    if (height > SEEN) {
      g2.setPaint(style.palette().ink());
      g2.setStroke(style.outline());
      g2.draw(
          new Rectangle2D.Double(
              whole.getX() + 0.4, bottom - height, whole.getWidth() - 0.8, height - 0.4));
    }
  }

  /** Paints what says that a column stands over what is allowed. */
  void cap(Graphics2D g2, Rectangle2D whole) {
    g2.setPaint(style.palette().stateMark(State.OVER));
    g2.fill(new Rectangle2D.Double(whole.getX(), whole.getMinY() - CAP, whole.getWidth(), CAP));
  }
}
