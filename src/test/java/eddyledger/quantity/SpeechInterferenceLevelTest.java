package eddyledger.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Speech interference levels from thirds: sums, the bands they need and those they do not. */
class SpeechInterferenceLevelTest {
  @ParameterizedTest
  @EnumSource
  void fromThirdsAnOctaveIsTheirEnergySum(SpeechInterferenceLevel rating) {
    assertThat(rating.ofThirds(BandSpectrum.constant(50.0)).orElseThrow())
        .isCloseTo(50.0 + 10.0 * Math.log10(3.0), within(1e-12));
  }

  @ParameterizedTest
  @EnumSource
  void needsEveryThirdOfItsOctavesAndNoOther(SpeechInterferenceLevel rating) {
    for (int i = 0; i < Bands.COUNT; i++) {
      double[] levels = BandSpectrum.constant(50.0).toArray();
      levels[i] = Double.NaN;
      // the octave position of a third is its position divided by three; 12.5 kHz is in none
      boolean needed = i / 3 < Octaves.COUNT && rating.octaves().contains(Octaves.label(i / 3));
      assertThat(rating.ofThirds(BandSpectrum.of(levels)).isEmpty())
          .as("%s without %s Hz", rating, Bands.label(i))
          .isEqualTo(needed);
    }
  }

  @Test
  void theMeanIsPlainAndUnweighted() {
    double[] octaves = new double[Octaves.COUNT];
    Arrays.fill(octaves, Double.NaN);
    octaves[Octaves.position("500")] = 80.0;
    octaves[Octaves.position("1000")] = 50.0;
    octaves[Octaves.position("2000")] = 20.0;
    assertThat(SpeechInterferenceLevel.THREE_BANDS_500_TO_2000.ofOctaves(octaves)).hasValue(50.0);
    assertThat(SpeechInterferenceLevel.FOUR_BANDS_500_TO_4000.ofOctaves(octaves)).isEmpty();
  }

  @Test
  void refusesAnotherNumberOfOctaves() {
    assertThatThrownBy(() -> SpeechInterferenceLevel.FOUR_BANDS_500_TO_4000.ofOctaves(1, 2, 3, 4))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("4");
  }
}
