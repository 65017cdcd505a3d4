package eddyledger.workbook;

import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;
import java.util.HashMap;
import java.util.HexFormat;
import java.util.Map;
import org.apache.poi.ss.usermodel.BorderStyle;
import org.apache.poi.ss.usermodel.CellStyle;
import org.apache.poi.ss.usermodel.FillPatternType;
import org.apache.poi.ss.usermodel.HorizontalAlignment;
import org.apache.poi.ss.usermodel.VerticalAlignment;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.apache.poi.xssf.usermodel.XSSFColor;
import org.apache.poi.xssf.usermodel.XSSFFont;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** Makes the styles of a workbook, each look once. */
final class Styles {
  /** A typeface that is there on every system, or has a stand-in of the same widths. */
  private static final String TYPEFACE = "Arial";

  private final XSSFWorkbook workbook;
  private final Map<Key, XSSFCellStyle> styles = new HashMap<>();
  private final Map<Emphasis, XSSFFont> fonts = new HashMap<>();

  private record Key(Look look, boolean quoted) {}

  Styles(XSSFWorkbook workbook) {
    this.workbook = workbook;
    XSSFFont standard = workbook.getFontAt(0);
    standard.setFontName(TYPEFACE);
    standard.setFontHeightInPoints((short) 9);
  }

  /** The style of a look. */
  CellStyle of(Look look) {
    return styles.computeIfAbsent(new Key(look, false), this::make);
  }

  /** The style of a look for a text that must be taken as text, whatever it begins with. */
  CellStyle quoted(Look look) {
    return styles.computeIfAbsent(new Key(look, true), this::make);
  }

  private XSSFCellStyle make(Key key) {
    Look look = key.look();
    XSSFCellStyle style = workbook.createCellStyle();
    style.setFont(fonts.computeIfAbsent(look.emphasis(), this::font));
    style.setDataFormat(workbook.createDataFormat().getFormat(look.format().pattern()));
    style.setAlignment(alignment(look));
    boolean middle = look.emphasis() == Emphasis.HEADER;
    style.setVerticalAlignment(middle ? VerticalAlignment.CENTER : VerticalAlignment.TOP);
    style.setWrapText(look.format() == Format.WRAPPED || look.emphasis() == Emphasis.HEADER);
    style.setIndention((short) Math.min(look.indent(), 15));
    style.setLocked(look.role() != Role.INPUT);
    style.setQuotePrefixed(key.quoted());
    borders(style, look.emphasis());
    fill(style, look);
    return style;
  }

  private static HorizontalAlignment alignment(Look look) {
    return switch (look.format()) {
      case TEXT, WRAPPED, INSTANT -> HorizontalAlignment.LEFT;
      case WORD, COUNT -> HorizontalAlignment.CENTER;
      default ->
          look.emphasis() == Emphasis.HEADER
              ? HorizontalAlignment.CENTER
              : HorizontalAlignment.RIGHT;
    };
  }

  private XSSFFont font(Emphasis emphasis) {
    XSSFFont font = workbook.createFont();
    font.setFontName(TYPEFACE);
    font.setFontHeightInPoints(
        (short)
            switch (emphasis) {
              case TITLE -> 16;
              case HEADING -> 11;
              case SMALL, HEADER -> 8;
              default -> 9;
            });
    font.setBold(
        switch (emphasis) {
          case TITLE, HEADING, HEADER, TOTAL, SECTION -> true;
          default -> false;
        });
    font.setColor(color(emphasis == Emphasis.SMALL ? Palette.SOFT_INK : Palette.INK));
    return font;
  }

  private static void borders(XSSFCellStyle style, Emphasis emphasis) {
    switch (emphasis) {
      case TITLE, HEADING, SMALL, CAUTION -> {
        return;
      }
      case HEADER, TOTAL -> {
        style.setBorderTop(BorderStyle.THIN);
        style.setTopBorderColor(color(Palette.STRONG_RULE));
        style.setBorderBottom(BorderStyle.THIN);
        style.setBottomBorderColor(color(Palette.STRONG_RULE));
      }
      default -> {
        style.setBorderBottom(BorderStyle.THIN);
        style.setBottomBorderColor(color(Palette.RULE));
      }
    }
  }

  private static void fill(XSSFCellStyle style, Look look) {
    switch (look.role()) {
      case INPUT -> solid(style, Palette.INPUT);
      case PROGRAM -> solid(style, Palette.PROGRAM);
      case ACOUSTIC -> pattern(style, FillPatternType.THIN_BACKWARD_DIAG, Palette.ACOUSTIC);
      case LEAK -> pattern(style, FillPatternType.LESS_DOTS, Palette.LEAK);
      default -> {
        switch (look.emphasis()) {
          case HEADER -> solid(style, Palette.HEADER);
          case TOTAL -> solid(style, Palette.TOTAL);
          case CAUTION -> solid(style, Palette.CAUTION);
          default -> style.setFillPattern(FillPatternType.NO_FILL);
        }
      }
    }
  }

  private static void solid(XSSFCellStyle style, String color) {
    style.setFillPattern(FillPatternType.SOLID_FOREGROUND);
    style.setFillForegroundColor(color(color));
  }

  private static void pattern(XSSFCellStyle style, FillPatternType pattern, String color) {
    style.setFillPattern(pattern);
    style.setFillForegroundColor(color(color));
    style.setFillBackgroundColor(color("FFFFFF"));
  }

  /** A colour given as red, green, blue in hexadecimal. */
  static XSSFColor color(String hexadecimal) {
    return new XSSFColor(HexFormat.of().parseHex("FF" + hexadecimal), null);
  }
}
