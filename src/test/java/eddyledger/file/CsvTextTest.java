package eddyledger.file;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Cells of a table: RFC 4180 quoting, escaped formulas, numbers in full precision. */
class CsvTextTest {
  @ParameterizedTest
  @ValueSource(strings = {"=1+1", "+49", "-x", "@sum", "\tx", "\u0001x"})
  void textThatASpreadsheetWouldComputeIsEscaped(String text) {
    assertThat(CsvText.text(text)).isEqualTo("'" + text);
  }

  @Test
  void textIsQuotedWhereItMust() {
    assertThat(CsvText.text("a,b")).isEqualTo("\"a,b\"");
    assertThat(CsvText.text("a \"b\"")).isEqualTo("\"a \"\"b\"\"\"");
    assertThat(CsvText.text("=a,b")).isEqualTo("\"'=a,b\"");
    assertThat(CsvText.text("plain")).isEqualTo("plain");
    assertThat(CsvText.text(null)).isEmpty();
  }

  @Test
  void numbersAreNeverEscapedAndKeepEveryDigit() {
    assertThat(CsvText.number(-1.2)).isEqualTo("-1.2");
    assertThat(CsvText.number(-0.0)).isEqualTo("0.0");
    assertThat(Double.parseDouble(CsvText.number(Math.PI))).isEqualTo(Math.PI);
    assertThat(CsvText.number(Double.NaN)).isEmpty();
    assertThat(CsvText.number(Double.NEGATIVE_INFINITY)).isEmpty();
  }

  @Test
  void linesEndAfterTheStandard() {
    assertThat(new CsvText().line(List.of("a", "b")).line(List.of("1", "")))
        .hasToString("a,b\r\n1,\r\n");
  }
}
