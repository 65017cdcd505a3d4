package eddyledger.present;

import eddyledger.ledger.LedgerRow;
import eddyledger.quantity.BandSpectrum;
import java.util.List;

/**
 * The one scale of all band strips.
 *
 * @param bottom level of no height, dB(A)
 * @param top level of full height, dB(A)
 */
public record BandScale(double bottom, double top) {
  private static final double SPAN = 45.0;
  private static final double STEP = 5.0;
  private static final double USUAL_TOP = 70.0;

  /** The scale of 45 dB whose top is the next multiple of 5 above the loudest band. */
  static BandScale of(List<BandSpectrum> levels) {
    double loudest = Double.NEGATIVE_INFINITY;
    for (BandSpectrum spectrum : levels) {
      for (double level : spectrum.toArray()) {
        loudest = level > loudest ? level : loudest;
      }
    }
    double top = Double.isInfinite(loudest) ? USUAL_TOP : Math.ceil(loudest / STEP) * STEP;
    return new BandScale(top - SPAN, top);
  }

  /** The scale for the rows of a sheet. */
  static BandScale ofRows(List<LedgerRow> rows) {
    return of(rows.stream().map(BandLevels::weighted).toList());
  }

  /** Height of a level on the scale, 0 to 1; below the scale 0; NaN if there is no level. */
  public double height(double level) {
    return Math.max(0.0, Math.min(1.0, (level - bottom) / (top - bottom)));
  }

  /** As "25 to 70 dB(A)". */
  public String text() {
    return Math.round(bottom) + " to " + Math.round(top) + " dB(A)";
  }
}
