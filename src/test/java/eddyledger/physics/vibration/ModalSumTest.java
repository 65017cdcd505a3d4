package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The fast sum against the exact integral of every mode. */
class ModalSumTest {

  @ParameterizedTest
  @ValueSource(longs = {31, 32, 33, 34, 35, 36})
  void everyModeWithinOneInAHundredThousand(long seed) {
    Random random = new Random(seed);
    for (int round = 0; round < 40; round++) {
      double centre = 100.0 * Math.pow(1000.0, random.nextDouble());
      double ratio = Math.pow(10.0, 0.1 / (2.0 * (1 + random.nextInt(24))));
      double lossFactor = 0.0003 * Math.pow(1000.0, random.nextDouble());
      double[] squares = new double[60];
      for (int m = 0; m < squares.length; m++) {
        double resonance = centre * Math.pow(100.0, random.nextDouble() - 0.5);
        squares[m] = resonance * resonance;
      }
      Arrays.sort(squares);
      double lower = centre / ratio;
      double upper = centre * ratio;
      for (int m = 0; m < squares.length; m++) {
        ModalSum sum = new ModalSum(squares.length, 1);
        sum.clear();
        Arrays.fill(sum.cabin(), 0.3);
        Arrays.fill(sum.outside(), 0.2);
        sum.addRow(squares, squares.length, lossFactor, 2.0, 3.0, lower, upper, new double[] {0.7});
        double[] one = new double[squares.length];
        one[m] = 1.0;
        double damping = lossFactor * squares[m] + 2.0 * 0.3 + 3.0 * 0.2;
        double expected = 0.7 * ResonanceIntegral.ofSquares(lower, upper, squares[m], damping);
        assertThat(sum.velocity(0, one))
            .as("seed %d round %d mode %d", seed, round, m)
            .isCloseTo(expected, within(1e-5 * expected));
        assertThat(sum.power(0, one))
            .as("seed %d round %d mode %d", seed, round, m)
            .isCloseTo(0.3 * expected, within(1e-5 * expected));
      }
    }
  }
}
