package eddyledger.physics.flow;

/** Checks of numbers. */
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
}
