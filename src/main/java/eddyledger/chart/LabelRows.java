package eddyledger.chart;

/** Moves labels apart that would stand on each other. */
final class LabelRows {
  private LabelRows() {}

  /**
   * Places as near as can be to those wanted.
   *
   * @param wanted places, pixels downwards, in rising order
   * @param gap least distance, pixels
   * @param top least place
   * @param bottom largest place
   * @return places in the same order, a gap apart; beyond the top only if there is no room at all
   */
  static double[] apart(double[] wanted, double gap, double top, double bottom) {
    double[] places = wanted.clone();
    double least = top;
    for (int i = 0; i < places.length; i++) {
      places[i] = Math.max(places[i], least);
      least = places[i] + gap;
    }
    double most = bottom;
    for (int i = places.length - 1; i >= 0; i--) {
      places[i] = Math.min(places[i], most);
      most = places[i] - gap;
    }
    return places;
  }

  /** How many labels have room. */
  static int room(double gap, double top, double bottom) {
    return (int) Math.max(1.0, Math.floor((bottom - top) / gap) + 1.0);
  }
}
