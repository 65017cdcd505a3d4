package eddyledger.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.aggregator.ArgumentsAccessor;
import org.junit.jupiter.params.provider.CsvFileSource;

/**
 * Energy sums and means of levels against published examples, dB.
 *
 * <ul>
 *   <li>Mean of five levels: The Science and Applications of Acoustics, p. 52, eq. 3.26, Example 5,
 *       printed 97 (96.81 worked out here); tolerance 0.5 dB and 0.005 dB, half the last digit
 *   <li>A-weighted sums of octave levels: see the header of octave-a-sums.csv; tolerance 0.005 dB
 *       for two decimals with the weights of the standard's table, 1e-8 dB with exact ones, and 0.5
 *       dB for the printed 42
 *   <li>Sum of eight levels: data of a public question, sum 46.17 worked out independently;
 *       tolerance 0.005 dB
 *   <li>Three equal thirds raise an octave by 10 lg 3 = 4.77 dB; tolerance 0.005 dB
 * </ul>
 */
class LevelSumsReferenceTest {
  private static final double TWO_DECIMALS = 0.005;

  @Test
  void meanOfFiveLevels() {
    double mean = Decibels.mean(96, 88, 94, 102, 90);
    assertThat(mean).isCloseTo(97.0, within(0.5)).isCloseTo(96.81, within(TWO_DECIMALS));
  }

  @Test
  void sumOfEightLevels() {
    assertThat(Decibels.sum(30.8, 38.9, 42.4, 36.8, 33, 34.2, 35, 33.9))
        .isCloseTo(46.17, within(TWO_DECIMALS));
  }

  @ParameterizedTest
  @CsvFileSource(resources = "/reference/octave-a-sums.csv", useHeadersInDisplayName = true)
  void aWeightedSumOfOctaves(ArgumentsAccessor row) {
    double[] byTable = new double[8];
    double[] exact = new double[8];
    for (int n = 0; n < exact.length; n++) {
      double level = row.getDouble(n + 1);
      // columns start at 63 Hz, the second octave
      double weight = AWeighting.weight(Octaves.centre(n + 1));
      byTable[n] = level + Math.rint(10.0 * weight) / 10.0;
      exact[n] = level + weight;
    }
    assertThat(Decibels.sum(byTable)).isCloseTo(row.getDouble(9), within(TWO_DECIMALS));
    assertThat(Decibels.sum(exact)).isCloseTo(row.getDouble(10), within(1e-8));
  }

  @Test
  void printedAWeightedSum() {
    double[] levels = {63, 52, 45, 38, 31, 24, 16, 10};
    for (int n = 0; n < levels.length; n++) {
      levels[n] += AWeighting.weight(Octaves.centre(n + 1));
    }
    assertThat(Decibels.sum(levels)).isCloseTo(42.0, within(0.5));
  }

  @Test
  void unweightedSumOfTheThirdExample() {
    assertThat(Decibels.sum(46, 41, 38, 40, 43, 46, 49, 50)).isCloseTo(54.88, within(TWO_DECIMALS));
  }

  @Test
  void threeEqualThirds() {
    double[] octaves = Octaves.levels(BandSpectrum.constant(60.0));
    assertThat(octaves).hasSize(Octaves.COUNT);
    for (double octave : octaves) {
      assertThat(octave).isCloseTo(64.77, within(TWO_DECIMALS));
    }
  }
}
