package eddyledger.workbook;

import java.util.function.DoubleConsumer;
import java.util.regex.Pattern;
import org.apache.poi.xssf.streaming.SXSSFCell;
import org.apache.poi.xssf.streaming.SXSSFRow;

/** One row being written. Columns count from 0. */
final class Line {
  private static final int LONGEST_TEXT = 32_000;

  /** What a reader of the file would take for a character written by its number. */
  private static final Pattern ESCAPE = Pattern.compile("_(x[0-9A-Fa-f]{4}_)");

  private final SXSSFRow row;
  private final Styles styles;
  private final DoubleConsumer heights;

  Line(SXSSFRow row, Styles styles, DoubleConsumer heights) {
    this.row = row;
    this.styles = styles;
    this.heights = heights;
  }

  /** Sets the height in points. */
  Line height(double points) {
    row.setHeightInPoints((float) points);
    heights.accept(points);
    return this;
  }

  /** Its row on the sheet, from 1. */
  int number() {
    return row.getRowNum() + 1;
  }

  /** An empty cell. */
  Line blank(int column, Look look) {
    row.createCell(column).setCellStyle(styles.of(look));
    return this;
  }

  /** Empty cells. */
  Line blanks(int first, int last, Look look) {
    for (int column = first; column <= last; column++) {
      blank(column, look);
    }
    return this;
  }

  /** A text, which stays text whatever it begins with. */
  Line text(int column, String text, Look look) {
    SXSSFCell cell = row.createCell(column);
    cell.setCellValue(written(text));
    cell.setCellStyle(looksLikeFormula(text) ? styles.quoted(look) : styles.of(look));
    return this;
  }

  /** A number. */
  Line number(int column, double number, Look look) {
    SXSSFCell cell = row.createCell(column);
    cell.setCellValue(number);
    cell.setCellStyle(styles.of(look));
    return this;
  }

  /** A number or words. */
  Line value(int column, Answer value, Look look) {
    return value.isNumber()
        ? number(column, value.number(), look)
        : text(column, value.words(), look);
  }

  /**
   * A formula with its stored result.
   *
   * @param formula the formula without its equals sign; never holds text of users
   */
  Line formula(int column, String formula, Answer result, Look look) {
    SXSSFCell cell = row.createCell(column);
    cell.setCellFormula(formula);
    if (result.isNumber()) {
      cell.setCellValue(result.number());
    } else {
      cell.setCellValue(written(result.words()));
    }
    cell.setCellStyle(styles.of(look));
    return this;
  }

  private static boolean looksLikeFormula(String text) {
    return !text.isEmpty() && "=+-@\t\r".indexOf(text.charAt(0)) >= 0;
  }

  private static String written(String text) {
    String whole =
        text.length() <= LONGEST_TEXT ? text : text.substring(0, LONGEST_TEXT) + "\u2026";
    return whole.contains("_x") ? ESCAPE.matcher(whole).replaceAll("_x005F_$1") : whole;
  }
}
