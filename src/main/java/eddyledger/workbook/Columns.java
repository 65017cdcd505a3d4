package eddyledger.workbook;

import java.util.List;
import java.util.stream.IntStream;
import org.apache.poi.ss.util.CellReference;

/** Names of columns and of ranges in formulas. Columns count from 0, rows from 1. */
final class Columns {
  private static final int KNOWN = 128;

  private static final List<String> NAMES =
      IntStream.range(0, KNOWN).mapToObj(CellReference::convertNumToColString).toList();

  private Columns() {}

  /** Name of a column, A for 0. */
  static String name(int column) {
    return NAMES.get(column);
  }

  /** A cell, for instance {@code H12}. */
  static String cell(int column, int row) {
    return name(column) + row;
  }

  /** A cell that stays where it is when a formula is copied. */
  static String fixed(int column, int row) {
    return "$" + name(column) + "$" + row;
  }

  /** Part of a column. */
  static String down(int column, int first, int last) {
    return name(column) + first + ":" + name(column) + last;
  }

  /** Part of a column that stays where it is when a formula is copied sideways. */
  static String fixedDown(int column, int first, int last) {
    return "$" + name(column) + first + ":$" + name(column) + last;
  }

  /** Part of a row. */
  static String across(int first, int last, int row) {
    return name(first) + row + ":" + name(last) + row;
  }
}
