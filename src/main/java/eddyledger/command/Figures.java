package eddyledger.command;

import eddyledger.quantity.LevelText;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Locale;

/** Numbers of a table as text; a number that is not there is an empty cell. */
final class Figures {
  private static final int FOUR_DIGITS = 4;

  private Figures() {}

  /** A level in dB with one decimal; empty if there is none. */
  static String level(double value) {
    return Double.isNaN(value) || Double.isInfinite(value) ? "" : LevelText.text(value);
  }

  /** A margin in dB with its sign and one decimal; empty if there is none. */
  static String margin(double value) {
    String text = level(value);
    return text.isEmpty() || text.startsWith("-") || text.equals("0.0") ? text : "+" + text;
  }

  /** A share of energy in per cent; empty if there is none. */
  static String share(double ratio) {
    if (Double.isNaN(ratio) || Double.isInfinite(ratio)) {
      return "";
    }
    return LevelText.text(100.0 * ratio) + " %";
  }

  /** A number with four significant digits, for traces; empty if there is none. */
  static String number(double value) {
    if (Double.isNaN(value)) {
      return "";
    }
    if (value == 0.0) {
      return "0";
    }
    double size = Math.abs(value);
    if (value == Math.rint(value) && size < 1.0e6) {
      return Long.toString((long) value);
    }
    if (size < 1.0e-3 || size >= 1.0e6) {
      return String.format(Locale.ROOT, "%.3e", value);
    }
    return new BigDecimal(value)
        .round(new MathContext(FOUR_DIGITS))
        .stripTrailingZeros()
        .toPlainString();
  }
}
