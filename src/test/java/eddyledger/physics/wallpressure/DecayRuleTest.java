package eddyledger.physics.wallpressure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.data.Percentage.withPercentage;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class DecayRuleTest {
  private static final double DECAY = 0.116;
  private static final double CONVECTIVE = 100.0;

  /** ∫ f(ξ) dξ over all separations of a coherence, m, by Simpson's rule. */
  private static double correlationLength(int order, double decay) {
    ExponentialTerms terms =
        new ButterworthCrossSpectrum(order, 1, decay, 0.7).alongFlow(CONVECTIVE * 30.0, 30.0);
    double slowest = Double.POSITIVE_INFINITY;
    for (double rate : terms.decayRe()) {
      slowest = Math.min(slowest, rate);
    }
    int intervals = 20_000;
    double end = 40.0 / slowest;
    double step = end / intervals;
    double sum = terms.coherence(0.0) + terms.coherence(end);
    for (int i = 1; i < intervals; i++) {
      sum += (i % 2 == 1 ? 4.0 : 2.0) * terms.coherence(i * step);
    }
    return 2.0 * sum * step / 3.0;
  }

  @ParameterizedTest
  @CsvSource({"1, 2", "1, 3", "1, 4", "1, 5", "2, 1", "2, 3", "4, 2", "5, 1"})
  void correlationLengthIsReallyKept(int fitted, int used) {
    double carried = DecayRule.CORRELATION_LENGTH.carry(DECAY, fitted, used);
    assertThat(correlationLength(used, carried))
        .isCloseTo(correlationLength(fitted, DECAY), withPercentage(1e-6));
    // and the density at the convective peak, which is that length over 2π, with it
    assertThat(alongPeak(used, carried)).isCloseTo(alongPeak(fitted, DECAY), withPercentage(1e-10));
  }

  private static double alongPeak(int order, double decay) {
    return new ButterworthCrossSpectrum(order, 1, decay, 0.7)
        .wavenumberDensity(CONVECTIVE, 0.0, CONVECTIVE * 30.0, 30.0);
  }

  @ParameterizedTest
  @CsvSource({"1, 2", "2, 1", "1, 5"})
  void halfPowerWidthKeepsTheDecayRateAndChangesTheLength(int fitted, int used) {
    double carried = DecayRule.HALF_POWER_WIDTH.carry(DECAY, fitted, used);
    assertThat(carried).isEqualTo(DECAY);
    assertThat(correlationLength(used, carried) / correlationLength(fitted, DECAY))
        .isNotCloseTo(1.0, within(0.2));
  }

  @ParameterizedTest
  @EnumSource(DecayRule.class)
  void thereAndBackIsNoChange(DecayRule rule) {
    for (int fitted = 1; fitted <= 5; fitted++) {
      for (int used = 1; used <= 5; used++) {
        double there = rule.carry(DECAY, fitted, used);
        assertThat(rule.carry(there, used, fitted)).isCloseTo(DECAY, withPercentage(1e-12));
      }
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 4, 5})
  void fromOrderOneTheRateGrowsByTheKnownFactor(int used) {
    assertThat(DecayRule.CORRELATION_LENGTH.carry(DECAY, 1, used))
        .isCloseTo(DECAY * used * Math.sin(Math.PI / (2 * used)), withPercentage(1e-12));
  }
}
