package eddyledger.chart;

import eddyledger.ledger.LedgerRow;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;
import java.util.Arrays;
import java.util.List;

/** Sums of mean squares that say nothing about bands nobody has a value for. */
final class Energies {
  private Energies() {}

  /** Sum per band over the rows that have a value, Pa²; NaN in a band where none has. */
  static BandSpectrum sum(List<LedgerRow> rows) {
    double[] sum = new double[Bands.COUNT];
    Arrays.fill(sum, Double.NaN);
    for (LedgerRow row : rows) {
      for (int band = 0; band < Bands.COUNT; band++) {
        if (row.meanSquares().has(band)) {
          double soFar = Double.isNaN(sum[band]) ? 0.0 : sum[band];
          sum[band] = soFar + row.meanSquares().value(band);
        }
      }
    }
    return BandSpectrum.of(sum);
  }

  /** A-weighted mean square over the bands that have a value, Pa². */
  static double knownA(BandSpectrum meanSquares) {
    double sum = 0.0;
    for (int band = 0; band < Bands.COUNT; band++) {
      if (meanSquares.has(band)) {
        sum += AWeighting.energyRatios().value(band) * meanSquares.value(band);
      }
    }
    return sum;
  }

  /** Whether any band has a value. */
  static boolean known(LedgerRow row) {
    for (int band = 0; band < Bands.COUNT; band++) {
      if (row.meanSquares().has(band)) {
        return true;
      }
    }
    return false;
  }

  /** A-weighted band levels, dB(A), shape [28]; NaN where missing or where there is no sound. */
  static double[] levelsA(BandSpectrum meanSquares) {
    double[] levels = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      double value = meanSquares.value(band);
      levels[band] =
          value > 0.0
              ? Decibels.pressureLevel(value) + AWeighting.weights().value(band)
              : Double.NaN;
    }
    return levels;
  }
}
