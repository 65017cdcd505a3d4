package eddyledger.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Limits of the A-weighting, and its two forms saying the same. */
class AWeightingTest {
  @Test
  void energyRatiosAreTheWeights() {
    for (int i = 0; i < Bands.COUNT; i++) {
      assertThat(Decibels.ofRatio(AWeighting.energyRatios().value(i)))
          .as("band %s", Bands.label(i))
          .isCloseTo(AWeighting.weights().value(i), within(1e-12));
    }
  }

  @Test
  void fallsByEightyDecibelsAFactorOfTenTowardsZero() {
    // four poles at low frequency: R grows with the fourth power, 80 dB a decade, far below them
    double slope = AWeighting.weight(0.1) - AWeighting.weight(0.01);
    assertThat(slope).isCloseTo(80.0, within(1e-3));
    assertThat(AWeighting.weight(0.0)).isEqualTo(Double.NEGATIVE_INFINITY);
  }

  @ParameterizedTest
  @ValueSource(doubles = {-1.0, Double.NaN})
  void refusesWhatIsNoFrequency(double frequency) {
    assertThatThrownBy(() -> AWeighting.weight(frequency))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("frequency");
  }
}
