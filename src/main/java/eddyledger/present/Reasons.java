package eddyledger.present;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import java.util.regex.Pattern;

/** Why a number is missing, in few words and in full. */
final class Reasons {
  /** The place in the project file that reasons begin with: {@code tree[2].zone (tail): }. */
  private static final Pattern PLACE = Pattern.compile("^[\\w.\\[\\]]+ \\([^)]*\\): ");

  private Reasons() {}

  /** What stands in a row in place of its spectrum: the reason without the place in the file. */
  static String brief(LedgerRow row) {
    String text = PLACE.matcher(row.reason()).replaceFirst("");
    if (row.kind() == RowKind.SECTION || row.kind() == RowKind.TOTAL) {
      // the rows below say what is missing of each
      return row.status() == Status.OK ? "nothing below makes a sound" : "no row below has a value";
    }
    return text.isEmpty() ? "no sound" : text;
  }

  /** The reason in full; empty if the value is whole. */
  static String full(LedgerRow row) {
    return row.status() == Status.OK ? "" : row.reason();
  }
}
