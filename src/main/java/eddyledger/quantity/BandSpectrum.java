package eddyledger.quantity;

import java.util.Arrays;
import java.util.function.DoubleUnaryOperator;

/**
 * One value for each of the 28 one-third-octave bands; a band may be missing. Immutable.
 *
 * <p>What the values mean (a level, a loss, an area) and their unit are said by whoever holds the
 * spectrum. A missing band is never a zero: whatever is made from it is missing as well.
 */
public final class BandSpectrum {
  private final double[] values;

  private BandSpectrum(double[] values) {
    this.values = values;
  }

  /**
   * Makes a spectrum.
   *
   * @param values shape [28], NaN where a band is missing
   * @throws IllegalArgumentException if there are not 28 values or one is infinite
   */
  public static BandSpectrum of(double... values) {
    if (values.length != Bands.COUNT) {
      throw new IllegalArgumentException(
          "a band spectrum has " + Bands.COUNT + " values, not " + values.length);
    }
    for (double value : values) {
      if (Double.isInfinite(value)) {
        throw new IllegalArgumentException("a band value is infinite");
      }
    }
    return new BandSpectrum(values.clone());
  }

  /** The same value in every band. */
  public static BandSpectrum constant(double value) {
    double[] values = new double[Bands.COUNT];
    Arrays.fill(values, value);
    return of(values);
  }

  /** Value of the band at a position 0 .. 27; NaN if it is missing. */
  public double value(int position) {
    return values[position];
  }

  /** Whether the band at a position 0 .. 27 has a value. */
  public boolean has(int position) {
    return !Double.isNaN(values[position]);
  }

  /** Whether every band has a value. */
  public boolean complete() {
    return Arrays.stream(values).noneMatch(Double::isNaN);
  }

  /** A copy of the values, shape [28], NaN where a band is missing. */
  public double[] toArray() {
    return values.clone();
  }

  /** A spectrum with the function applied in every band that has a value. */
  public BandSpectrum map(DoubleUnaryOperator function) {
    double[] mapped = new double[Bands.COUNT];
    for (int i = 0; i < Bands.COUNT; i++) {
      mapped[i] = has(i) ? function.applyAsDouble(values[i]) : Double.NaN;
    }
    return of(mapped);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof BandSpectrum that && Arrays.equals(values, that.values);
  }

  @Override
  public int hashCode() {
    return Arrays.hashCode(values);
  }

  @Override
  public String toString() {
    return Arrays.toString(values);
  }
}
