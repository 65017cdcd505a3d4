package eddyledger.present;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.Status;
import java.util.List;

/** How many contributions of a sheet are not whole. */
final class Missing {
  private Missing() {}

  /** As "1 of 49 missing"; "2 of 49 not whole" where some lack single bands; empty if none is. */
  static String text(List<LedgerRow> contributions) {
    long partial = contributions.stream().filter(row -> row.status() == Status.PARTIAL).count();
    long without =
        contributions.stream()
            .filter(row -> row.status() == Status.MISSING || row.status() == Status.FAILED)
            .count();
    if (partial + without == 0) {
      return "";
    }
    String word = partial == 0 ? "missing" : "not whole";
    return (partial + without) + " of " + contributions.size() + " " + word;
  }
}
