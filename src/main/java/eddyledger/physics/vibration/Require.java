package eddyledger.physics.vibration;

/** Checks of arguments, so that every class says the same thing in the same words. */
final class Require {
  private Require() {}

  /**
   * Lets a positive, finite value pass.
   *
   * @throws IllegalArgumentException if it is not above 0 or not finite
   */
  static double positive(double value, String what) {
    if (!(value > 0.0 && value < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException(what + " must be above 0, not " + value);
    }
    return value;
  }

  /**
   * Lets a value of 0 or more pass, if finite.
   *
   * @throws IllegalArgumentException if it is below 0 or not finite
   */
  static double notNegative(double value, String what) {
    if (!(value >= 0.0 && value < Double.POSITIVE_INFINITY)) {
      throw new IllegalArgumentException(what + " must be 0 or more, not " + value);
    }
    return value;
  }

  /**
   * Lets a whole number of at least 1 pass.
   *
   * @throws IllegalArgumentException if it is below 1
   */
  static int atLeastOne(int value, String what) {
    if (value < 1) {
      throw new IllegalArgumentException(what + " must be 1 or more, not " + value);
    }
    return value;
  }
}
