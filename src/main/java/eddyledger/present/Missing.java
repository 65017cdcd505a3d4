package eddyledger.present;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.Status;
import java.util.ArrayList;
import java.util.List;

/** How many contributions of a sheet are not whole. */
final class Missing {
  private static final int SHOWN = 3;

  private Missing() {}

  /** What is not whole, and why, one line each; the first three and the number of the others. */
  static List<String> tips(List<LedgerRow> contributions) {
    List<LedgerRow> lacking =
        contributions.stream().filter(row -> row.status() != Status.OK).toList();
    List<String> tips = new ArrayList<>();
    for (LedgerRow row : lacking.subList(0, Math.min(SHOWN, lacking.size()))) {
      tips.add(row.name() + ": " + Reasons.brief(row));
    }
    if (lacking.size() > SHOWN) {
      tips.add("and " + (lacking.size() - SHOWN) + " more");
    }
    return tips;
  }

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
