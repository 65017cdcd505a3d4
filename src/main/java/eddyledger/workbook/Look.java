package eddyledger.workbook;

/**
 * How a cell looks.
 *
 * @param format how its value is written
 * @param emphasis how the row stands out
 * @param role what may be done with it
 * @param indent steps of indentation, 0 or more
 */
record Look(Format format, Emphasis emphasis, Role role, int indent) {

  /** How a value is written. */
  enum Format {
    /** Text on one line. */
    TEXT("General"),
    /** Text that is broken into lines. */
    WRAPPED("General"),
    /** A word in the middle of its cell. */
    WORD("General"),
    /** A level or difference, one decimal; a true minus sign. */
    LEVEL("0.0;\"\u2212\"0.0"),
    /** A level in a narrow column. */
    BAND("0.0;\"\u2212\"0.0"),
    /** A margin with its sign; a true minus sign. */
    MARGIN("+0.0;\"\u2212\"0.0;0.0"),
    /** A share of energy in per cent. */
    SHARE("0.0 %"),
    /** A whole number. */
    WHOLE("0"),
    /** A whole number in the middle of its cell. */
    COUNT("0"),
    /** Two decimals. */
    TWO("0.00"),
    /** Three decimals. */
    THREE("0.000"),
    /** An energy ratio. */
    ENERGY("0.000E+00"),
    /** An instant in universal time. */
    INSTANT("yyyy-mm-dd hh:mm");

    private final String pattern;

    Format(String pattern) {
      this.pattern = pattern;
    }

    /** The spreadsheet's number format. */
    String pattern() {
      return pattern;
    }
  }

  /** How a row stands out. */
  enum Emphasis {
    /** Title of a sheet. */
    TITLE,
    /** Title of a table or block. */
    HEADING,
    /** Header of columns. */
    HEADER,
    /** A total. */
    TOTAL,
    /** A section. */
    SECTION,
    /** Anything else. */
    PLAIN,
    /** Small print. */
    SMALL,
    /** A caution. */
    CAUTION
  }

  /** What may be done with a cell. */
  enum Role {
    /** Follows from other cells. */
    RESULT,
    /** May be changed; everything follows. */
    INPUT,
    /** Only the program can follow a change; locked. */
    PROGRAM,
    /** Sound that comes in as sound. */
    ACOUSTIC,
    /** Sound that comes in through gaps. */
    LEAK
  }

  /** A plain result. */
  static Look of(Format format) {
    return new Look(format, Emphasis.PLAIN, Role.RESULT, 0);
  }

  /** A result that stands out. */
  static Look of(Format format, Emphasis emphasis) {
    return new Look(format, emphasis, Role.RESULT, 0);
  }

  /** A plain cell of a role. */
  static Look of(Format format, Role role) {
    return new Look(format, Emphasis.PLAIN, role, 0);
  }

  /** The same in another role. */
  Look in(Role other) {
    return new Look(format, emphasis, other, indent);
  }

  /** The same, indented. */
  Look indented(int steps) {
    return new Look(format, emphasis, role, steps);
  }
}
