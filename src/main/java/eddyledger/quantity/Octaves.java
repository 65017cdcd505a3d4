package eddyledger.quantity;

import java.util.Arrays;
import java.util.List;

/**
 * The nine octave bands that the 28 one-third-octave bands fill completely, 31.5 Hz to 8 kHz, and
 * the sums of thirds to octaves.
 *
 * <p>Formula: mid-band frequency f_n = 1000 · 10^(0.3 n) Hz, n = -5 .. 3, edges f_n · 10^(∓0.15);
 * p²_octave = Σ of the three p²_third inside it, or L_octave = 10 lg Σ 10^(L_third/10).
 *
 * <p>An octave's position j = n + 5 counts from 0 to 8; its middle third stands at band position 3
 * j + 1 and has the same mid-band frequency. The third at 12.5 kHz belongs to no complete octave.
 *
 * <p>Source: IEC 61260-1:2014, clause 5 (base-ten system).
 *
 * <p>Range: an octave of which one third is missing is missing (NaN). The way back does not exist:
 * an octave level is never split into thirds.
 *
 * <p>Checked by {@code OctaveRowsReferenceTest} and {@code OctavesTest}.
 */
public final class Octaves {
  /** Number of octave bands. */
  public static final int COUNT = 9;

  private static final List<String> LABELS =
      List.of("31.5", "63", "125", "250", "500", "1000", "2000", "4000", "8000");

  private static final int THIRDS = 3;

  private Octaves() {}

  /** Nominal labels in hertz, in order of position. */
  public static List<String> labels() {
    return LABELS;
  }

  /** Nominal label of the octave at a position 0 .. 8. */
  public static String label(int position) {
    return LABELS.get(position);
  }

  /**
   * Position of a nominal label.
   *
   * @return 0 .. 8, or -1 if there is no such octave
   */
  public static int position(String label) {
    return LABELS.indexOf(label);
  }

  /** Position 0 .. 27 of the third in the middle of the octave at a position 0 .. 8. */
  public static int middleThird(int position) {
    if (position < 0 || position >= COUNT) {
      throw new IndexOutOfBoundsException("there is no octave at position " + position);
    }
    return THIRDS * position + 1;
  }

  /** Exact mid-band frequency of the octave at a position 0 .. 8, Hz. */
  public static double centre(int position) {
    return Bands.centre(middleThird(position));
  }

  /**
   * Mean squares of the octaves.
   *
   * @param meanSquares mean squares of the thirds, Pa², shape [28], NaN where missing
   * @return Pa², shape [9], NaN where a third is missing
   * @throws IllegalArgumentException if there are not 28 values
   */
  public static double[] meanSquares(double[] meanSquares) {
    if (meanSquares.length != Bands.COUNT) {
      throw new IllegalArgumentException(
          "octaves are summed from " + Bands.COUNT + " thirds, not " + meanSquares.length);
    }
    double[] octaves = new double[COUNT];
    for (int j = 0; j < COUNT; j++) {
      int middle = middleThird(j);
      octaves[j] = meanSquares[middle - 1] + meanSquares[middle] + meanSquares[middle + 1];
    }
    return octaves;
  }

  /**
   * Levels of the octaves.
   *
   * @param thirds levels of the thirds, dB
   * @return dB, shape [9], NaN where a third is missing
   */
  public static double[] levels(BandSpectrum thirds) {
    double[] energies = meanSquares(thirds.map(Decibels::meanSquarePressure).toArray());
    return Arrays.stream(energies).map(Decibels::pressureLevel).toArray();
  }
}
