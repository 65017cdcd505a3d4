package eddyledger.workbook;

import java.util.List;

/**
 * Widths of the ledger's columns in characters, fitted to what they hold.
 *
 * @param columns widths up to the bands
 */
record LedgerWidths(double[] columns) {
  /** Width of the reasons. */
  static final double REASON = 38;

  private static final double WHOLE_STATUS = 13;
  private static final double PARTIAL_STATUS = 35;
  private static final double INDENT = 1.6;

  /** The widths for some blocks. */
  static LedgerWidths of(List<Block> blocks) {
    double condition = 9;
    double receiver = 9;
    double name = 28;
    double id = 12;
    boolean whole = true;
    for (Block block : blocks) {
      condition = Math.max(condition, block.pair().condition().length());
      receiver = Math.max(receiver, block.pair().receiver().length());
      whole &= block.total().lacking() == 0;
      for (LedgerLine line : block.lines()) {
        name = Math.max(name, line.row().name().length() + INDENT * (1 + line.depth()));
        id = Math.max(id, line.row().id().length());
      }
    }
    return new LedgerWidths(
        new double[] {
          Math.min(condition + 1, 20),
          Math.min(receiver + 1, 20),
          6,
          Math.min(name, 46),
          Math.min(id, 32),
          8,
          15,
          8,
          8,
          9,
          8.5,
          8.5,
          9,
          8.5,
          10,
          whole ? WHOLE_STATUS : PARTIAL_STATUS,
          REASON
        });
  }

  /** Width from the ids to the reasons, what stands on the first page only. */
  double notes() {
    double width = 0.0;
    for (int column = LedgerColumns.ID; column <= LedgerColumns.REASON; column++) {
      width += columns[column];
    }
    return width;
  }

  /** Width of the names. */
  double name() {
    return columns[LedgerColumns.NAME];
  }
}
