package eddyledger.quantity;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.OptionalDouble;

/**
 * Levels and level differences as text for people: one decimal, a point, halves away from zero, and
 * never a minus zero.
 *
 * <p>Files and exports keep full precision and do not use this.
 */
public final class LevelText {
  /** Stands where there is no value. */
  public static final String UNAVAILABLE = "n/a";

  private static final String SILENCE = "-inf";

  private LevelText() {}

  /**
   * Text of a level in dB: {@code "61.3"}; {@link #UNAVAILABLE} for NaN, {@code "-inf"} for the
   * level of no sound at all.
   *
   * @throws IllegalArgumentException for plus infinity, which no sound has
   */
  public static String text(double level) {
    if (Double.isNaN(level)) {
      return UNAVAILABLE;
    }
    if (level == Double.NEGATIVE_INFINITY) {
      return SILENCE;
    }
    if (level == Double.POSITIVE_INFINITY) {
      throw new IllegalArgumentException("a level is infinite");
    }
    // through the shortest decimal text, so that an entered 0.15 rounds as the reader sees it;
    // a decimal number has no minus zero
    return BigDecimal.valueOf(level).setScale(1, RoundingMode.HALF_UP).toPlainString();
  }

  /** Text of a level that may be unavailable. */
  public static String text(OptionalDouble level) {
    return text(level.orElse(Double.NaN));
  }
}
