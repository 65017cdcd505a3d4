package eddyledger.physics.vibration;

import eddyledger.quantity.Bands;

/**
 * The 28 bands, each cut into slices of equal ratio. All but the resonances is taken as constant
 * over a slice.
 *
 * <p>Slice i counts from 0 to 28 · perBand − 1; band b has the slices b · perBand up to (b + 1) ·
 * perBand − 1.
 *
 * @param perBand slices in each band, 1 or more
 */
public record BandSlices(int perBand) {
  private static final int FOR_ORDER_ONE = 6;
  private static final int FOR_HIGHER_ORDERS = 12;

  /**
   * Checks the number.
   *
   * @throws IllegalArgumentException if it is below 1
   */
  public BandSlices {
    Require.atLeastOne(perBand, "slices per band");
  }

  /**
   * As many slices as keep the error of a band below 0.1 dB: 6 for cross-spectra of order 1, 12 for
   * higher orders. Largest error over 24 bands and three panels against a fine integration: order 1
   * 0.07 dB, orders (2, 1) 0.03 dB, (3, 2) 0.05 dB.
   *
   * @param order highest order of the cross-spectra in use
   */
  public static BandSlices forOrder(int order) {
    return new BandSlices(order <= 1 ? FOR_ORDER_ONE : FOR_HIGHER_ORDERS);
  }

  /** Number of slices in all bands. */
  public int count() {
    return perBand * Bands.COUNT;
  }

  /** Lower edge of a slice, Hz. */
  public double lower(int slice) {
    return edge(slice / perBand, slice % perBand);
  }

  /** Upper edge of a slice, Hz. */
  public double upper(int slice) {
    return edge(slice / perBand, slice % perBand + 1);
  }

  /** Geometric centre of a slice, Hz. */
  public double centre(int slice) {
    return Math.sqrt(lower(slice) * upper(slice));
  }

  /** Geometric centres of all slices, Hz, shape [28 · perBand]. */
  public double[] centres() {
    double[] centres = new double[count()];
    for (int i = 0; i < centres.length; i++) {
      centres[i] = centre(i);
    }
    return centres;
  }

  /** Width of a slice, Hz. */
  public double width(int slice) {
    return upper(slice) - lower(slice);
  }

  private double edge(int band, int step) {
    if (step == perBand) {
      // the next slice's lower edge, to the bit
      return band + 1 < Bands.COUNT ? Bands.lower(band + 1) : Bands.upper(band);
    }
    double lower = Bands.lower(band);
    return lower * Math.pow(Bands.upper(band) / lower, step / (double) perBand);
  }
}
