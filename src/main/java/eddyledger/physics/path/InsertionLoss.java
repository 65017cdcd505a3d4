package eddyledger.physics.path;

import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;

/**
 * Sound power that a panel radiates into its zone through a lay-up of known insertion loss.
 *
 * <p>Formula: W = W_bare · 10^(−IL/10), which is the definition IL = 10 lg(W_bare/W) solved for W.
 *
 * <ul>
 *   <li>W_bare: sound power radiated into the zone by the panel without the lay-up, W
 *   <li>W: sound power radiated into the zone with the lay-up, W
 *   <li>IL: insertion loss of the lay-up in the band, dB
 * </ul>
 *
 * <p>Source: definition. Both powers belong to the same blocked wall pressure on the outside, for
 * that is what a turbulent boundary layer keeps when the lay-up changes; the loss of the same
 * lay-up under an incident sound field differs from it near the mass-spring-mass resonance.
 *
 * <p>Range: any finite loss. Around the resonance of the lay-up the loss is negative and the lay-up
 * makes the panel louder; it is never cut off at zero. The mass and damping that a lay-up lends to
 * the panel are not in it unless its table says so.
 *
 * <p>Band powers (mean values over time, one-sided), not densities.
 *
 * <p>Checked by {@code InsertionLossTest}.
 */
public final class InsertionLoss {
  private InsertionLoss() {}

  /**
   * Power with the lay-up in one band.
   *
   * @param barePower power without it, W
   * @param loss insertion loss, dB; NaN if missing
   * @return W; NaN if the loss is missing
   */
  public static double power(double barePower, double loss) {
    return barePower * Decibels.ratio(-loss);
  }

  /**
   * Powers with the lay-up in all bands.
   *
   * @param barePowers powers without it, W, shape [28]
   * @param loss insertion loss, dB
   * @return W, shape [28], NaN where power or loss is missing
   * @throws IllegalArgumentException if there are not 28 powers
   */
  public static double[] powers(double[] barePowers, BandSpectrum loss) {
    if (barePowers.length != Bands.COUNT) {
      throw new IllegalArgumentException(
          "band powers are " + Bands.COUNT + ", not " + barePowers.length);
    }
    double[] powers = new double[Bands.COUNT];
    for (int i = 0; i < Bands.COUNT; i++) {
      powers[i] = power(barePowers[i], loss.value(i));
    }
    return powers;
  }
}
