package eddyledger.physics.vibration;

import eddyledger.physics.Remark;
import eddyledger.quantity.Bands;
import java.util.List;

/**
 * What one piece of panel does to the wall pressure on it: power radiated and velocity for a wall
 * pressure of one-sided density 1 Pa²/Hz in each slice.
 *
 * @param slices how the bands were cut; centres in Hz by {@link BandSlices#centres}
 * @param radiatedPower power into the cabin over wall-pressure density, integrated over the slice,
 *     W/(Pa²/Hz), shape [cross-spectra][28 · slices per band]
 * @param meanSquareVelocity space-mean-square velocity over wall-pressure density, integrated over
 *     the slice, (m/s)²/(Pa²/Hz), shape [cross-spectra][28 · slices per band]
 * @param modesSummed modes that were summed in each band, shape [28]
 * @param modesInBand modes whose frequency lies in each band, shape [28]
 * @param firstModeFrequency frequency of the lowest mode, Hz
 * @param remarks what the reader of the trace should know
 */
public record PanelTransfer(
    BandSlices slices,
    double[][] radiatedPower,
    double[][] meanSquareVelocity,
    int[] modesSummed,
    int[] modesInBand,
    double firstModeFrequency,
    List<Remark> remarks) {

  /**
   * Radiated sound power in each band, W.
   *
   * @param density one-sided wall-pressure density at the slice centres, Pa²/Hz, shape [28 · slices
   *     per band]
   * @param which position of the cross-spectrum
   * @return shape [28]
   * @throws IllegalArgumentException if the density has another shape
   */
  public double[] bandPower(double[] density, int which) {
    return sum(density, radiatedPower[which]);
  }

  /** Space-mean-square velocity in each band, (m/s)²; arguments as for {@link #bandPower}. */
  public double[] bandMeanSquareVelocity(double[] density, int which) {
    return sum(density, meanSquareVelocity[which]);
  }

  private double[] sum(double[] density, double[] transfer) {
    if (density.length != transfer.length) {
      throw new IllegalArgumentException(
          "densities are one for each of " + transfer.length + " slices, not " + density.length);
    }
    double[] bands = new double[Bands.COUNT];
    for (int i = 0; i < transfer.length; i++) {
      bands[i / slices.perBand()] += density[i] * transfer[i];
    }
    return bands;
  }
}
