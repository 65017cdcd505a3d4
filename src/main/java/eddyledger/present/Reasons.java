package eddyledger.present;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import java.util.regex.Pattern;

/** Why a number is missing, in few words and in full. */
final class Reasons {
  /** The place in the project file that reasons begin with: {@code tree[2].zone (tail): }. */
  private static final Pattern PLACE = Pattern.compile("^[\\w.\\[\\]-]+ \\([^)]*\\): ");

  /** What the row itself says already. */
  private static final String SUBJECT = "^The panel has ";

  private static final String CONDITION = " in condition \"[^\"]*\"";

  private Reasons() {}

  /** What stands in a row in place of its spectrum: the reason without the place in the file. */
  static String brief(LedgerRow row) {
    if (row.status() != Status.OK && row.reason().isEmpty()) {
      // nothing is wrong: it was not computed yet, and the heading says so
      return "";
    }
    if (row.kind() == RowKind.SECTION || row.kind() == RowKind.TOTAL) {
      // the rows below say what is missing of each
      return switch (row.status()) {
        case OK -> "nothing below makes a sound";
        case PARTIAL -> "bands are missing below";
        case MISSING, FAILED -> "no row below has a value";
      };
    }
    String text = PLACE.matcher(row.reason()).replaceFirst("").replaceFirst(SUBJECT, "");
    // the heading of the ledger names the condition
    text = text.replaceFirst(CONDITION, "");
    String plain = text.endsWith(".") ? text.substring(0, text.length() - 1) : text;
    return plain.isEmpty() ? "no sound" : plain;
  }

  /** The reason in full; empty if the value is whole. */
  static String full(LedgerRow row) {
    return row.status() == Status.OK ? "" : row.reason();
  }
}
