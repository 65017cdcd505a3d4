package eddyledger.physics.flow;

import java.util.Locale;

/** Checks of numbers and their wording in remarks and messages. */
final class Numbers {
  private Numbers() {}

  /**
   * Lets a finite value above 0 pass.
   *
   * @throws IllegalArgumentException naming the quantity otherwise
   */
  static void requirePositive(String quantity, double value, String unit) {
    if (!(value > 0.0 && Double.isFinite(value))) {
      String shown = value + (unit.isEmpty() ? "" : " " + unit);
      throw new IllegalArgumentException(quantity + " must be above 0 and finite, not " + shown);
    }
  }

  /** Four significant digits, the same in every locale. */
  static String text(double value) {
    return String.format(Locale.ROOT, "%.4g", value);
  }
}
