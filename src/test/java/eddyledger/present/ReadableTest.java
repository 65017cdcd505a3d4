package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Numbers as people read them. */
class ReadableTest {
  @ParameterizedTest
  @CsvSource({
    "0.3781, 3, 0.378",
    "0.03781, 3, 0.0378",
    "288.15, 4, 288.2",
    "-1.05, 3, −1.05",
    "0.0000021, 3, 2.10·10⁻⁶",
    "2.124e7, 4, 2.124·10⁷",
    "1234.4, 3, 1230",
    "0, 3, 0",
    "99.96, 3, 100"
  })
  void numbers(double value, int digits, String text) {
    assertThat(Readable.number(value, digits)).isEqualTo(text);
  }

  @Test
  void plainNumbersHaveNoNeedlessZeros() {
    assertThat(Readable.plain(0.74)).isEqualTo("0.74");
    assertThat(Readable.plain(2.0)).isEqualTo("2");
    assertThat(Readable.plain(10700.0)).isEqualTo("10700");
    assertThat(Readable.plain(Double.NaN)).isEqualTo("—");
  }

  @Test
  void unitsFitTheSize() {
    assertThat(Readable.length(0.0014)).isEqualTo("1.4 mm");
    assertThat(Readable.length(0.05)).isEqualTo("50 mm");
    assertThat(Readable.length(1.45)).isEqualTo("1.45 m");
    assertThat(Readable.size(0.5, 0.18)).isEqualTo("500 by 180 mm");
    assertThat(Readable.size(1.2, 0.5)).isEqualTo("1.2 m by 500 mm");
    assertThat(Readable.pressure(21.67)).isEqualTo("21.7 Pa");
    assertThat(Readable.pressure(23720.0)).isEqualTo("23.7 kPa");
    assertThat(Readable.frequency(374.5)).isEqualTo("375 Hz");
    assertThat(Readable.frequency(8725.0)).isEqualTo("8.73 kHz");
  }

  @Test
  void levelsAndDifferences() {
    assertThat(Readable.level(-3.04)).isEqualTo("−3.0");
    assertThat(Readable.level(-0.04)).isEqualTo("0.0");
    assertThat(Readable.level(Double.NEGATIVE_INFINITY)).isEqualTo("—");
    assertThat(Readable.difference(3.15)).isEqualTo("+3.2");
    assertThat(Readable.difference(-0.04)).isEqualTo("0.0");
    assertThat(Readable.difference(-7.9)).isEqualTo("−7.9");
    assertThat(Readable.share(0.047)).isEqualTo("4.7 %");
    assertThat(Readable.share(0.0004)).isEqualTo("under 0.1 %");
    assertThat(Readable.share(0.0)).isEqualTo("0.0 %");
  }

  @Test
  void bandsAreNamedInHertzAndKilohertz() {
    assertThat(TraceAccount.bandNames())
        .hasSize(28)
        .startsWith("25 Hz", "31.5 Hz")
        .contains("800 Hz", "1 kHz", "1.25 kHz")
        .endsWith("10 kHz", "12.5 kHz");
  }

  @Test
  void sentencesOfTheLedgerArePrintedProperly() {
    assertThat(Readable.sentence("local -3 dB at 2.124e+07; range (-5 to 4.8e-08)"))
        .isEqualTo("Local −3 dB at 2.124·10⁷; range (−5 to 4.8·10⁻⁸)");
    assertThat(Readable.sentence("one-sided, half-power")).isEqualTo("One-sided, half-power");
    assertThat(Readable.brief("Cruise, M 0.74 at 10 700 m")).isEqualTo("Cruise");
    assertThat(Readable.brief("Cruise")).isEqualTo("Cruise");
  }
}
