package eddyledger.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** An octave table of losses: exact at octave centres, straight between them, flat outside. */
class OctaveTableTest {
  static LongStream seeds() {
    return LongStream.rangeClosed(1, 40);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void hitsEveryGivenOctaveExactly(long seed) {
    double[] octaves = randomSubset(seed);
    OctaveTable table = OctaveTable.of(octaves);
    BandSpectrum thirds = table.thirds();
    assertThat(thirds.complete()).as("seed %d", seed).isTrue();
    for (int j = 0; j < Octaves.COUNT; j++) {
      int middle = Octaves.middleThird(j);
      boolean given = !Double.isNaN(octaves[j]);
      assertThat(table.given(middle)).as("seed %d", seed).isEqualTo(given);
      assertThat(table.given(middle - 1)).as("seed %d", seed).isFalse();
      if (given) {
        assertThat(thirds.value(middle)).as("seed %d", seed).isEqualTo(octaves[j]);
      }
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void isLinearInLogFrequencyBetweenAndFlatOutside(long seed) {
    double[] octaves = randomSubset(seed);
    BandSpectrum thirds = OctaveTable.of(octaves).thirds();
    for (int i = 0; i < Bands.COUNT; i++) {
      assertThat(thirds.value(i))
          .as("seed %d, band %s", seed, Bands.label(i))
          .isCloseTo(straight(octaves, Bands.centre(i)), within(1e-10));
    }
  }

  @Test
  void aThirdOfTheWayIsAThirdOfTheStep() {
    BandSpectrum thirds = OctaveTable.startingAt("500", -3.0, 6.0).thirds();
    assertThat(thirds.value(Bands.position("500"))).isEqualTo(-3.0);
    assertThat(thirds.value(Bands.position("630"))).isCloseTo(0.0, within(1e-12));
    assertThat(thirds.value(Bands.position("800"))).isCloseTo(3.0, within(1e-12));
    assertThat(thirds.value(Bands.position("1000"))).isEqualTo(6.0);
    assertThat(thirds.value(Bands.position("25"))).isEqualTo(-3.0);
    assertThat(thirds.value(Bands.position("12500"))).isEqualTo(6.0);
  }

  @Test
  void oneValueIsFlat() {
    OctaveTable table = OctaveTable.startingAt("2000", 0.02);
    assertThat(table.thirds()).isEqualTo(BandSpectrum.constant(0.02));
    assertThat(table).isEqualTo(OctaveTable.startingAt("2000", 0.02));
    assertThat(table).isNotEqualTo(OctaveTable.startingAt("1000", 0.02));
  }

  @Test
  void refusesWhatIsNoTable() {
    double[] none = new double[Octaves.COUNT];
    Arrays.fill(none, Double.NaN);
    assertThatThrownBy(() -> OctaveTable.of(none))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("at least one");
    assertThatThrownBy(() -> OctaveTable.of(1.0, 2.0))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("not 2");
    assertThatThrownBy(() -> OctaveTable.startingAt("100", 1.0))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("100");
    assertThatThrownBy(() -> OctaveTable.startingAt("4000", 1.0, 2.0, 3.0))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("8000");
    assertThatThrownBy(() -> OctaveTable.startingAt("4000", Double.POSITIVE_INFINITY))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("infinite");
  }

  /** Straight line in lg f, from the frequencies themselves. */
  private static double straight(double[] octaves, double frequency) {
    double lg = Math.log10(frequency);
    double lgBelow = Double.NaN;
    double below = Double.NaN;
    for (int j = 0; j < Octaves.COUNT; j++) {
      if (Double.isNaN(octaves[j])) {
        continue;
      }
      double lgHere = Math.log10(Octaves.centre(j));
      if (lg <= lgHere) {
        return Double.isNaN(below)
            ? octaves[j]
            : below + (octaves[j] - below) * (lg - lgBelow) / (lgHere - lgBelow);
      }
      lgBelow = lgHere;
      below = octaves[j];
    }
    return below;
  }

  private static double[] randomSubset(long seed) {
    Random random = new Random(seed);
    double[] octaves = new double[Octaves.COUNT];
    int certain = random.nextInt(Octaves.COUNT);
    for (int j = 0; j < Octaves.COUNT; j++) {
      boolean given = j == certain || random.nextBoolean();
      octaves[j] = given ? 60.0 * random.nextDouble() - 10.0 : Double.NaN;
    }
    return octaves;
  }
}
