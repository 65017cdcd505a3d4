package eddyledger.ledger;

import eddyledger.physics.Remark;
import eddyledger.physics.flow.BoundaryLayer;
import eddyledger.physics.vibration.BandSlices;
import eddyledger.physics.wallpressure.ButterworthCrossSpectrum;
import eddyledger.physics.wallpressure.WallPressureSpectra;
import eddyledger.physics.wallpressure.WallPressureSpectrum;
import eddyledger.quantity.Bands;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;

/**
 * The wall pressure under a layer in the 28 bands.
 *
 * @param densities one-sided spectral density at the exact mid-band frequency, Pa²/Hz, shape [28]
 * @param meanSquares mean square in the band, Pa², shape [28], by log-equal slices
 * @param slices density at the geometric centre of every slice, Pa²/Hz, shape [slices]
 * @param remarks what the spectrum says of its use
 */
record WallPressureBands(
    double[] densities, double[] meanSquares, double[] slices, List<Remark> remarks) {
  /** How bands are cut; the panel's response is cut the same way, so the two belong together. */
  static final BandSlices SLICES = BandSlices.forOrder(ButterworthCrossSpectrum.HIGHEST_ORDER);

  static WallPressureBands of(String spectrumId, BoundaryLayer layer) {
    WallPressureSpectrum spectrum = spectrum(spectrumId);
    double[] densities = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      densities[band] = spectrum.spectralDensity(Bands.centre(band), layer);
    }
    double[] slices = slices(spectrum, layer);
    double[] meanSquares = new double[Bands.COUNT];
    for (int i = 0; i < slices.length; i++) {
      meanSquares[i / SLICES.perBand()] += slices[i] * SLICES.width(i);
    }
    return new WallPressureBands(densities, meanSquares, slices, spectrum.remarks(layer));
  }

  private static double[] slices(WallPressureSpectrum spectrum, BoundaryLayer layer) {
    double[] slices = new double[SLICES.count()];
    for (int i = 0; i < slices.length; i++) {
      slices[i] = spectrum.spectralDensity(SLICES.centre(i), layer);
    }
    return slices;
  }

  /**
   * The wall pressure under a layer after every spectrum that a choice of models asks for, by id.
   */
  static Map<String, WallPressureBands> under(
      BoundaryLayer layer, List<Choice> choices, String chosen) {
    Map<String, WallPressureBands> bands = new HashMap<>();
    for (Choice choice : choices) {
      bands.computeIfAbsent(choice.spectrum(chosen), id -> of(id, layer));
    }
    return bands;
  }

  /** The ids among some spectra that leave their range. */
  static Set<String> beyond(Map<String, WallPressureBands> walls) {
    return walls.entrySet().stream()
        .filter(
            wall ->
                wall.getValue().remarks().stream()
                    .anyMatch(remark -> remark.kind() == Remark.Kind.OUT_OF_RANGE))
        .map(Map.Entry::getKey)
        .collect(Collectors.toUnmodifiableSet());
  }

  static WallPressureSpectrum spectrum(String id) {
    return WallPressureSpectra.byId(id)
        .orElseThrow(
            () ->
                new IllegalArgumentException("there is no wall-pressure spectrum \"" + id + "\""));
  }
}
