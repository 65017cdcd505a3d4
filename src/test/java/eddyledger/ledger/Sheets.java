package eddyledger.ledger;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.util.List;
import java.util.function.Predicate;

/** Comparisons of ledgers row by row; rows are told by their ids, not by their order. */
final class Sheets {
  private Sheets() {}

  static ReceiverSheet sheet(Ledger ledger, String condition, String receiver) {
    return ledger.sheet(condition, receiver).orElseThrow();
  }

  static LedgerRow row(Ledger ledger, String condition, String receiver, String id) {
    return sheet(ledger, condition, receiver).row(id, Way.ALL).orElseThrow();
  }

  /** Every row and every total of the model range has the same bits. */
  static void assertSameBits(Ledger actual, Ledger expected, String why) {
    assertSameBits(actual, expected, row -> true, why);
    for (ReceiverSheet sheet : expected.sheets()) {
      List<LedgerRow> range = counterpart(actual, sheet).range();
      for (int i = 0; i < range.size(); i++) {
        assertThat(range.get(i).meanSquares())
            .as("%s: %s", why, range.get(i).choice())
            .isEqualTo(sheet.range().get(i).meanSquares());
      }
    }
  }

  /** Some rows have the same bits and the same status. */
  static void assertSameBits(
      Ledger actual, Ledger expected, Predicate<LedgerRow> which, String why) {
    assertThat(actual.sheets()).hasSameSizeAs(expected.sheets());
    for (ReceiverSheet sheet : expected.sheets()) {
      for (LedgerRow row : sheet.rows()) {
        if (which.test(row)) {
          LedgerRow other = counterpart(actual, sheet).row(row.id(), row.way()).orElseThrow();
          assertThat(other.meanSquares())
              .as("%s: %s of %s", why, row.id(), sheet.title())
              .isEqualTo(row.meanSquares());
          assertThat(other.status()).as("%s: status of %s", why, row.id()).isEqualTo(row.status());
        }
      }
    }
  }

  /** Every row agrees to a relative difference. */
  static void assertClose(Ledger actual, Ledger expected, double relative, String why) {
    assertThat(actual.sheets()).hasSameSizeAs(expected.sheets());
    for (ReceiverSheet sheet : expected.sheets()) {
      for (LedgerRow row : sheet.rows()) {
        LedgerRow other = counterpart(actual, sheet).row(row.id(), row.way()).orElseThrow();
        String what = why + ": " + row.id() + " of " + sheet.title();
        assertClose(other.meanSquares(), row.meanSquares(), relative, what);
      }
    }
  }

  static void assertClose(
      BandSpectrum actual, BandSpectrum expected, double relative, String what) {
    for (int band = 0; band < Bands.COUNT; band++) {
      String where = what + " at " + Bands.label(band) + " Hz";
      assertThat(actual.has(band)).as(where).isEqualTo(expected.has(band));
      if (expected.has(band)) {
        double value = expected.value(band);
        assertThat(actual.value(band)).as(where).isCloseTo(value, within(relative * value));
      }
    }
  }

  private static ReceiverSheet counterpart(Ledger ledger, ReceiverSheet sheet) {
    return sheet(ledger, sheet.condition().id(), sheet.receiver().id());
  }
}
