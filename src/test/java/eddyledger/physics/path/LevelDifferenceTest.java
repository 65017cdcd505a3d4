package eddyledger.physics.path;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import eddyledger.quantity.Decibels;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** A panel known by a measured level difference. */
class LevelDifferenceTest {
  private static final double IMPEDANCE = 413.0;

  static LongStream seeds() {
    return LongStream.rangeClosed(1, 20);
  }

  /** In a zone of the absorption it was measured in, the measured difference must come back. */
  @ParameterizedTest
  @MethodSource("seeds")
  void givesBackTheMeasuredDifference(long seed) {
    Random random = new Random(seed);
    double outside = 100.0 * random.nextDouble();
    double difference = 70.0 * random.nextDouble() - 10.0;
    double area = 0.2 + 10.0 * random.nextDouble();
    double power = LevelDifference.power(outside, difference, area, IMPEDANCE);
    double inside = 4.0 * IMPEDANCE * power / area;
    assertThat(Decibels.pressureLevel(outside) - Decibels.pressureLevel(inside))
        .as("seed %d", seed)
        .isCloseTo(difference, within(1e-10));
  }

  @Test
  void powerOfAWorkedExample() {
    // 100 dB outside is 4 Pa²; 20 dB less is 0.04 Pa²; on 2 m² of absorption 0.08/1652 W
    assertThat(LevelDifference.power(4.0, 20.0, 2.0, IMPEDANCE))
        .isCloseTo(4.842615012e-5, within(1e-14));
  }

  @Test
  void aMissingDifferenceMakesThePowerMissing() {
    assertThat(LevelDifference.power(4.0, Double.NaN, 2.0, IMPEDANCE)).isNaN();
    assertThat(LevelDifference.power(Double.NaN, 20.0, 2.0, IMPEDANCE)).isNaN();
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.0, -1.0, Double.NaN})
  void refusesWhatIsNoAreaOrImpedance(double value) {
    assertThatThrownBy(() -> LevelDifference.power(4.0, 20.0, value, IMPEDANCE))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("absorption area");
    assertThatThrownBy(() -> LevelDifference.power(4.0, 20.0, 2.0, value))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("impedance");
  }
}
