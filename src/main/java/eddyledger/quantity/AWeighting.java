package eddyledger.quantity;

/**
 * The A-weighting of sound levels.
 *
 * <p>Formula: A(f) = 20 lg R(f) − 20 lg R(1000 Hz), with R(f) = f4² f⁴ / [(f² + f1²) √((f² + f2²)
 * (f² + f3²)) (f² + f4²)].
 *
 * <ul>
 *   <li>A: weight added to the level of a band, dB
 *   <li>f: frequency, Hz; for a band its exact mid-band frequency
 *   <li>f1 = 20.598997, f2 = 107.65265, f3 = 737.86223, f4 = 12194.217: pole frequencies, Hz
 * </ul>
 *
 * <p>Source: IEC 61672-1:2013, annex E (analytical expression), with its pole frequencies to eight
 * digits. The weight at 1 kHz is exactly zero here, where the standard subtracts a constant rounded
 * to 0.001 dB.
 *
 * <p>Range: any frequency; minus infinity at 0 Hz. A band takes the weight of its mid-band
 * frequency, whatever the shape of the spectrum inside the band.
 *
 * <p>Acts on levels in dB; on mean squares (one-sided, Pa²) through {@link #energyRatios()}.
 *
 * <p>Checked by {@code AWeightingReferenceTest}.
 */
public final class AWeighting {
  private static final double F1 = 20.598997;
  private static final double F2 = 107.65265;
  private static final double F3 = 737.86223;
  private static final double F4 = 12194.217;

  private static final double RESPONSE_AT_1_KHZ = response(1000.0);

  private static final BandSpectrum WEIGHTS = weightsAtMidBands();
  private static final BandSpectrum ENERGY_RATIOS = WEIGHTS.map(Decibels::ratio);

  private AWeighting() {}

  /**
   * Weight at a frequency in Hz, dB; minus infinity at 0 Hz.
   *
   * @throws IllegalArgumentException if the frequency is negative or not a number
   */
  public static double weight(double frequency) {
    if (!(frequency >= 0.0)) {
      throw new IllegalArgumentException("a frequency must not be negative: " + frequency);
    }
    return 20.0 * Math.log10(response(frequency) / RESPONSE_AT_1_KHZ);
  }

  /** Weights of the 28 bands at their exact mid-band frequencies, dB. */
  public static BandSpectrum weights() {
    return WEIGHTS;
  }

  /** Weights of the 28 bands as factors on the mean square, 10^(A/10). */
  public static BandSpectrum energyRatios() {
    return ENERGY_RATIOS;
  }

  private static BandSpectrum weightsAtMidBands() {
    double[] weights = new double[Bands.COUNT];
    for (int i = 0; i < Bands.COUNT; i++) {
      weights[i] = weight(Bands.centre(i));
    }
    return BandSpectrum.of(weights);
  }

  private static double response(double f) {
    double f2 = f * f;
    return F4
        * F4
        * f2
        * f2
        / ((f2 + F1 * F1) * Math.sqrt((f2 + F2 * F2) * (f2 + F3 * F3)) * (f2 + F4 * F4));
  }
}
