package eddyledger.file;

import java.util.List;
import java.util.stream.Collectors;

/**
 * Comma-separated values after RFC 4180: UTF-8, comma, CRLF, quotes where needed.
 *
 * <p>Numbers are written in full double precision with a point; a missing one is empty. Free text
 * that a spreadsheet would take for a formula is escaped with an apostrophe; numbers never are.
 */
final class CsvText {
  private static final String FORMULA_STARTS = "=+-@";

  private final StringBuilder text = new StringBuilder();

  /** Adds a line of cells that are ready. */
  CsvText line(List<String> cells) {
    text.append(cells.stream().collect(Collectors.joining(","))).append("\r\n");
    return this;
  }

  /** A number as a cell; empty if it is missing or infinite, never minus zero. */
  static String number(double value) {
    if (Double.isNaN(value) || Double.isInfinite(value)) {
      return "";
    }
    return Double.toString(value + 0.0);
  }

  /** Free text as a cell, escaped and quoted as needed. */
  static String text(String value) {
    if (value == null || value.isEmpty()) {
      return "";
    }
    char first = value.charAt(0);
    boolean risky = FORMULA_STARTS.indexOf(first) >= 0 || Character.isISOControl(first);
    String safe = risky ? "'" + value : value;
    boolean quoted = safe.chars().anyMatch(c -> c == ',' || c == '"' || c == '\r' || c == '\n');
    return quoted ? '"' + safe.replace("\"", "\"\"") + '"' : safe;
  }

  @Override
  public String toString() {
    return text.toString();
  }
}
