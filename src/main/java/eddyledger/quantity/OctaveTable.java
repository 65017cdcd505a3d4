package eddyledger.quantity;

import java.util.Arrays;

/**
 * A loss given at octave centres, read into the 28 one-third-octave bands. Immutable.
 *
 * <p>Formula: between two given octaves at f_a and f_b, v(f) = v_a + (v_b − v_a) lg(f/f_a) /
 * lg(f_b/f_a); flat below the lowest and above the highest given octave.
 *
 * <ul>
 *   <li>v: insertion loss or transmission loss in dB, or loss factor or absorption coefficient
 *       (dimensionless)
 *   <li>f: exact mid-band frequency, Hz
 * </ul>
 *
 * <p>Source: this program's own rule for tables of losses.
 *
 * <p>Range: losses only, never levels or mean squares, whose octave value is a sum over its thirds
 * and not a value at its centre. An octave left out between two given ones is bridged; where a
 * value is read between or beyond the given ones, {@link #given(int)} is false, so that the trace
 * can say so. Negative values (an insertion loss around a resonance) are kept.
 *
 * <p>Checked by {@code OctaveTableTest}.
 */
public final class OctaveTable {
  private final double[] octaves;

  private OctaveTable(double[] octaves) {
    this.octaves = octaves;
  }

  /**
   * Makes a table.
   *
   * @param values shape [9], in order of {@link Octaves#labels()}, NaN where not given
   * @throws IllegalArgumentException if there are not nine values, none is given or one is infinite
   */
  public static OctaveTable of(double... values) {
    if (values.length != Octaves.COUNT) {
      throw new IllegalArgumentException(
          "an octave table has " + Octaves.COUNT + " places, not " + values.length);
    }
    if (Arrays.stream(values).allMatch(Double::isNaN)) {
      throw new IllegalArgumentException("an octave table needs at least one value");
    }
    if (Arrays.stream(values).anyMatch(Double::isInfinite)) {
      throw new IllegalArgumentException("a value of an octave table is infinite");
    }
    return new OctaveTable(values.clone());
  }

  /**
   * Makes a table from a run of octaves.
   *
   * @param firstLabel nominal label of the first octave, such as {@code "63"}
   * @param values values of that octave and the following ones, NaN where not given
   * @throws IllegalArgumentException if there is no such octave, the run passes 8 kHz, no value is
   *     given or one is infinite
   */
  public static OctaveTable startingAt(String firstLabel, double... values) {
    int first = Octaves.position(firstLabel);
    if (first < 0) {
      throw new IllegalArgumentException(
          "there is no octave " + firstLabel + "; known are " + Octaves.labels());
    }
    if (first + values.length > Octaves.COUNT) {
      throw new IllegalArgumentException(
          values.length + " octaves from " + firstLabel + " Hz pass 8000 Hz");
    }
    double[] octaves = new double[Octaves.COUNT];
    Arrays.fill(octaves, Double.NaN);
    System.arraycopy(values, 0, octaves, first, values.length);
    return of(octaves);
  }

  /** Whether the third at a position 0 .. 27 is the centre of a given octave, not interpolated. */
  public boolean given(int position) {
    for (int j = 0; j < Octaves.COUNT; j++) {
      if (Octaves.middleThird(j) == position) {
        return has(j);
      }
    }
    return false;
  }

  /** The values of the 28 one-third-octave bands; none is missing. */
  public BandSpectrum thirds() {
    double[] thirds = new double[Bands.COUNT];
    for (int i = 0; i < Bands.COUNT; i++) {
      thirds[i] = at(i);
    }
    return BandSpectrum.of(thirds);
  }

  private double at(int third) {
    int below = -1;
    int above = -1;
    for (int j = 0; j < Octaves.COUNT; j++) {
      if (has(j) && Octaves.middleThird(j) <= third) {
        below = j;
      }
      if (has(j) && Octaves.middleThird(j) >= third && above < 0) {
        above = j;
      }
    }
    if (below < 0 || above == below) {
      return octaves[above];
    }
    if (above < 0) {
      return octaves[below];
    }
    // base-ten mid-bands are evenly spaced in lg f, so positions stand for lg f without rounding
    double share =
        (double) (third - Octaves.middleThird(below))
            / (Octaves.middleThird(above) - Octaves.middleThird(below));
    return octaves[below] + share * (octaves[above] - octaves[below]);
  }

  private boolean has(int octave) {
    return !Double.isNaN(octaves[octave]);
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof OctaveTable that && Arrays.equals(octaves, that.octaves);
  }

  @Override
  public int hashCode() {
    return Arrays.hashCode(octaves);
  }

  @Override
  public String toString() {
    return Arrays.toString(octaves);
  }
}
