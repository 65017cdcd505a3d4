package eddyledger.present;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Numbers as people type and read them: with a unit behind them if they like, and with a decimal
 * comma where it cannot be meant for anything else.
 */
public final class NumberText {
  private static final int SIGNIFICANT = 6;
  private static final int LONGEST = 40;
  private static final Pattern FORM =
      Pattern.compile("([+\\-−]?)([0-9.,]+)((?:[eE][+\\-−]?[0-9]{1,3})?)\\s*(\\D.*)?");
  private static final Pattern THOUSANDS = Pattern.compile("[1-9][0-9]{0,2},[0-9]{3}");

  private NumberText() {}

  /**
   * What was read.
   *
   * @param value the number in the model's unit; NaN if it could not be read
   * @param unit the unit it was typed in
   * @param fault why it could not be read, as a sentence; empty if it could
   */
  public record Read(double value, Unit unit, String fault) {
    /** Whether there is a number. */
    public boolean ok() {
      return fault.isEmpty();
    }
  }

  /** Reads a number typed for a quantity; without a unit it is in the unit shown. */
  public static Read read(String typed, Quantity quantity, Unit shown) {
    String text = typed.strip();
    if (text.isEmpty()) {
      return fault(shown, "Type a number.");
    }
    Matcher form = FORM.matcher(text);
    if (text.length() > LONGEST || !form.matches()) {
      return fault(shown, "“" + text + "” is not a number.");
    }
    String number = form.group(2);
    if (number.contains(",")
        && (number.contains(".") || number.indexOf(',') != number.lastIndexOf(','))) {
      return fault(shown, "Only one decimal sign, please, and no thousands signs.");
    }
    if (THOUSANDS.matcher(number).matches()) {
      return fault(
          shown,
          "“"
              + number
              + "” could be "
              + number.replace(',', '.')
              + " or "
              + number.replace(",", "")
              + ". Type it without comma.");
    }
    Optional<Unit> unit = unit(form.group(4), quantity, shown);
    if (unit.isEmpty()) {
      return fault(
          shown, "“" + form.group(4).strip() + "” is not a unit for this. " + offered(quantity));
    }
    try {
      String plain = form.group(1) + number.replace(',', '.') + form.group(3);
      double value = unit.get().toModel(new BigDecimal(plain.replace('−', '-')));
      return Double.isInfinite(value)
          ? fault(shown, "“" + text + "” is too large.")
          : new Read(value == 0.0 ? 0.0 : value, unit.get(), "");
    } catch (NumberFormatException e) {
      return fault(shown, "“" + text + "” is not a number.");
    }
  }

  private static Read fault(Unit shown, String words) {
    return new Read(Double.NaN, shown, words);
  }

  private static Optional<Unit> unit(String suffix, Quantity quantity, Unit shown) {
    if (suffix == null || suffix.isBlank()) {
      return Optional.of(shown);
    }
    String text = suffix.strip();
    return quantity.units().stream().filter(unit -> unit.means(text)).findFirst();
  }

  private static String offered(Quantity quantity) {
    String units =
        String.join(
            ", ", quantity.units().stream().map(Unit::symbol).filter(it -> !it.isEmpty()).toList());
    return units.isEmpty() ? "It has none." : "It takes " + units + ".";
  }

  /** A number of the model in a unit, six significant digits, minus as U+2212. */
  public static String text(double value, Quantity quantity, Unit unit) {
    return text(value, quantity, unit, SIGNIFICANT);
  }

  /** A number of the model in a unit with so many significant digits, minus as U+2212. */
  public static String text(double value, Quantity quantity, Unit unit, int significant) {
    if (Double.isNaN(value)) {
      return "";
    }
    BigDecimal number = unit.fromModel(value);
    if (quantity.usual() == Unit.DECIBEL || quantity.usual() == Unit.DECIBEL_A) {
      number =
          number.setScale(
              significant < SIGNIFICANT ? 1 : Math.min(3, Math.max(1, number.scale())),
              RoundingMode.HALF_UP);
    }
    BigDecimal rounded = number.round(new MathContext(significant, RoundingMode.HALF_UP));
    BigDecimal bare = rounded.stripTrailingZeros();
    int least = unit == quantity.usual() ? quantity.decimals() : 0;
    BigDecimal shown =
        bare.setScale(Math.max(Math.max(bare.scale(), least), 0), RoundingMode.HALF_UP);
    return minus(shown.toPlainString());
  }

  /** A text with the hyphen before a number replaced by a minus. */
  static String minus(String text) {
    return text.startsWith("-") ? "−" + text.substring(1) : text;
  }
}
