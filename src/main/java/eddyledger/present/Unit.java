package eddyledger.present;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;

/**
 * A unit a number can be typed or shown in, with its exact size in the unit of the model.
 *
 * <p>Source: BIPM, The International System of Units (SI Brochure), 9th edition 2019, and NIST
 * Special Publication 811 (2008), appendix B: 1 in = 25.4 mm, 1 ft = 0.3048 m, 1 mi = 1609.344 m, 1
 * nautical mile = 1852 m, 1 kn = 1852/3600 m/s, all exact.
 *
 * <p>Checked by {@code UnitReferenceTest}.
 */
public enum Unit {
  /** A pure number. */
  ONE("", "1", "1"),
  /** Hundredths. */
  PERCENT("%", "1", "100", "percent"),
  /** Metre. */
  METRE("m", "1", "1"),
  /** Millimetre. */
  MILLIMETRE("mm", "1", "1000"),
  /** Inch. */
  INCH("in", "254", "10000", "\"", "inch"),
  /** Foot. */
  FOOT("ft", "3048", "10000", "'", "foot"),
  /** Metre per second. */
  METRE_PER_SECOND("m/s", "1", "1"),
  /** Kilometre per hour. */
  KILOMETRE_PER_HOUR("km/h", "1000", "3600", "kph", "kmh"),
  /** Knot. */
  KNOT("kn", "1852", "3600", "kt", "kts", "knots"),
  /** Mile per hour. */
  MILE_PER_HOUR("mph", "1609.344", "3600", "mi/h"),
  /** Foot per second. */
  FOOT_PER_SECOND("ft/s", "3048", "10000", "fps"),
  /** Times the vehicle's speed. */
  TIMES_SPEED("× U", "1", "1", "U", "x U", "×U", "xU"),
  /** Pressure coefficient, isentropic flow. */
  PRESSURE_COEFFICIENT("Cp", "1", "1"),
  /** Pressure coefficient, incompressible flow. */
  PRESSURE_COEFFICIENT_INCOMPRESSIBLE("Cp inc.", "1", "1", "Cp inc"),
  /** Pascal. */
  PASCAL("Pa", "1", "1"),
  /** Kilogram per square metre. */
  SURFACE_MASS("kg/m²", "1", "1", "kg/m2"),
  /** Decibel. */
  DECIBEL("dB", "1", "1"),
  /** A-weighted decibel. */
  DECIBEL_A("dB(A)", "1", "1", "dBA", "dB A");

  private final String symbol;
  private final BigDecimal numerator;
  private final BigDecimal denominator;
  private final List<String> spellings;

  Unit(String symbol, String numerator, String denominator, String... spellings) {
    this.symbol = symbol;
    this.numerator = new BigDecimal(numerator);
    this.denominator = new BigDecimal(denominator);
    this.spellings = List.of(spellings);
  }

  /** Its symbol as shown. */
  public String symbol() {
    return symbol;
  }

  /** Whether a text means this unit; case counts in none of the units. */
  public boolean means(String text) {
    return symbol.equalsIgnoreCase(text)
        || spellings.stream().anyMatch(spelling -> spelling.equalsIgnoreCase(text));
  }

  /** A number in this unit, in the unit of the model; rounded once, at the end. */
  public double toModel(BigDecimal number) {
    return number.multiply(numerator).divide(denominator, MathContext.DECIMAL128).doubleValue();
  }

  /** A number of the model, in this unit. */
  public BigDecimal fromModel(double value) {
    // through the shortest decimal text of the double, which is what was once entered
    return BigDecimal.valueOf(value).multiply(denominator).divide(numerator, MathContext.DECIMAL64);
  }
}
