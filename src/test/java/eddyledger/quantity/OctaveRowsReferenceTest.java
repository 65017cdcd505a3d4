package eddyledger.quantity;

import static eddyledger.quantity.SpeechInterferenceLevel.FOUR_BANDS_500_TO_4000;
import static eddyledger.quantity.SpeechInterferenceLevel.THREE_BANDS_1000_TO_4000;
import static eddyledger.quantity.SpeechInterferenceLevel.THREE_BANDS_500_TO_2000;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.assertj.core.data.Offset;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.aggregator.ArgumentsAccessor;
import org.junit.jupiter.params.provider.CsvFileSource;

/**
 * Overall levels and speech interference levels of three invented octave spectra (see the header of
 * octave-rows.csv), dB, worked out independently to 0.1 dB: tolerance half of that and a rounding
 * more, since one mean ends in 5 exactly. The printed A-weighted levels rest on weights rounded to
 * 0.1 dB, which may move a sum by another 0.05 dB; with exact weights the tolerance is 1e-8 dB.
 *
 * <p>For the overall levels each octave's energy stands in its middle third, which has the octave's
 * mid-band frequency; the other thirds are silent.
 */
class OctaveRowsReferenceTest {
  private static final Offset<Double> HALF_OF_LAST_DIGIT = within(0.05 + 1e-9);

  private static final Offset<Double> DIGIT_AND_WEIGHTS = within(0.05 + 0.05);

  private static final int FIRST_OCTAVE = Octaves.position("63");
  private static final int LINEAR = 9;
  private static final int A_WEIGHTED = 10;
  private static final int SIL_1000_4000 = 11;
  private static final int SIL_500_4000 = 12;
  private static final int SIL_500_2000 = 13;
  private static final int A_WEIGHTED_EXACT = 14;

  @ParameterizedTest
  @CsvFileSource(resources = "/reference/octave-rows.csv", useHeadersInDisplayName = true)
  void overallLevels(ArgumentsAccessor row) {
    double[] energies = energiesInMiddleThirds(octaveLevels(row));
    assertThat(Decibels.pressureLevel(OverallLevel.linearMeanSquare(energies)))
        .isCloseTo(row.getDouble(LINEAR), HALF_OF_LAST_DIGIT);
    assertThat(Decibels.pressureLevel(OverallLevel.aWeightedMeanSquare(energies)))
        .isCloseTo(row.getDouble(A_WEIGHTED), DIGIT_AND_WEIGHTS)
        .isCloseTo(row.getDouble(A_WEIGHTED_EXACT), within(1e-8));
  }

  @ParameterizedTest
  @CsvFileSource(resources = "/reference/octave-rows.csv", useHeadersInDisplayName = true)
  void speechInterferenceLevels(ArgumentsAccessor row) {
    double[] octaves = octaveLevels(row);
    assertThat(THREE_BANDS_1000_TO_4000.ofOctaves(octaves).orElseThrow())
        .isCloseTo(row.getDouble(SIL_1000_4000), HALF_OF_LAST_DIGIT);
    assertThat(FOUR_BANDS_500_TO_4000.ofOctaves(octaves).orElseThrow())
        .isCloseTo(row.getDouble(SIL_500_4000), HALF_OF_LAST_DIGIT);
    assertThat(THREE_BANDS_500_TO_2000.ofOctaves(octaves).orElseThrow())
        .isCloseTo(row.getDouble(SIL_500_2000), HALF_OF_LAST_DIGIT);
  }

  /**
   * The level would hardly change without the band, so only being unavailable can show the loss.
   */
  @ParameterizedTest
  @CsvFileSource(resources = "/reference/octave-rows.csv", useHeadersInDisplayName = true)
  void losingTheFourKilohertzBandMakesRatingsUnavailable(ArgumentsAccessor row) {
    double[] octaves = octaveLevels(row);
    octaves[Octaves.position("4000")] = Double.NaN;
    double[] energies = energiesInMiddleThirds(octaves);
    assertThat(OverallLevel.linearMeanSquare(energies)).isNaN();
    assertThat(OverallLevel.aWeightedMeanSquare(energies)).isNaN();
    assertThat(THREE_BANDS_1000_TO_4000.ofOctaves(octaves)).isEmpty();
    assertThat(FOUR_BANDS_500_TO_4000.ofOctaves(octaves)).isEmpty();
    assertThat(THREE_BANDS_500_TO_2000.ofOctaves(octaves).orElseThrow())
        .isCloseTo(row.getDouble(SIL_500_2000), HALF_OF_LAST_DIGIT);
  }

  private static double[] octaveLevels(ArgumentsAccessor row) {
    double[] octaves = new double[Octaves.COUNT];
    Arrays.fill(octaves, Double.NaN);
    for (int j = FIRST_OCTAVE; j < Octaves.COUNT; j++) {
      octaves[j] = row.getDouble(j - FIRST_OCTAVE + 1);
    }
    return octaves;
  }

  private static double[] energiesInMiddleThirds(double[] octaves) {
    double[] energies = new double[Bands.COUNT];
    for (int j = FIRST_OCTAVE; j < Octaves.COUNT; j++) {
      energies[Octaves.middleThird(j)] = Decibels.meanSquarePressure(octaves[j]);
    }
    return energies;
  }
}
