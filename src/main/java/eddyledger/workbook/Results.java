package eddyledger.workbook;

import eddyledger.ledger.Judgement;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.State;
import eddyledger.ledger.Status;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;

/** The program's own values as what the cells show: the stored results of the formulas. */
final class Results {
  private Results() {}

  /** Level of a band; words where there is no sound or no value. */
  static Answer band(BandSpectrum meanSquares, int band, String nothing) {
    if (!meanSquares.has(band)) {
      return Answer.words(nothing);
    }
    double meanSquare = meanSquares.value(band);
    return meanSquare > 0.0
        ? Answer.number(Decibels.pressureLevel(meanSquare))
        : Answer.words(Answer.NO_SOUND);
  }

  /** Mean square of a band over (20 µPa)²; 0 where there is no value. */
  static double energy(BandSpectrum meanSquares, int band) {
    Answer level = band(meanSquares, band, Answer.MISSING);
    return level.isNumber() ? Decibels.ratio(level.number()) : 0.0;
  }

  /** How many bands have a value, no sound included. */
  static int known(BandSpectrum meanSquares) {
    int known = 0;
    for (int band = 0; band < Bands.COUNT; band++) {
      known += meanSquares.has(band) ? 1 : 0;
    }
    return known;
  }

  /** Share of a level in a total. */
  static Answer share(double level, double total) {
    if (level == Double.NEGATIVE_INFINITY) {
      return Answer.number(0.0);
    }
    return total == Double.NEGATIVE_INFINITY
        ? Answer.number(Double.NaN)
        : Answer.number(Decibels.ratio(level - total));
  }

  /** Whether a row is whole, in words. */
  static Answer status(
      boolean contributes, BandSpectrum meanSquares, int contributions, int lacking, String none) {
    if (lacking == 0) {
      return Answer.words("ok");
    }
    int known = known(meanSquares);
    if (known == 0) {
      return Answer.words(none);
    }
    return Answer.words(
        contributes
            ? "partial: " + (Bands.COUNT - known) + " of " + Bands.COUNT + " bands missing"
            : "partial: " + lacking + " of " + contributions + " contributions lack bands");
  }

  /** The word where no band has a value. */
  static String nothing(Status status) {
    return status == Status.FAILED ? Status.FAILED.text() : Status.MISSING.text();
  }

  /** Allowed less level. */
  static Answer margin(double allowed, double level) {
    if (Double.isNaN(allowed)) {
      return Answer.words(Answer.NOT_ASKED);
    }
    return Double.isInfinite(level)
        ? Answer.words(Answer.UNAVAILABLE)
        : Answer.number(allowed - level);
  }

  /** State of a row under its allowance. */
  static Answer state(LedgerRow row) {
    Judgement judgement = row.judgement();
    return Double.isNaN(judgement.allowance())
        ? Answer.words(Answer.NOT_ASKED)
        : Answer.state(judgement.state());
  }

  /** State of a margin in dB; of a partial level only one thing can be said, that it is over. */
  static Answer state(double margin, boolean whole, double tightBand) {
    if (Double.isNaN(margin)) {
      return Answer.words(Answer.NOT_KNOWN);
    }
    State state = State.of(margin, tightBand);
    return Answer.state(whole || state == State.OVER ? state : null);
  }
}
