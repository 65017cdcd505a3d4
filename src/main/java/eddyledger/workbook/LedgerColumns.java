package eddyledger.workbook;

import eddyledger.quantity.Bands;

/** Where everything stands on the ledger sheet. Columns count from 0, rows from 1. */
final class LedgerColumns {
  static final String SHEET = "ledger";

  static final int CONDITION = 0;
  static final int RECEIVER = 1;
  static final int LINE = 2;
  static final int NAME = 3;
  static final int ID = 4;
  static final int KIND = 5;
  static final int WAY = 6;
  static final int LEVEL_A = 7;
  static final int LEVEL = 8;
  static final int SHARE = 9;
  static final int TARGET = 10;
  static final int RESERVE = 11;
  static final int ALLOWED = 12;
  static final int MARGIN = 13;
  static final int STATE = 14;
  static final int STATUS = 15;
  static final int REASON = 16;

  /** Levels of the bands. */
  static final int BAND = 17;

  /** Last column that is printed. */
  static final int LAST_BAND = BAND + Bands.COUNT - 1;

  /** Mean squares over (20 µPa)², hidden. */
  static final int ENERGY = LAST_BAND + 1;

  static final int LAST_ENERGY = ENERGY + Bands.COUNT - 1;

  /** Line of the sum that the row belongs to. */
  static final int INTO = LAST_ENERGY + 1;

  /** Line of the sum of one way that the row belongs to. */
  static final int INTO_WAY = INTO + 1;

  /** How many contributions in the row lack a band. */
  static final int LACKING = INTO_WAY + 1;

  /** Level by which contributions are put in order. */
  static final int RANK = LACKING + 1;

  /** The program's reason, shown only while something is missing. */
  static final int NOTE = RANK + 1;

  /** Row of the A-weights. */
  static final int WEIGHT_ROW = 4;

  static final int HEADER_ROW = 5;
  static final int FIRST_ROW = 6;

  private LedgerColumns() {}

  /** A fixed cell of the ledger as other sheets name it. */
  static String outside(int column, int row) {
    return SHEET + "!" + Columns.fixed(column, row);
  }

  /** A fixed part of a column of the ledger as other sheets name it. */
  static String outside(int column, int first, int last) {
    return SHEET + "!" + Columns.fixed(column, first) + ":" + Columns.fixed(column, last);
  }
}
