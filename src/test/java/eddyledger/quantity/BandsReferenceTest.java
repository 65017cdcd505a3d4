package eddyledger.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Band frequencies against IEC 61260-1:2014 (base-ten system, exact mid-band and band-edge
 * frequencies), in Hz, printed to five digits: tolerance half a unit of the fifth digit, 5e-5
 * relative at most. The octave ratio of that standard, G = 10^0.3 (its equation 1), to rounding.
 */
class BandsReferenceTest {
  private static final double FIVE_DIGITS = 5e-5;
  private static final double OCTAVE_RATIO = 1.995262315;

  @ParameterizedTest
  @CsvFileSource(resources = "/reference/third-octave-bands.csv", useHeadersInDisplayName = true)
  void midBandsAndEdges(String label, double mid, double lower, double upper) {
    int i = Bands.position(label);
    assertThat(i).isNotNegative();
    assertThat(Bands.label(i)).isEqualTo(label);
    assertThat(Bands.centre(i)).isCloseTo(mid, within(FIVE_DIGITS * mid));
    assertThat(Bands.lower(i)).isCloseTo(lower, within(FIVE_DIGITS * lower));
    assertThat(Bands.upper(i)).isCloseTo(upper, within(FIVE_DIGITS * upper));
  }

  @ParameterizedTest
  @CsvSource({"0, -16, 25.118864315", "16, 0, 1000.0", "22, 6, 3981.0717055", "26, 10, 10000.0"})
  void midBandIsAPowerOfTen(int position, int index, double mid) {
    assertThat(Bands.index(position)).isEqualTo(index);
    assertThat(Bands.centre(position)).isCloseTo(mid, within(1e-10 * mid));
    assertThat(Bands.centres()[position]).isEqualTo(Bands.centre(position));
  }

  @Test
  void threeBandsMakeAnOctave() {
    for (int i = 3; i < Bands.COUNT; i++) {
      assertThat(Bands.centre(i) / Bands.centre(i - 3))
          .as("band %s", Bands.label(i))
          .isCloseTo(OCTAVE_RATIO, within(1e-9));
    }
  }

  @Test
  void bandsTouchWithoutGap() {
    for (int i = 1; i < Bands.COUNT; i++) {
      assertThat(Bands.lower(i)).as("band %s", Bands.label(i)).isEqualTo(Bands.upper(i - 1));
    }
  }

  @Test
  void anUnknownLabelHasNoPosition() {
    assertThat(Bands.position("16000")).isEqualTo(-1);
    assertThat(Bands.labels()).hasSize(Bands.COUNT).doesNotHaveDuplicates();
  }
}
