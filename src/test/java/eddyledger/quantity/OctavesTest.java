package eddyledger.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Where octaves stand among the thirds, and their energy sums. */
class OctavesTest {
  @Test
  void anOctaveSharesNameAndCentreWithItsMiddleThird() {
    for (int j = 0; j < Octaves.COUNT; j++) {
      int middle = Octaves.middleThird(j);
      assertThat(Bands.label(middle)).isEqualTo(Octaves.label(j));
      assertThat(Octaves.position(Octaves.label(j))).isEqualTo(j);
      double centre = 1000.0 * Math.pow(10.0, 0.3 * (j - 5));
      assertThat(Octaves.centre(j)).isCloseTo(centre, within(1e-12 * centre));
    }
  }

  @Test
  void itsThirdsReachFromEdgeToEdge() {
    double half = Math.pow(10.0, 0.15);
    for (int j = 0; j < Octaves.COUNT; j++) {
      double centre = Octaves.centre(j);
      int middle = Octaves.middleThird(j);
      assertThat(Bands.lower(middle - 1)).isCloseTo(centre / half, within(1e-12 * centre));
      assertThat(Bands.upper(middle + 1)).isCloseTo(centre * half, within(1e-12 * centre));
    }
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8})
  void octavesKeepTheEnergyOfTheirThirds(long seed) {
    Random random = new Random(seed);
    double[] thirds = random.doubles(Bands.COUNT, 0.0, 1.0).toArray();
    double sum = thirds[Bands.COUNT - 1];
    for (double octave : Octaves.meanSquares(thirds)) {
      sum += octave;
    }
    assertThat(sum)
        .as("seed %d", seed)
        .isCloseTo(OverallLevel.linearMeanSquare(thirds), within(1e-13));
  }

  @Test
  void aMissingThirdMakesItsOctaveMissingAndNoOther() {
    double[] levels = BandSpectrum.constant(40.0).toArray();
    levels[Bands.position("5000")] = Double.NaN;
    double[] octaves = Octaves.levels(BandSpectrum.of(levels));
    for (int j = 0; j < Octaves.COUNT; j++) {
      assertThat(Double.isNaN(octaves[j]))
          .as("octave %s", Octaves.label(j))
          .isEqualTo(Octaves.label(j).equals("4000"));
    }
  }

  @Test
  void refusesWhatIsNoOctave() {
    assertThat(Octaves.position("16000")).isEqualTo(-1);
    assertThatThrownBy(() -> Octaves.middleThird(9)).isInstanceOf(IndexOutOfBoundsException.class);
    assertThatThrownBy(() -> Octaves.middleThird(-1)).isInstanceOf(IndexOutOfBoundsException.class);
    assertThatThrownBy(() -> Octaves.meanSquares(new double[9]))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("28");
  }
}
