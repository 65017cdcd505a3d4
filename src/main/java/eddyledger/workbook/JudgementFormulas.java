package eddyledger.workbook;

import static eddyledger.workbook.LedgerColumns.ALLOWED;
import static eddyledger.workbook.LedgerColumns.LACKING;
import static eddyledger.workbook.LedgerColumns.LEVEL_A;
import static eddyledger.workbook.LedgerColumns.MARGIN;
import static eddyledger.workbook.LedgerColumns.STATUS;

/** The formulas by which one row of the ledger sheet is judged. */
final class JudgementFormulas {
  /** Below this many decibels a difference is arithmetic noise, as in the program. */
  static final String NOISE = "1E-9";

  private final int row;

  JudgementFormulas(int row) {
    this.row = row;
  }

  /** Allowed less level. */
  String margin() {
    String allowed = Columns.cell(ALLOWED, row);
    String level = Columns.cell(LEVEL_A, row);
    return "IF(ISNUMBER("
        + allowed
        + "),IF(ISNUMBER("
        + level
        + "),"
        + allowed
        + "-"
        + level
        + ",\"n/a\"),\"\u2013\")";
  }

  /** Inside, tight, over, or why it cannot be said. */
  String state() {
    String margin = Columns.cell(MARGIN, row);
    String lacks = Columns.cell(LACKING, row);
    return "IF(ISNUMBER("
        + margin
        + "),"
        + state(margin, lacks)
        + ",IF(ISNUMBER("
        + Columns.cell(ALLOWED, row)
        + "),IF(AND("
        + Columns.cell(LEVEL_A, row)
        + "=\"none\","
        + lacks
        + "=0),\"inside\",\"not known\"),\"\u2013\"))";
  }

  /** The state of a margin that is a number; of a partial level only "over" can be said. */
  static String state(String margin, String lacks) {
    return "IF("
        + margin
        + "<-"
        + NOISE
        + ",\"over\",IF("
        + lacks
        + ">0,\"not known\",IF("
        + margin
        + "<tight_band-"
        + NOISE
        + ",\"tight\",\"inside\")))";
  }

  /** The program's reason while something is missing. */
  String reason() {
    return "IF("
        + Columns.cell(LACKING, row)
        + "=0,\"\","
        + Columns.cell(LedgerColumns.NOTE, row)
        + ")";
  }

  /** The row's status cell as other sheets name it. */
  static String statusOf(int row) {
    return LedgerColumns.outside(STATUS, row);
  }
}
