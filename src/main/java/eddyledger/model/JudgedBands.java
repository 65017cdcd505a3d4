package eddyledger.model;

/**
 * Band values that somebody judged: the best estimate, the least and the most they may be.
 *
 * @param best best estimate
 * @param low least values, null if not judged
 * @param high greatest values, null if not judged
 * @param evidence where they come from
 */
public record JudgedBands(BandTable best, BandTable low, BandTable high, Evidence evidence) {

  /** Band values without low, high and evidence. */
  public static JudgedBands of(BandTable best) {
    return new JudgedBands(best, null, null, Evidence.NONE);
  }

  /** The least values, or the best estimate where none was judged. */
  public BandTable lowOrBest() {
    return low == null ? best : low;
  }

  /** The greatest values, or the best estimate where none was judged. */
  public BandTable highOrBest() {
    return high == null ? best : high;
  }
}
