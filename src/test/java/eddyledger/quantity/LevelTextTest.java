package eddyledger.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Levels as text for people. */
class LevelTextTest {
  @ParameterizedTest
  @CsvSource({
    "61.34, 61.3",
    "50.75, 50.8",
    "0.15, 0.2",
    "-0.15, -0.2",
    "-0.05, -0.1",
    "-0.049, 0.0",
    "-1e-15, 0.0",
    "-0.0, 0.0",
    "0, 0.0",
    "100, 100.0",
    "-12.26, -12.3",
    "NaN, n/a",
    "-Infinity, -inf"
  })
  void oneDecimal(double level, String text) {
    assertThat(LevelText.text(level)).isEqualTo(text);
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4})
  void neverAMinusZero(long seed) {
    Random random = new Random(seed);
    for (int n = 0; n < 2000; n++) {
      double level = 0.4 * (random.nextDouble() - 0.5);
      assertThat(LevelText.text(level)).as("seed %d, %s", seed, level).isNotEqualTo("-0.0");
    }
  }

  @Test
  void anUnavailableLevelSaysSo() {
    assertThat(LevelText.text(OptionalDouble.empty())).isEqualTo(LevelText.UNAVAILABLE);
    assertThat(LevelText.text(OptionalDouble.of(48.667))).isEqualTo("48.7");
  }

  @Test
  void refusesPlusInfinity() {
    assertThatThrownBy(() -> LevelText.text(Double.POSITIVE_INFINITY))
        .isInstanceOf(IllegalArgumentException.class);
  }
}
