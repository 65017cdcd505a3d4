package eddyledger.physics.vibration;

import eddyledger.physics.wallpressure.SeparableCrossSpectrum;
import eddyledger.quantity.Bands;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleUnaryOperator;

/**
 * One piece of panel under one flow, as {@link PanelResponse} takes it.
 *
 * @param plate the plate
 * @param lossFactor structural loss factor in each band (hysteretic), above 0, shape [28]
 * @param outside fluid on the flow side; empty if it does not load the plate
 * @param cabin fluid on the cabin side, into which the power is radiated; empty if there is none,
 *     the radiated power is then 0
 * @param crossSpectra the cross-spectra to answer for, at least one; they share the resonances
 * @param convectionSpeed convection speed in m/s, above 0, as a function of frequency in Hz
 * @param slices how finely the bands are cut
 */
public record PanelCase(
    Plate plate,
    double[] lossFactor,
    Optional<FluidFace> outside,
    Optional<FluidFace> cabin,
    List<SeparableCrossSpectrum> crossSpectra,
    DoubleUnaryOperator convectionSpeed,
    BandSlices slices) {

  /**
   * Checks and copies the values.
   *
   * @throws IllegalArgumentException if there are not 28 loss factors above 0, or no cross-spectrum
   */
  public PanelCase {
    lossFactor = lossFactor.clone();
    if (lossFactor.length != Bands.COUNT) {
      throw new IllegalArgumentException(
          "loss factors are " + Bands.COUNT + ", not " + lossFactor.length);
    }
    for (double value : lossFactor) {
      Require.positive(value, "loss factor");
    }
    crossSpectra = List.copyOf(crossSpectra);
    if (crossSpectra.isEmpty()) {
      throw new IllegalArgumentException("at least one cross-spectrum is needed");
    }
  }

  /** A case with as many slices as the highest order of its cross-spectra needs. */
  public static PanelCase of(
      Plate plate,
      double[] lossFactor,
      Optional<FluidFace> outside,
      Optional<FluidFace> cabin,
      List<SeparableCrossSpectrum> crossSpectra,
      DoubleUnaryOperator convectionSpeed) {
    int order = crossSpectra.stream().mapToInt(SeparableCrossSpectrum::order).max().orElse(1);
    return new PanelCase(
        plate,
        lossFactor,
        outside,
        cabin,
        crossSpectra,
        convectionSpeed,
        BandSlices.forOrder(order));
  }
}
