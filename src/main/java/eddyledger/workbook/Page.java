package eddyledger.workbook;

import java.util.HashMap;
import java.util.Map;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.streaming.SXSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFSheet;

/**
 * A sheet that is written row by row from top to bottom; what left the window is on the disk
 * already.
 */
final class Page {
  /** Width of one character in the units of the file. */
  private static final int CHARACTER = 256;

  /** Height of a row of one line, points. */
  static final float ROW_HEIGHT = 12.75f;

  private final SXSSFSheet sheet;
  private final Styles styles;
  private final Map<Integer, Double> heights = new HashMap<>();

  Page(SXSSFSheet sheet, Styles styles) {
    this.sheet = sheet;
    sheet.setDefaultRowHeightInPoints(ROW_HEIGHT);
    this.styles = styles;
  }

  /** The next row to write to; rows count from 1 and are never gone back to. */
  Line line(int row) {
    return new Line(sheet.createRow(row - 1), styles, height -> heights.put(row, height));
  }

  /** Height of some rows, points. */
  double height(int first, int last) {
    double height = 0.0;
    for (int row = first; row <= last; row++) {
      height += heights.getOrDefault(row, (double) ROW_HEIGHT);
    }
    return height;
  }

  /** Sets the width of a column in characters. */
  void width(int column, double characters) {
    sheet.setColumnWidth(column, (int) (characters * CHARACTER));
  }

  /** Sets the widths of columns from the first on. */
  void widths(double... characters) {
    for (int column = 0; column < characters.length; column++) {
      width(column, characters[column]);
    }
  }

  /** Hides columns that only help formulas. */
  void hide(int first, int last) {
    for (int column = first; column <= last; column++) {
      sheet.setColumnHidden(column, true);
    }
  }

  /** Makes one cell of part of a row. */
  void merge(int row, int firstColumn, int lastColumn) {
    // the check for overlaps takes ever longer; there are none
    sheet.addMergedRegionUnsafe(new CellRangeAddress(row - 1, row - 1, firstColumn, lastColumn));
  }

  /** The sheet as it is written. */
  SXSSFSheet sheet() {
    return sheet;
  }

  /** Name of the sheet. */
  String name() {
    return sheet.getSheetName();
  }

  /** What surrounds the rows: print set-up, conditional formats and the like. */
  XSSFSheet frame() {
    return sheet.getWorkbook().getXSSFWorkbook().getSheet(sheet.getSheetName());
  }
}
