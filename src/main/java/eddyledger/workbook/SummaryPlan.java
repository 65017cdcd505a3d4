package eddyledger.workbook;

/**
 * Where the tables of the summary stand. Rows count from 1.
 *
 * @param firstPair first row of levels and margins
 * @param pairs how many receivers and conditions there are
 */
record SummaryPlan(int firstPair, int pairs) {
  static final String SHEET = "summary";

  /** Row of the tight band. */
  static final int TIGHT_ROW = 8;

  /** Column of the tight band. */
  static final int TIGHT_COLUMN = 2;

  /** Last column that is printed. */
  static final int LAST_COLUMN = 12;

  /** Rows between the end of a table and the first row of the next: gap, heading, note, header. */
  static final int BETWEEN = 4;

  private static final int FIRST_PAIR = TIGHT_ROW + BETWEEN + 1;

  static SummaryPlan of(int pairs) {
    return new SummaryPlan(FIRST_PAIR, pairs);
  }

  /** First row of the targets. */
  int firstTarget() {
    return firstPair + pairs + BETWEEN;
  }

  /** First row of the largest contributions. */
  int firstLargest(int targetRows) {
    return firstTarget() + Math.max(1, targetRows) + BETWEEN;
  }
}
