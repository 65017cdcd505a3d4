package eddyledger.physics;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class WordingTest {
  @ParameterizedTest
  @CsvSource({
    "0, 0",
    "-0.0, 0",
    "23000, 23000",
    "1400, 1400",
    "0.3, 0.3",
    "-0.43464, -0.4346",
    "0.0020912, 0.002091",
    "123456, 123500",
    "1.2e-5, 1.2e-05",
    "4.85e8, 4.85e+08",
    "1e9, 1e+09",
    "NaN, NaN",
    "-Infinity, -Infinity"
  })
  void writesFourDigitsWithoutTrailingZeros(double value, String text) {
    assertThat(Wording.number(value)).isEqualTo(text);
  }

  @Test
  void isTheSameInEveryLocale() {
    Locale before = Locale.getDefault();
    try {
      Locale.setDefault(Locale.GERMANY);
      assertThat(Wording.number(1.5e-9)).isEqualTo("1.5e-09");
      assertThat(Wording.number(0.25)).isEqualTo("0.25");
    } finally {
      Locale.setDefault(before);
    }
  }
}
