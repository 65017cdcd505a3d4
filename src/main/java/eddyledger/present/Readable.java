package eddyledger.present;

import eddyledger.quantity.Bands;
import eddyledger.quantity.LevelText;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Numbers with units as people read them: millimetres, kilohertz, a true minus sign. */
final class Readable {
  /** Stands where there is no value. */
  static final String NONE = "—";

  private static final char MINUS = '−';
  private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";
  private static final Pattern POWER = Pattern.compile("(?<=\\d)[eE]([+-]?)0*(\\d+)");
  private static final double THOUSAND = 1000.0;

  private Readable() {}

  /** A number with so many significant digits; powers of ten where it is very small or large. */
  static String number(double value, int digits) {
    if (!Double.isFinite(value)) {
      return NONE;
    }
    BigDecimal rounded =
        BigDecimal.valueOf(value).round(new MathContext(digits, RoundingMode.HALF_UP));
    if (rounded.signum() == 0) {
      return "0";
    }
    int exponent = rounded.precision() - rounded.scale() - 1;
    if (exponent < -3 || exponent > 5) {
      String mantissa = rounded.movePointLeft(exponent).setScale(digits - 1).toPlainString();
      return signed(mantissa) + "·10" + raised(exponent);
    }
    BigDecimal plain = rounded.scale() < 0 ? rounded.setScale(0) : padded(rounded, digits);
    return signed(plain.toPlainString());
  }

  private static BigDecimal padded(BigDecimal rounded, int digits) {
    int before = rounded.precision() - rounded.scale();
    return rounded.setScale(Math.max(0, digits - before), RoundingMode.HALF_UP);
  }

  /** A number without needless zeros, up to four significant digits: 0.74, 1.08, 2. */
  static String plain(double value) {
    String text = number(value, 4);
    return text.contains(".") && !text.contains("·") ? text.replaceAll("\\.?0+$", "") : text;
  }

  /** A length given in metres: millimetres below one metre. */
  static String length(double metres) {
    return Math.abs(metres) < 1.0 ? plain3(metres * THOUSAND) + " mm" : plain3(metres) + " m";
  }

  /** Two lengths given in metres: {@code 500 by 180 mm}. */
  static String size(double first, double second) {
    boolean both = Math.abs(first) < 1.0 && Math.abs(second) < 1.0;
    String text = length(first);
    return (both ? text.substring(0, text.length() - 3) : text) + " by " + length(second);
  }

  /** A pressure in pascal: kilopascal from a thousand on. */
  static String pressure(double pascal) {
    return Math.abs(pascal) < THOUSAND
        ? number(pascal, 3) + " Pa"
        : number(pascal / THOUSAND, 3) + " kPa";
  }

  /** A frequency in hertz: kilohertz from a thousand on. */
  static String frequency(double hertz) {
    return hertz < THOUSAND ? plain3(hertz) + " Hz" : plain3(hertz / THOUSAND) + " kHz";
  }

  /** A speed in metres per second. */
  static String speed(double metresPerSecond) {
    return number(metresPerSecond, 4) + " m/s";
  }

  private static String plain3(double value) {
    String text = number(value, 3);
    return text.contains(".") && !text.contains("·") ? text.replaceAll("\\.?0+$", "") : text;
  }

  /** A level in dB with one decimal; a dash if there is none. */
  static String level(double value) {
    return Double.isFinite(value) ? signed(LevelText.text(value)) : NONE;
  }

  /** A level difference in dB with its sign; a dash if there is none. */
  static String difference(double value) {
    String text = level(value);
    boolean bare = text.equals(NONE) || text.equals("0.0") || text.charAt(0) == MINUS;
    return bare ? text : "+" + text;
  }

  /** A share of energy in per cent; a dash if there is none. */
  static String share(double ratio) {
    if (!Double.isFinite(ratio)) {
      return NONE;
    }
    String text = LevelText.text(100.0 * ratio);
    return ratio > 0.0 && text.equals("0.0") ? "under 0.1 %" : text + " %";
  }

  /** Name of a band by its position 0 .. 27: {@code 31.5 Hz}, {@code 1.25 kHz}. */
  static String band(int position) {
    BigDecimal nominal = new BigDecimal(Bands.label(position));
    return nominal.doubleValue() < THOUSAND
        ? Bands.label(position) + " Hz"
        : nominal.movePointLeft(3).stripTrailingZeros().toPlainString() + " kHz";
  }

  /** A sentence of the ledger with powers of ten and minus signs as they are printed. */
  static String sentence(String text) {
    Matcher matcher = POWER.matcher(text);
    StringBuilder printed = new StringBuilder();
    while (matcher.find()) {
      int exponent = Integer.parseInt(matcher.group(2));
      matcher.appendReplacement(
          printed, "·10" + raised(matcher.group(1).equals("-") ? -exponent : exponent));
    }
    matcher.appendTail(printed);
    return capital(printed.toString().replaceAll("(?<=^|[ (])-(?=\\d)", String.valueOf(MINUS)));
  }

  /** A name without what follows its first comma: {@code Cruise, M 0.74} is {@code Cruise}. */
  static String brief(String name) {
    int comma = name.indexOf(", ");
    return comma > 0 ? name.substring(0, comma) : name;
  }

  /** The text with a capital first letter. */
  static String capital(String text) {
    return text.isEmpty() ? text : Character.toUpperCase(text.charAt(0)) + text.substring(1);
  }

  private static String signed(String text) {
    return text.startsWith("-") ? MINUS + text.substring(1) : text;
  }

  private static String raised(int exponent) {
    StringBuilder text = new StringBuilder(exponent < 0 ? "⁻" : "");
    for (char digit : Integer.toString(Math.abs(exponent)).toCharArray()) {
      text.append(RAISED.charAt(digit - '0'));
    }
    return text.toString();
  }
}
