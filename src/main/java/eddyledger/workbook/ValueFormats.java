package eddyledger.workbook;

import java.util.HexFormat;
import java.util.List;
import org.apache.poi.ss.usermodel.ConditionalFormattingThreshold.RangeType;
import org.apache.poi.ss.util.CellRangeAddress;
import org.apache.poi.xssf.usermodel.XSSFConditionalFormattingRule;
import org.apache.poi.xssf.usermodel.XSSFDataBarFormatting;
import org.apache.poi.xssf.usermodel.XSSFSheet;
import org.apache.poi.xssf.usermodel.XSSFSheetConditionalFormatting;
import org.openxmlformats.schemas.spreadsheetml.x2006.main.CTCfRule;
import org.openxmlformats.schemas.spreadsheetml.x2006.main.CTConditionalFormatting;
import org.openxmlformats.schemas.spreadsheetml.x2006.main.CTDxf;
import org.openxmlformats.schemas.spreadsheetml.x2006.main.STCfType;
import org.openxmlformats.schemas.spreadsheetml.x2006.main.STPatternType;

/** Formats that follow a cell's value: colours of states, bars, zeros without a sign. */
final class ValueFormats {
  /** A number format of the conditional formats; above those of the styles. */
  private static final int UNSIGNED_ZERO = 300;

  private final XSSFSheet sheet;
  private int priority = 1;

  ValueFormats(Page page) {
    sheet = page.frame();
  }

  /** Colours the words of states, second to the words themselves. */
  ValueFormats states(int column, int first, int last) {
    String cell = Columns.cell(column, first);
    String range = Columns.down(column, first, last);
    rule(range, cell + "=\"over\"", words(Palette.OVER, Palette.OVER_FILL));
    rule(range, cell + "=\"tight\"", words(Palette.TIGHT, Palette.TIGHT_FILL));
    rule(range, cell + "=\"inside\"", words(Palette.INSIDE, null));
    return this;
  }

  /** Marks every status that is not whole. */
  ValueFormats statuses(int column, int first, int last) {
    String cell = Columns.cell(column, first);
    String formula =
        "OR(LEFT(" + cell + ",7)=\"partial\"," + cell + "=\"missing\"," + cell + "=\"failed\")";
    rule(Columns.down(column, first, last), formula, words(Palette.OVER, null));
    return this;
  }

  /** A difference or level that rounds to zero is shown without a sign. */
  ValueFormats noMinusZero(int firstColumn, int lastColumn, int first, int last) {
    CTDxf format = CTDxf.Factory.newInstance();
    var number = format.addNewNumFmt();
    number.setNumFmtId(UNSIGNED_ZERO);
    number.setFormatCode("0.0;0.0;0.0");
    String cell = Columns.cell(firstColumn, first);
    rule(
        cell + ":" + Columns.cell(lastColumn, last),
        "IF(ISNUMBER(" + cell + "),ABS(" + cell + ")<0.05,FALSE)",
        format);
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
    priority++;
    return this;
  }

  private static CTDxf words(String ink, String fill) {
    CTDxf format = CTDxf.Factory.newInstance();
    var font = format.addNewFont();
    font.addNewB().setVal(true);
    font.addNewColor().setRgb(opaque(ink));
    if (fill != null) {
      var pattern = format.addNewFill().addNewPatternFill();
      pattern.setPatternType(STPatternType.SOLID);
      pattern.addNewBgColor().setRgb(opaque(fill));
    }
    return format;
  }

  private static byte[] opaque(String color) {
    return HexFormat.of().parseHex("FF" + color);
  }

  private void rule(String range, String formula, CTDxf format) {
    int id = sheet.getWorkbook().getStylesSource().putDxf(format) - 1;
    CTConditionalFormatting formatting = sheet.getCTWorksheet().addNewConditionalFormatting();
    formatting.setSqref(List.of(range));
    CTCfRule rule = formatting.addNewCfRule();
    rule.setType(STCfType.EXPRESSION);
    rule.setPriority(priority);
    rule.setDxfId(id);
    rule.addFormula(formula);
    priority++;
  }
}
