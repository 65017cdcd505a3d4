package eddyledger.present;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class NumberTextTest {
  private static NumberText.Read thickness(String typed) {
    return NumberText.read(typed, Quantity.THICKNESS, Unit.MILLIMETRE);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "1.6|0.0016",
        " 1.6 |0.0016",
        "1.6mm|0.0016",
        "1.6 mm|0.0016",
        "1,6|0.0016",
        "1,65|0.00165",
        "0,055 in|0.001397",
        "0,0016 m|0.0016",
        "1,2345|0.0012345",
        "0.055 in|0.001397",
        ".055 IN|0.001397",
        "0.055\"|0.001397",
        "1.4e0|0.0014",
        "16e-1 mm|0.0016",
        "2.|0.002",
      })
  void whatPeopleType(String typed, double metres) {
    assertThat(thickness(typed).fault()).isEmpty();
    assertThat(thickness(typed).value()).isEqualTo(metres);
  }

  @Test
  void anotherUnitIsKnownAfterwards() {
    assertThat(thickness("0.055 in").unit()).isEqualTo(Unit.INCH);
    assertThat(thickness("1.6").unit()).isEqualTo(Unit.MILLIMETRE);
  }

  @Test
  void oneCommaBeforeThreeDigitsCouldBeEither() {
    assertThat(thickness("1,234").ok()).isFalse();
    assertThat(thickness("1,234").fault())
        .isEqualTo("“1,234” could be 1.234 or 1234. Type it without comma.");
    assertThat(thickness("0,234").value()).isEqualTo(0.000234);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {"", "  ", "abc", "1.2.3", "--1", "1e", "NaN", "Infinity", "1 2", "½", "0x10"})
  void whatIsNoNumber(String typed) {
    assertThat(thickness(typed).ok()).isFalse();
    assertThat(thickness(typed).value()).isNaN();
  }

  @ParameterizedTest
  @ValueSource(strings = {"1,234,567", "1,234.5", "1.234,5", "1,,2"})
  void moreThanOneSign(String typed) {
    assertThat(thickness(typed).fault())
        .isEqualTo("Only one decimal sign, please, and no thousands signs.");
  }

  @Test
  void aUnitOfAnotherQuantityIsRefusedWithThoseThatFit() {
    assertThat(thickness("3 kg").fault())
        .isEqualTo("“kg” is not a unit for this. It takes mm, m, in.");
    assertThat(NumberText.read("3 mm", Quantity.COUNT, Unit.ONE).fault())
        .isEqualTo("“mm” is not a unit for this. It has none.");
  }

  @Test
  void aNumberBeyondAllBoundsIsRefused() {
    assertThat(NumberText.read("1e999", Quantity.SPEED, Unit.METRE_PER_SECOND).ok()).isFalse();
    assertThat(thickness("1".repeat(60)).ok()).isFalse();
  }

  @Test
  void bothMinusSignsAreRead() {
    assertThat(NumberText.read("−3.5", Quantity.LEVEL, Unit.DECIBEL).value()).isEqualTo(-3.5);
    assertThat(NumberText.read("-3.5 dB", Quantity.LEVEL, Unit.DECIBEL).value()).isEqualTo(-3.5);
    double zero = NumberText.read("-0", Quantity.LEVEL, Unit.DECIBEL).value();
    assertThat(Double.doubleToRawLongBits(zero)).isZero();
  }

  @ParameterizedTest
  @CsvSource({
    "0.0012, THICKNESS, MILLIMETRE, 1.2",
    "0.008, THICKNESS, MILLIMETRE, 8.0",
    "0.0016002, THICKNESS, MILLIMETRE, 1.6002",
    "0.001397, THICKNESS, INCH, 0.055",
    "0.5, SIZE, METRE, 0.500",
    "0.5, SIZE, MILLIMETRE, 500",
    "0.04, LOSS_FACTOR, ONE, 0.040",
    "0.04, LOSS_FACTOR, PERCENT, 4",
    "250, SPEED, KILOMETRE_PER_HOUR, 900",
    "-3.5, LEVEL, DECIBEL, −3.5",
    "76, LEVEL_A, DECIBEL_A, 76.0",
    "33, COUNT, ONE, 33",
    "1000000, COUNT, ONE, 1000000",
  })
  void howNumbersAreShown(double value, Quantity quantity, Unit unit, String expected) {
    assertThat(NumberText.text(value, quantity, unit)).isEqualTo(expected);
  }

  @Test
  void aMissingNumberIsNotZero() {
    assertThat(NumberText.text(Double.NaN, Quantity.SIZE, Unit.METRE)).isEmpty();
  }
}
