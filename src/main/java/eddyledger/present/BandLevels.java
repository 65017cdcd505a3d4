package eddyledger.present;

import eddyledger.ledger.LedgerRow;
import eddyledger.quantity.AWeighting;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;

/** A-weighted band levels of a row. */
final class BandLevels {
  private BandLevels() {}

  /** Levels with their weights, dB(A) per band; NaN where missing or silent. */
  static BandSpectrum weighted(LedgerRow row) {
    BandSpectrum levels = row.levels();
    double[] weighted = new double[Bands.COUNT];
    for (int band = 0; band < Bands.COUNT; band++) {
      weighted[band] = levels.value(band) + AWeighting.weights().value(band);
    }
    return BandSpectrum.of(weighted);
  }

  /** Position of the highest band, 0 to 27; -1 if no band has a value. */
  static int peak(BandSpectrum levels) {
    int peak = -1;
    for (int band = 0; band < Bands.COUNT; band++) {
      if (levels.has(band) && (peak < 0 || levels.value(band) > levels.value(peak))) {
        peak = band;
      }
    }
    return peak;
  }
}
