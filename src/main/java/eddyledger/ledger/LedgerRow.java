package eddyledger.ledger;

import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Decibels;
import eddyledger.quantity.OverallLevel;
import eddyledger.quantity.SpeechInterferenceLevel;

/**
 * One row of the ledger at one receiver in one condition. Immutable.
 *
 * @param id id of the panel, section, other source or (for the total) vehicle
 * @param parent id of the row it is summed into; empty for the total
 * @param depth how deep it stands in the tree, 0 for the total
 * @param name name shown
 * @param kind what it is about
 * @param way by which way the sound comes in
 * @param choice name of the choice of models
 * @param meanSquares mean-square pressure per band, Pa²; NaN where missing
 * @param judgement target or allowance and margin
 * @param status whether the value is whole
 * @param reason why it is not whole; on totals also the models that were chosen and their doubts
 */
public record LedgerRow(
    String id,
    String parent,
    int depth,
    String name,
    RowKind kind,
    Way way,
    String choice,
    BandSpectrum meanSquares,
    Judgement judgement,
    Status status,
    String reason) {

  /** Unweighted band levels, dB re 20 µPa; NaN where missing, minus infinity is left missing. */
  public BandSpectrum levels() {
    return meanSquares.map(value -> value > 0.0 ? Decibels.pressureLevel(value) : Double.NaN);
  }

  /** A-weighted mean square, Pa²; NaN if a band is missing. */
  public double meanSquareA() {
    return OverallLevel.aWeightedMeanSquare(meanSquares.toArray());
  }

  /** A-weighted overall level, dB(A); NaN if a band is missing. */
  public double levelA() {
    return Decibels.pressureLevel(meanSquareA());
  }

  /** Unweighted overall level, dB; NaN if a band is missing. */
  public double level() {
    return Decibels.pressureLevel(OverallLevel.linearMeanSquare(meanSquares.toArray()));
  }

  /** Speech interference level, dB; NaN if a band it needs is missing. */
  public double speechInterference(SpeechInterferenceLevel kind) {
    return kind.ofThirds(levels()).orElse(Double.NaN);
  }

  /** The same row with another judgement. */
  LedgerRow judged(Judgement other) {
    return new LedgerRow(
        id, parent, depth, name, kind, way, choice, meanSquares, other, status, reason);
  }

  /** The same value as the row of one way in, without judgement. */
  LedgerRow by(Way other) {
    return new LedgerRow(
        id, parent, depth, name, kind, other, choice, meanSquares, Judgement.NONE, status, reason);
  }

  /** The same row with more words in its reason. */
  LedgerRow noting(String words) {
    String both = reason.isEmpty() || words.isEmpty() ? reason + words : reason + "; " + words;
    return new LedgerRow(
        id, parent, depth, name, kind, way, choice, meanSquares, judgement, status, both);
  }
}
