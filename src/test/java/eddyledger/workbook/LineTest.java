package eddyledger.workbook;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.workbook.Look.Format;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.xssf.streaming.SXSSFWorkbook;
import org.apache.poi.xssf.usermodel.XSSFCell;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Texts come back as they were, and never as formulas. */
class LineTest {
  private static final Look TEXT = Look.of(Format.TEXT);

  private static XSSFCell back(String text) throws IOException {
    ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    try (SXSSFWorkbook workbook = new SXSSFWorkbook(new XSSFWorkbook(), 10)) {
      Styles styles = new Styles(workbook.getXSSFWorkbook());
      new Page(workbook.createSheet("s"), styles).line(1).text(0, text, TEXT);
      workbook.write(bytes);
    }
    XSSFWorkbook read = new XSSFWorkbook(new ByteArrayInputStream(bytes.toByteArray()));
    return read.getSheetAt(0).getRow(0).getCell(0);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "=1+1",
        "+2",
        "-3",
        "@SUM(A1)",
        "=cmd|'/C calc'!A0",
        "\tx",
        "plain",
        "a<b>&\"c\"",
        "_x0041_ and _x00e4_",
        " spaces kept ",
        "line\nbreak",
        "31.5",
        "2026-12-01",
        ""
      })
  void aTextComesBackAsItWas(String text) throws IOException {
    XSSFCell cell = back(text);
    assertThat(cell.getCellType()).isEqualTo(CellType.STRING);
    assertThat(cell.getStringCellValue()).isEqualTo(text);
    boolean risky = !text.isEmpty() && "=+-@\t".indexOf(text.charAt(0)) >= 0;
    assertThat(cell.getCellStyle().getQuotePrefixed()).isEqualTo(risky);
  }

  @Test
  void aTextTooLongForACellIsCutWithAMark() throws IOException {
    String text = back("x".repeat(40_000)).getStringCellValue();
    assertThat(text).hasSize(32_001).endsWith("\u2026");
  }
}
