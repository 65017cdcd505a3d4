package eddyledger.workbook;

import java.util.HexFormat;
import org.apache.poi.ss.usermodel.ConditionalFormattingThreshold.RangeType;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.model.StylesTable;
import org.apache.poi.xssf.usermodel.XSSFConditionalFormattingRule;
import org.apache.poi.xssf.usermodel.XSSFDataBarFormatting;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFSheetConditionalFormatting;
import org.openxmlformats.schemas.spreadsheetml.x2006.main.CTDxf;
import org.openxmlformats.schemas.spreadsheetml.x2006.main.STPatternType;

/** Formats that follow a cell's value: colours of states, bars, zeros without a sign. */
final class ValueFormats {
  /** A number format of the conditional formats; above those of the styles. */
  private static final int UNSIGNED_ZERO = 300;

  private final XSSFSheet sheet;

  ValueFormats(Page page) {
    sheet = page.frame();
  }

  /** Colours the words of states, second to the words themselves. */
  ValueFormats states(int column, int first, int last) {
    String cell = Columns.cell(column, first);
    words(rule(first, last, column, column, cell + "=\"over\""), Palette.OVER, Palette.OVER_FILL);
    words(
        rule(first, last, column, column, cell + "=\"tight\""), Palette.TIGHT, Palette.TIGHT_FILL);
    words(rule(first, last, column, column, cell + "=\"inside\""), Palette.INSIDE, null);
    return this;
  }

  /** Marks every status that is not whole. */
  ValueFormats statuses(int column, int first, int last) {
    String cell = Columns.cell(column, first);
    String formula =
        "OR(LEFT(" + cell + ",7)=\"partial\"," + cell + "=\"missing\"," + cell + "=\"failed\")";
    words(rule(first, last, column, column, formula), Palette.OVER, null);
    return this;
  }

  /** A difference or level that rounds to zero is shown without a sign. */
  ValueFormats noMinusZero(int firstColumn, int lastColumn, int first, int last) {
    String cell = Columns.cell(firstColumn, first);
    CTDxf format =
        rule(
            first,
            last,
            firstColumn,
            lastColumn,
            "IF(ISNUMBER(" + cell + "),ABS(" + cell + ")<0.05,FALSE)");
    var number = format.addNewNumFmt();
    number.setNumFmtId(UNSIGNED_ZERO);
    number.setFormatCode("0.0;0.0;0.0");
    return this;
  }

  /** Bars behind shares, full width for the whole. */
  ValueFormats bars(int column, int first, int last) {
    XSSFSheetConditionalFormatting formats = sheet.getSheetConditionalFormatting();
    CellRangeAddress[] range = {new CellRangeAddress(first - 1, last - 1, column, column)};
    XSSFConditionalFormattingRule rule =
        formats.createConditionalFormattingRule(Styles.color(Palette.BAR));
    XSSFDataBarFormatting bar = rule.getDataBarFormatting();
    bar.getMinThreshold().setRangeType(RangeType.NUMBER);
    bar.getMinThreshold().setValue(0.0);
    bar.getMaxThreshold().setRangeType(RangeType.NUMBER);
    bar.getMaxThreshold().setValue(1.0);
    formats.addConditionalFormatting(range, rule);
    return this;
  }

  private static void words(CTDxf format, String ink, String fill) {
    var font = format.addNewFont();
    font.addNewB().setVal(true);
    font.addNewColor().setRgb(opaque(ink));
    if (fill != null) {
      var pattern = format.addNewFill().addNewPatternFill();
      pattern.setPatternType(STPatternType.SOLID);
      pattern.addNewBgColor().setRgb(opaque(fill));
    }
  }

  private static byte[] opaque(String color) {
    return HexFormat.of().parseHex("FF" + color);
  }

  /** Adds a rule and gives its format, in which nothing is set yet. */
  private CTDxf rule(int first, int last, int firstColumn, int lastColumn, String formula) {
    XSSFSheetConditionalFormatting formats = sheet.getSheetConditionalFormatting();
    XSSFConditionalFormattingRule rule = formats.createConditionalFormattingRule(formula);
    // the library makes a format only together with a font, and writes its colours too short
    rule.createFontFormatting();
    StylesTable styles = sheet.getWorkbook().getStylesSource();
    CTDxf format = styles.getDxfAt(styles._getDXfsSize() - 1);
    format.unsetFont();
    CellRangeAddress[] range = {new CellRangeAddress(first - 1, last - 1, firstColumn, lastColumn)};
    formats.addConditionalFormatting(range, rule);
    return format;
  }
}
