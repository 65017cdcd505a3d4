package eddyledger.workbook;

import org.apache.poi.ss.usermodel.DataValidation;
import org.apache.poi.ss.usermodel.DataValidationHelper;
import org.apache.poi.ss.usermodel.PageMargin;
import org.apache.poi.ss.usermodel.PaperSize;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.ss.util.CellRangeAddressList;
import org.apache.poi.xssf.usermodel.XSSFSheet;

/** What surrounds the rows of a sheet: print set-up, panes, filters, protection, validation. */
final class Frame {
  private static final double MARGIN_INCHES = 0.4;
  private static final double FOOT_INCHES = 0.65;
  private static final double A3_WIDTH_INCHES = 16.54;
  private static final double A3_HEIGHT_INCHES = 11.69;
  private static final double PIXELS_PER_INCH = 96.0;
  private static final double POINTS_PER_INCH = 72.0;

  /** Below this scale a print is hard to read. */
  private static final int LEAST_PER_CENT = 58;

  /** Width of a digit of the standard typeface at nine points. */
  private static final double PIXELS_PER_CHARACTER = 7.0;

  private static final double PADDING_PIXELS = 5.0;

  /** Printers and programs differ a little in widths. */
  private static final double SAFE_PER_CENT = 96.0;

  /** Levels outside of these are slips of the hand, dB. */
  private static final String LEVEL_RULE =
      "OR(AND(ISNUMBER(%1$s),%1$s>=-200,%1$s<=250),ISTEXT(%1$s))";

  private final XSSFSheet sheet;

  Frame(Page page) {
    sheet = page.frame();
  }

  /**
   * Landscape, one page wide, header rows on every page.
   *
   * @param firstHeader first row that is repeated, from 1; 0 for none
   * @param lastHeader last row that is repeated
   * @param lastColumn last column that is printed, from 0
   * @param lastRow last row that is printed, from 1
   */
  void print(
      String vehicle,
      PaperSize paper,
      int firstHeader,
      int lastHeader,
      int lastColumn,
      int lastRow) {
    var setup = sheet.getPrintSetup();
    setup.setLandscape(true);
    setup.setPaperSize(paper);
    sheet.setFitToPage(true);
    setup.setFitWidth((short) 1);
    setup.setFitHeight((short) 0);
    for (short side :
        new short[] {XSSFSheet.LeftMargin, XSSFSheet.RightMargin, XSSFSheet.TopMargin}) {
      margin(side, MARGIN_INCHES);
    }
    margin(XSSFSheet.BottomMargin, FOOT_INCHES);
    sheet.setHorizontallyCenter(false);
    sheet.getFooter().setLeft("&8" + vehicle.replace("&", "&&") + " \u2013 &A");
    sheet.getFooter().setCenter("&8Budget figures for engineering use");
    sheet.getFooter().setRight("&8Page &P of &N");
    if (firstHeader > 0) {
      sheet.setRepeatingRows(CellRangeAddress.valueOf(firstHeader + ":" + lastHeader));
    }
    int index = sheet.getWorkbook().getSheetIndex(sheet);
    sheet.getWorkbook().setPrintArea(index, 0, lastColumn, 0, Math.max(lastRow, lastHeader) - 1);
  }

  /**
   * Prints a wide sheet on pages side by side, which adjoin in the print.
   *
   * @param column first column of the second page
   * @param lastColumn last column that is printed
   * @param lastRepeated last of the columns from the first on that stand on both
   * @param points height of what should stand on one page, if that can still be read
   */
  void inTwo(int column, int lastColumn, int lastRepeated, double points) {
    double first = width(0, column - 1);
    double second = width(0, lastRepeated) + width(column, lastColumn);
    double page = A3_WIDTH_INCHES - 2.0 * MARGIN_INCHES;
    int scale = (int) (SAFE_PER_CENT * page * PIXELS_PER_INCH / Math.max(first, second));
    double height = A3_HEIGHT_INCHES - MARGIN_INCHES - FOOT_INCHES;
    int whole = (int) (SAFE_PER_CENT * height * POINTS_PER_INCH / points);
    if (whole >= LEAST_PER_CENT) {
      scale = Math.min(scale, whole);
    }
    sheet.setFitToPage(false);
    var setup = sheet.getPrintSetup();
    setup.setScale((short) Math.max(10, Math.min(100, scale)));
    setup.setLeftToRight(true);
    sheet.setColumnBreak(column - 1);
    sheet.setRepeatingColumns(new CellRangeAddress(-1, -1, 0, lastRepeated));
  }

  private double width(int first, int last) {
    double width = 0.0;
    for (int column = first; column <= last; column++) {
      width += sheet.getColumnWidth(column) / 256.0 * PIXELS_PER_CHARACTER + PADDING_PIXELS;
    }
    return width;
  }

  /** Filter buttons on the header. */
  void filter(int header, int lastColumn, int lastRow) {
    sheet.setAutoFilter(
        new CellRangeAddress(header - 1, Math.max(header, lastRow) - 1, 0, lastColumn));
  }

  private void margin(short side, double inches) {
    sheet.setMargin(PageMargin.getByShortValue(side), inches);
  }

  /** Rows above and columns to the left that stay in view; counts. */
  void freeze(int columns, int rows) {
    sheet.createFreezePane(columns, rows);
  }

  /** Locks every cell that is not an input, without a password; filters and widths stay free. */
  void protect() {
    sheet.enableLocking();
    sheet.lockAutoFilter(false);
    sheet.lockFormatColumns(false);
    sheet.lockFormatRows(false);
    sheet.lockSort(false);
    sheet.lockSelectLockedCells(false);
    sheet.lockSelectUnlockedCells(false);
  }

  /** Refuses levels that no cabin has; words are taken. */
  void levels(int firstColumn, int lastColumn, int first, int last) {
    DataValidationHelper helper = sheet.getDataValidationHelper();
    String cell = Columns.cell(firstColumn, first);
    DataValidation validation =
        helper.createValidation(
            helper.createCustomConstraint(LEVEL_RULE.formatted(cell)),
            new CellRangeAddressList(first - 1, last - 1, firstColumn, lastColumn));
    validation.setErrorStyle(DataValidation.ErrorStyle.STOP);
    validation.createErrorBox(
        "Not a level",
        "Enter a level in dB between -200 and 250, or a word: none for no sound at all, missing"
            + " where it is not known.");
    validation.setShowErrorBox(true);
    sheet.addValidationData(validation);
  }
}
