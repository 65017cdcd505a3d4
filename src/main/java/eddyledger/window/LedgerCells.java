package eddyledger.window;

import eddyledger.present.LedgerColumn;
import eddyledger.present.LedgerLine;
import eddyledger.present.LedgerLine.Twig;

/** Measures of the ledger's cells, pixels. */
final class LedgerCells {
  /** Height of a line. */
  static final int ROW = 22;

  /** Height of the header. */
  static final int HEADER = 28;

  /** Free space left and right of text. */
  static final int PAD = 8;

  /** Where the text of the vehicle's name begins. */
  static final int NAME_START = 33;

  /** Where the number of a share ends. */
  static final int SHARE_END = 46;

  /** Where words in the margin column begin. */
  static final int MARGIN_START = 14;

  /** Where the number of a margin ends. */
  static final int MARGIN_END = 46;

  private static final int INDENT = 15;
  private static final int CHEVRON = 11;
  private static final int REACH = 9;

  private LedgerCells() {}

  /** Where the text of a line's name begins. */
  static int textLeft(LedgerLine line) {
    return NAME_START + INDENT * line.depth();
  }

  /** Middle of a line's chevron. */
  static int chevron(LedgerLine line) {
    return textLeft(line) - CHEVRON;
  }

  /** Whether a place in the name column is on a line's chevron. */
  static boolean onChevron(LedgerLine line, int x) {
    return line.twig() != Twig.LEAF && Math.abs(x - chevron(line)) <= REACH;
  }

  /** Room for a line's name in a column of a width. */
  static double nameRoom(LedgerLine line, int width) {
    return (double) width - textLeft(line) - PAD;
  }

  /** Width of a column where there is room for all of them. */
  static int width(LedgerColumn column) {
    return switch (column) {
      case NAME -> 240;
      case BANDS -> 156;
      case LEVEL -> 62;
      case SHARE -> 108;
      case ALLOWANCE -> 80;
      case MARGIN -> 108;
      case LAY_UP -> 150;
      case MASS -> 88;
      case SUPPLIER -> 90;
    };
  }

  /** Least width of a column. */
  static int least(LedgerColumn column) {
    return switch (column) {
      case NAME -> 190;
      case BANDS -> 156;
      case LEVEL -> 56;
      case SHARE -> 96;
      case ALLOWANCE -> 74;
      case MARGIN -> 104;
      case LAY_UP -> 100;
      case MASS -> 88;
      case SUPPLIER -> 66;
    };
  }

  /** Width up to which bars get what room the texts leave. */
  static int most(LedgerColumn column) {
    return switch (column) {
      case BANDS -> 212;
      case SHARE -> 160;
      default -> width(column);
    };
  }
}
