package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import eddyledger.physics.wallpressure.ButterworthCrossSpectrum;
import eddyledger.physics.wallpressure.ExponentialTerms;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Laws of the joint acceptance. */
class JointAcceptanceTest {

  @ParameterizedTest
  @ValueSource(longs = {11, 12, 13, 14, 15, 16, 17, 18})
  void allTogetherEqualsOneByOneAndStaysBetweenZeroAndAHalf(long seed) {
    Random random = new Random(seed);
    for (int i = 0; i < 50; i++) {
      int order = 1 + random.nextInt(5);
      double decay = 0.05 + random.nextDouble();
      double length = 0.05 + 3.0 * random.nextDouble();
      double omega = 2.0 * Math.PI * 20.0 * Math.pow(500.0, random.nextDouble());
      double speed = 10.0 + 250.0 * random.nextDouble();
      ExponentialTerms terms =
          new ButterworthCrossSpectrum(order, 1, decay, 0.7).alongFlow(omega, speed);
      double[] all = JointAcceptance.all(terms, length, 40);
      for (int m = 1; m <= 40; m++) {
        double one = JointAcceptance.of(terms, length, m);
        assertThat(all[m - 1]).as("seed %d case %d mode %d", seed, i, m).isEqualTo(one);
        assertThat(one).as("seed %d case %d mode %d", seed, i, m).isBetween(0.0, 0.5);
      }
    }
  }

  /**
   * Modes are a complete set: Σ_m j_m = half the coherence at zero separation, by Parseval; 1e-4 is
   * left to the modes above 20000.
   */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3})
  void sumOverAllModesIsOneHalf(int order) {
    ExponentialTerms terms =
        new ButterworthCrossSpectrum(order, 1, 0.3, 0.7).alongFlow(2.0 * Math.PI * 300.0, 40.0);
    double sum = 0.0;
    for (double value : JointAcceptance.all(terms, 0.6, 20_000)) {
      sum += value;
    }
    assertThat(sum).isCloseTo(0.5, within(1e-4));
  }

  /** At the change from one form to the other, |δ| = M/2, both give the same. */
  @ParameterizedTest
  @ValueSource(longs = {21, 22, 23})
  void formsMeetWhereTheyChange(long seed) {
    Random random = new Random(seed);
    for (int m = 1; m <= 30; m++) {
      double pole = m * Math.PI;
      double angle = Math.PI * (random.nextDouble() - 0.5);
      for (double sign : new double[] {1.0, -1.0}) {
        double[] inside =
            JointAcceptance.integral(
                m,
                0.5 * pole * (1.0 - 1e-12) * Math.cos(angle),
                sign * pole + 0.5 * pole * (1.0 - 1e-12) * Math.sin(angle));
        double[] outside =
            JointAcceptance.integral(
                m,
                0.5 * pole * (1.0 + 1e-12) * Math.cos(angle),
                sign * pole + 0.5 * pole * (1.0 + 1e-12) * Math.sin(angle));
        double size = Math.hypot(inside[0], inside[1]);
        assertThat(outside[0])
            .as("seed %d mode %d", seed, m)
            .isCloseTo(inside[0], within(1e-11 * size));
        assertThat(outside[1])
            .as("seed %d mode %d", seed, m)
            .isCloseTo(inside[1], within(1e-11 * size));
      }
    }
  }

  /** On the pole z = iM itself: J = 1/8 − 3i/(8M). */
  @ParameterizedTest
  @ValueSource(ints = {1, 2, 9, 40})
  void onThePole(int mode) {
    double pole = mode * Math.PI;
    double[] value = JointAcceptance.integral(mode, 0.0, pole);
    assertThat(value[0]).isCloseTo(0.125, within(1e-14));
    assertThat(value[1]).isCloseTo(-0.375 / pole, within(1e-14));
  }

  @Test
  void lengthAndModeMustBePositive() {
    ExponentialTerms terms = new ButterworthCrossSpectrum(1, 1, 0.1, 0.7).alongFlow(100.0, 30.0);
    assertThatIllegalArgumentException().isThrownBy(() -> JointAcceptance.of(terms, 0.0, 1));
    assertThatIllegalArgumentException().isThrownBy(() -> JointAcceptance.of(terms, 1.0, 0));
    assertThatIllegalArgumentException().isThrownBy(() -> JointAcceptance.all(terms, 1.0, 0));
  }
}
