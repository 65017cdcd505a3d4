package eddyledger.quantity;

import java.util.List;

/**
 * The 28 one-third-octave bands of the program, from 25 Hz to 12.5 kHz, base ten.
 *
 * <p>Formula: mid-band frequency f_x = 1000 · 10^(x/10) Hz for the band index x = -16 .. 11; band
 * edges f_x · 10^(∓1/20) Hz. A band's position i = x + 16 counts from 0 to 27.
 *
 * <p>Source: IEC 61260-1:2014, clause 5 (base-ten system, exact mid-band and band-edge
 * frequencies). Nominal labels as in its annex E.
 *
 * <p>Checked by {@code BandsReferenceTest}.
 */
public final class Bands {
  /** Number of bands. */
  public static final int COUNT = 28;

  /** Band index x of the first band (25 Hz). */
  public static final int FIRST_INDEX = -16;

  private static final List<String> LABELS =
      List.of(
          "25", "31.5", "40", "50", "63", "80", "100", "125", "160", "200", "250", "315", "400",
          "500", "630", "800", "1000", "1250", "1600", "2000", "2500", "3150", "4000", "5000",
          "6300", "8000", "10000", "12500");

  private Bands() {}

  /** Nominal labels in hertz, in order of position: {@code "25", "31.5", ... "12500"}. */
  public static List<String> labels() {
    return LABELS;
  }

  /** Nominal label of the band at a position 0 .. 27. */
  public static String label(int position) {
    return LABELS.get(position);
  }

  /**
   * Position of a nominal label.
   *
   * @return 0 .. 27, or -1 if there is no such band
   */
  public static int position(String label) {
    return LABELS.indexOf(label);
  }

  /** Band index x (-16 .. 11) of a position 0 .. 27. */
  public static int index(int position) {
    return FIRST_INDEX + position;
  }

  /** Exact mid-band frequency, Hz. */
  public static double centre(int position) {
    return 1000.0 * Math.pow(10.0, index(position) / 10.0);
  }

  /** Exact lower band-edge frequency, Hz. */
  public static double lower(int position) {
    return 1000.0 * Math.pow(10.0, (2 * index(position) - 1) / 20.0);
  }

  /** Exact upper band-edge frequency, Hz. */
  public static double upper(int position) {
    return 1000.0 * Math.pow(10.0, (2 * index(position) + 1) / 20.0);
  }

  /** Exact mid-band frequencies, Hz, shape [28]. */
  public static double[] centres() {
    double[] centres = new double[COUNT];
    for (int i = 0; i < COUNT; i++) {
      centres[i] = centre(i);
    }
    return centres;
  }
}
