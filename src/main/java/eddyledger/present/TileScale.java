package eddyledger.present;

import java.util.List;

/**
 * Places on the scale of a tile, from its left end 0 to its right end 1; NaN where there is none.
 *
 * @param target the target
 * @param allowed the target less its reserve
 * @param level the level, kept on the scale
 * @param from lowest level of the model range, kept on the scale
 * @param to highest level of the model range, kept on the scale
 */
public record TileScale(double target, double allowed, double level, double from, double to) {
  private static final double BELOW = 5.0;
  private static final double ABOVE = 3.0;

  /**
   * The scale from 5 dB below what is allowed to 3 dB above it; around the level where nothing is
   * asked.
   *
   * @param target dB(A); NaN if there is none
   * @param allowed dB(A); NaN if there is no target
   * @param level dB(A); NaN if there is none
   * @param range lowest and highest level of the model range; empty if it is not shown
   */
  static TileScale of(double target, double allowed, double level, List<Double> range) {
    double anchor = Double.isNaN(allowed) ? level : allowed;
    double from = range.isEmpty() ? Double.NaN : range.get(0);
    double to = range.isEmpty() ? Double.NaN : range.get(range.size() - 1);
    return new TileScale(
        place(target, anchor),
        place(allowed, anchor),
        place(level, anchor),
        place(from, anchor),
        place(to, anchor));
  }

  private static double place(double level, double anchor) {
    double place = (level - (anchor - BELOW)) / (BELOW + ABOVE);
    return Math.max(0.0, Math.min(1.0, place));
  }

  /** Whether there is a target. */
  public boolean hasTarget() {
    return !Double.isNaN(target);
  }

  /** Whether there is a level. */
  public boolean hasLevel() {
    return !Double.isNaN(level);
  }

  /** Whether the model range is shown. */
  public boolean hasRange() {
    return !Double.isNaN(from) && !Double.isNaN(to);
  }
}
