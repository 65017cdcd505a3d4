package eddyledger.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/**
 * A-weighting against the table of IEC 61672-1:2013 (dB to 0.1 at the nominal frequencies 10 Hz to
 * 20 kHz, meant for the exact base-ten frequencies; tolerance 0.05 dB, half the last digit) and
 * against an independent computation of the same expression (dB at exact frequencies in Hz, both
 * printed to twelve digits; tolerance 1e-9 dB).
 */
class AWeightingReferenceTest {
  private static final double HALF_OF_LAST_DIGIT = 0.05;

  @ParameterizedTest
  @CsvFileSource(resources = "/reference/a-weighting-table.csv", useHeadersInDisplayName = true)
  void tableOfTheStandard(String nominal, int bandIndex, double weight) {
    double exact = 1000.0 * Math.pow(10.0, bandIndex / 10.0);
    assertThat(AWeighting.weight(exact)).isCloseTo(weight, within(HALF_OF_LAST_DIGIT));
    int position = Bands.position(nominal);
    if (position >= 0) {
      assertThat(Bands.index(position)).isEqualTo(bandIndex);
      assertThat(AWeighting.weights().value(position))
          .isCloseTo(weight, within(HALF_OF_LAST_DIGIT));
    }
  }

  @ParameterizedTest
  @CsvFileSource(resources = "/reference/a-weighting-values.csv", useHeadersInDisplayName = true)
  void independentComputation(double frequency, double weight) {
    assertThat(AWeighting.weight(frequency)).isCloseTo(weight, within(1e-9));
  }

  @Test
  void nothingIsAddedAtOneKilohertz() {
    assertThat(AWeighting.weight(1000.0)).isZero();
    assertThat(AWeighting.energyRatios().value(Bands.position("1000"))).isEqualTo(1.0);
  }
}
