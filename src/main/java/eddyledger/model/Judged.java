package eddyledger.model;

/**
 * A number that somebody judged: the best estimate, the least and the most it may be.
 *
 * @param best best estimate, in the unit its holder states
 * @param low least value, null if not judged
 * @param high greatest value, null if not judged
 * @param evidence where it comes from
 * @param extras unknown properties
 */
public record Judged(double best, Double low, Double high, Evidence evidence, Extras extras) {

  /** A number without low, high and evidence. */
  public static Judged of(double best) {
    return new Judged(best, null, null, Evidence.NONE, Extras.NONE);
  }

  /** The least value, or the best estimate where none was judged. */
  public double lowOrBest() {
    return low == null ? best : low;
  }

  /** The greatest value, or the best estimate where none was judged. */
  public double highOrBest() {
    return high == null ? best : high;
  }
}
