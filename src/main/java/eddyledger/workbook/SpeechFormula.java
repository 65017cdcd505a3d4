package eddyledger.workbook;

import eddyledger.model.Rating;
import eddyledger.quantity.Octaves;
import eddyledger.quantity.SpeechInterferenceLevel;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The speech interference level of a total as a formula over its bands. */
final class SpeechFormula {
  private SpeechFormula() {}

  /** Which one a rating is; empty if it is another rating. */
  static Optional<SpeechInterferenceLevel> of(Rating rating) {
    return Optional.ofNullable(
        switch (rating) {
          case OVERALL_A, OVERALL_LINEAR -> null;
          case SIL_500_2K -> SpeechInterferenceLevel.THREE_BANDS_500_TO_2000;
          case SIL_1K_4K -> SpeechInterferenceLevel.THREE_BANDS_1000_TO_4000;
          case SIL_500_4K -> SpeechInterferenceLevel.FOUR_BANDS_500_TO_4000;
        });
  }

  /**
   * The plain mean of octave levels, each the energy sum of three bands of a ledger row; one band
   * that lacks makes it unavailable.
   */
  static String text(SpeechInterferenceLevel kind, int row) {
    List<String> octaves = new ArrayList<>();
    int lowest = Integer.MAX_VALUE;
    int highest = 0;
    for (String octave : kind.octaves()) {
      int middle = Octaves.middleThird(Octaves.position(octave));
      lowest = Math.min(lowest, middle - 1);
      highest = Math.max(highest, middle + 1);
      octaves.add(
          "10*LOG10(SUM(" + range(LedgerColumns.ENERGY, middle - 1, middle + 1, row) + "))");
    }
    // the octaves lie side by side
    return "IF(COUNT("
        + range(LedgerColumns.BAND, lowest, highest, row)
        + ")="
        + (highest - lowest + 1)
        + ",("
        + String.join("+", octaves)
        + ")/"
        + octaves.size()
        + ",\"n/a\")";
  }

  private static String range(int first, int from, int to, int row) {
    return LedgerColumns.SHEET
        + "!"
        + Columns.fixed(first + from, row)
        + ":"
        + Columns.fixed(first + to, row);
  }
}
