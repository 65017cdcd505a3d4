package eddyledger.present;

import eddyledger.ledger.State;
import eddyledger.ledger.Status;
import eddyledger.quantity.LevelText;
import java.math.BigDecimal;
import java.math.RoundingMode;

/** Numbers of the desk as text: one decimal, a true minus sign, never a minus zero. */
final class DeskNumbers {
  /** Stands where there is no value. */
  static final String NONE = "\u2014";

  /** Before a number that is a lower bound. */
  static final String AT_LEAST = "\u2265\u2009";

  /** Before a margin whose level is a lower bound. */
  static final String AT_MOST = "\u2264\u2009";

  private static final String MINUS = "\u2212";
  private static final int MOST_DECIMALS = 3;
  private static final double LEAST_SHARE = 0.0005;

  private DeskNumbers() {}

  /** A level in dB; a dash for NaN and for silence. */
  static String level(double level) {
    return Double.isFinite(level) ? LevelText.text(level).replace("-", MINUS) : NONE;
  }

  /** A level in dB, marked as a lower bound if it is not whole. */
  static String level(double level, Status status) {
    return (Double.isFinite(level) && status != Status.OK ? AT_LEAST : "") + level(level);
  }

  /**
   * A margin in dB with its sign. One decimal, or as many more as it takes that the number shown is
   * of the same state as the number meant: a margin of -0.04 dB is over, and "0.0" is not.
   *
   * @param tightBand margin below which a state is tight, dB
   */
  static String margin(double margin, double tightBand) {
    State state = State.of(margin, tightBand);
    BigDecimal exact = BigDecimal.valueOf(margin);
    BigDecimal shown = exact.setScale(1, RoundingMode.HALF_UP);
    for (int decimals = 2; decimals <= MOST_DECIMALS; decimals++) {
      if (State.of(shown.doubleValue(), tightBand) == state) {
        break;
      }
      shown = exact.setScale(decimals, RoundingMode.HALF_UP);
    }
    String size = shown.abs().toPlainString();
    return switch (shown.signum()) {
      case 1 -> "+" + size;
      case -1 -> MINUS + size;
      default -> size;
    };
  }

  /** A share of energy in per cent; a trace of something is never 0; empty if there is none. */
  static String share(double ratio) {
    if (!Double.isFinite(ratio)) {
      return "";
    }
    return ratio > 0.0 && ratio < LEAST_SHARE ? "<0.1 %" : LevelText.text(100.0 * ratio) + " %";
  }

  /** A mass in kg with one decimal, marked as a lower bound if a part is not known. */
  static String mass(Mass mass) {
    if (mass.none()) {
      return "";
    }
    if (mass.unknown()) {
      return NONE;
    }
    return (mass.whole() ? "" : AT_LEAST) + LevelText.text(mass.kilograms());
  }
}
