package eddyledger.present;

import eddyledger.quantity.BandSpectrum;

/**
 * The spectrum of a row as thin bars, or why there is none.
 *
 * @param levels A-weighted band levels, dB(A); NaN where missing or silent
 * @param peak position of the highest band, 0 to 27; -1 if no band has a value
 * @param fill how the bars are filled, by the kind of the contribution
 * @param reason why there are no bars, in few words; empty if there are
 */
public record BandStrip(BandSpectrum levels, int peak, Fill fill, String reason) {
  /** How bars are filled. */
  public enum Fill {
    /** Flow over panels, and sums. */
    SOLID,
    /** What comes in through seals and gaps. */
    HATCHED,
    /** A source that is not flow. */
    HOLLOW
  }

  /** Whether there are bars to draw. */
  public boolean drawn() {
    return peak >= 0;
  }
}
