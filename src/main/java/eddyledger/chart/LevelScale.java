package eddyledger.chart;

/**
 * The range of levels a picture shows.
 *
 * @param lower lowest level, dB(A), a multiple of ten
 * @param upper highest level, dB(A), with room for a label above the highest value
 */
record LevelScale(double lower, double upper) {
  private static final double STACK_SPAN = 40.0;
  private static final double EMPTY = 60.0;
  private static final double HEADROOM = 0.13;
  private static final double NEAR_TEN = 2.0;

  /**
   * Four tens below the highest level of all, and up to what is allowed if that is higher.
   *
   * @param highest highest level, dB(A); not finite if none is known
   * @param allowed level allowed, dB(A); NaN if there is none
   */
  static LevelScale below(double highest, double allowed) {
    double known = Double.isFinite(highest) ? highest : allowed;
    double base = Double.isFinite(known) ? known : EMPTY;
    double top = allowed > base ? allowed : base;
    return between(10.0 * Math.floor(base / 10.0) - STACK_SPAN, top);
  }

  /** From a level, rounded down to tens, to another with headroom. */
  static LevelScale between(double lowest, double highest) {
    double lower = 10.0 * Math.floor(lowest / 10.0);
    double upper = highest + HEADROOM * (highest - lower);
    double ten = 10.0 * Math.ceil(upper / 10.0);
    return new LevelScale(lower, ten - upper < NEAR_TEN ? ten : upper);
  }

  /** How high a level stands, 0 at the bottom to 1 at the top. */
  double place(double level) {
    return (level - lower) / (upper - lower);
  }
}
