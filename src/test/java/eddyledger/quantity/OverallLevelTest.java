package eddyledger.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Laws of overall levels for random spectra, and what a missing band does. */
class OverallLevelTest {
  static LongStream seeds() {
    return LongStream.rangeClosed(1, 20);
  }

  static IntStream positions() {
    return IntStream.range(0, Bands.COUNT);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void levelsAndMeanSquaresGiveTheSame(long seed) {
    BandSpectrum levels = randomLevels(seed);
    double[] energies = levels.map(Decibels::meanSquarePressure).toArray();
    assertThat(OverallLevel.linear(levels).orElseThrow())
        .as("seed %d", seed)
        .isCloseTo(Decibels.pressureLevel(OverallLevel.linearMeanSquare(energies)), within(1e-12))
        .isCloseTo(Decibels.sum(levels.toArray()), within(1e-10));
    assertThat(OverallLevel.aWeighted(levels).orElseThrow())
        .as("seed %d", seed)
        .isCloseTo(
            Decibels.pressureLevel(OverallLevel.aWeightedMeanSquare(energies)), within(1e-12));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void raisingEveryBandRaisesBothByTheSame(long seed) {
    BandSpectrum levels = randomLevels(seed);
    BandSpectrum louder = levels.map(level -> level + 3.7);
    assertThat(OverallLevel.linear(louder).orElseThrow())
        .as("seed %d", seed)
        .isCloseTo(OverallLevel.linear(levels).orElseThrow() + 3.7, within(1e-10));
    assertThat(OverallLevel.aWeighted(louder).orElseThrow())
        .as("seed %d", seed)
        .isCloseTo(OverallLevel.aWeighted(levels).orElseThrow() + 3.7, within(1e-10));
  }

  @ParameterizedTest
  @MethodSource("positions")
  void anyMissingBandMakesItUnavailable(int position) {
    double[] values = randomLevels(7).toArray();
    values[position] = Double.NaN;
    BandSpectrum levels = BandSpectrum.of(values);
    assertThat(OverallLevel.linear(levels)).isEmpty();
    assertThat(OverallLevel.aWeighted(levels)).isEmpty();
  }

  @Test
  void refusesAnotherNumberOfBands() {
    assertThatThrownBy(() -> OverallLevel.linearMeanSquare(new double[27]))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("27");
    assertThatThrownBy(() -> OverallLevel.aWeightedMeanSquare(new double[29]))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("29");
  }

  private static BandSpectrum randomLevels(long seed) {
    Random random = new Random(seed);
    return BandSpectrum.constant(0.0).map(zero -> 20.0 + 60.0 * random.nextDouble());
  }
}
