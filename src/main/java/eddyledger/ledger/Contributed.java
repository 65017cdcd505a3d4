package eddyledger.ledger;

import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;
import eddyledger.quantity.OverallLevel;
import java.util.Arrays;
import java.util.List;

/**
 * The energy sum of some rows.
 *
 * @param meanSquares Pa² per band; NaN where no row has a value
 * @param status whether every row is whole
 */
public record Contributed(BandSpectrum meanSquares, Status status) {

  static Contributed of(List<LedgerRow> rows) {
    double[] sum = new double[Bands.COUNT];
    Arrays.fill(sum, Double.NaN);
    boolean whole = true;
    for (LedgerRow row : rows) {
      whole &= row.status() == Status.OK;
      for (int band = 0; band < Bands.COUNT; band++) {
        if (row.meanSquares().has(band)) {
          double soFar = Double.isNaN(sum[band]) ? 0.0 : sum[band];
          sum[band] = soFar + row.meanSquares().value(band);
        }
      }
    }
    return new Contributed(BandSpectrum.of(sum), whole ? Status.OK : Status.PARTIAL);
  }

  /** A-weighted overall level, dB(A). */
  public double levelA() {
    return Decibels.pressureLevel(OverallLevel.aWeightedMeanSquare(meanSquares.toArray()));
  }

  /** Unweighted overall level, dB. */
  public double level() {
    return Decibels.pressureLevel(OverallLevel.linearMeanSquare(meanSquares.toArray()));
  }
}
