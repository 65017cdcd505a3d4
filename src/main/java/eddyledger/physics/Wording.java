package eddyledger.physics;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;

/** How numbers are written in remarks and messages. */
public final class Wording {
  private static final double PLAIN_FROM = 1e-4;
  private static final double PLAIN_TO = 1e7;

  private Wording() {}

  /**
   * A number in four significant digits without trailing zeros, the same in every locale: {@code
   * 0.002091}, {@code 23000}, {@code 1.2e-05}.
   *
   * @param value any number; what is not finite is written as Java writes it
   */
  public static String number(double value) {
    if (value == 0.0) {
      return "0";
    }
    if (!Double.isFinite(value)) {
      return Double.toString(value);
    }
    BigDecimal rounded = new BigDecimal(value).round(new MathContext(4)).stripTrailingZeros();
    double size = Math.abs(value);
    if (size >= PLAIN_FROM && size < PLAIN_TO) {
      return rounded.toPlainString();
    }
    int digits = rounded.precision() - 1;
    return String.format(Locale.ROOT, "%." + digits + "e", rounded);
  }
}
