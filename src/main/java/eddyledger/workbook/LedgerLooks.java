package eddyledger.workbook;

import eddyledger.ledger.RowKind;
import eddyledger.ledger.Way;
import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;

/**
 * The looks of one kind of row on the ledger sheet.
 *
 * @param emphasis how the row stands out
 * @param levels what may be done with its levels
 */
record LedgerLooks(Emphasis emphasis, Role levels) {

  /** The looks of a row. */
  static LedgerLooks of(LedgerLine line) {
    RowKind kind = line.row().kind();
    boolean whole = line.row().way() == Way.ALL;
    Emphasis emphasis =
        switch (kind) {
          case TOTAL -> Emphasis.TOTAL;
          case SECTION -> whole ? Emphasis.SECTION : Emphasis.PLAIN;
          default -> Emphasis.PLAIN;
        };
    boolean entered = line.part() == LedgerLine.Part.ENTERED;
    return new LedgerLooks(emphasis, entered ? Role.INPUT : Role.RESULT);
  }

  /** A result in this row. */
  Look result(Format format) {
    return Look.of(format, emphasis);
  }

  /** A level of a band in this row. */
  Look level() {
    return result(Format.BAND).in(levels);
  }

  /** The way in: told apart by word and by fill pattern. */
  Look way(Way way) {
    Look plain = result(Format.TEXT);
    return switch (way) {
      case ACOUSTIC -> plain.in(Role.ACOUSTIC);
      case LEAK -> plain.in(Role.LEAK);
      case BOUNDARY_LAYER, ALL -> plain;
    };
  }

  /** The word for a way in. */
  static String word(Way way) {
    return switch (way) {
      case ALL -> "all";
      case BOUNDARY_LAYER -> "boundary layer";
      case ACOUSTIC -> "acoustic share";
      case LEAK -> "leak";
    };
  }
}
