package eddyledger.workbook;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.Way;

/**
 * A row of the ledger sheet, with what its formulas need to know of others.
 *
 * @param number its row on the sheet, from 1
 * @param row the ledger's row
 * @param part how it comes by its levels
 * @param way which way its sound comes in
 * @param depth steps of indentation
 * @param last last row of what lies below it; its own row if nothing does
 * @param into row of the sum it belongs to; 0 if to none
 * @param intoWay row of the sum of one way it belongs to; 0 if to none
 * @param contributions how many contributions it holds
 * @param lacking how many of them lack a band
 * @param plain whether everything below it, and nothing else, belongs to its sum
 */
record LedgerLine(
    int number,
    LedgerRow row,
    Part part,
    Way way,
    int depth,
    int last,
    int into,
    int intoWay,
    int contributions,
    int lacking,
    boolean plain) {

  /** How a row comes by its levels. */
  enum Part {
    /** Levels are entered here. */
    ENTERED,
    /** Levels are entered on the sheet of other sources. */
    LINKED,
    /** Energy sum of the rows that belong to it. */
    SUM,
    /** Energy sum of what comes in one way. */
    SUM_OF_WAY,
    /** A section that holds no panel: no sound, and no part of any sum. */
    SILENT
  }

  /** Whether it is a contribution by itself. */
  boolean contributes() {
    return part == Part.ENTERED || part == Part.LINKED;
  }

  /** First row of what lies below it. */
  int first() {
    return number + 1;
  }
}
