package eddyledger.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;

/** A band spectrum keeps what it was given, and a missing band stays missing. */
class BandSpectrumTest {
  @Test
  void isIndependentOfTheArraysAroundIt() {
    double[] values = BandSpectrum.constant(1.0).toArray();
    BandSpectrum spectrum = BandSpectrum.of(values);
    values[3] = 2.0;
    spectrum.toArray()[4] = 3.0;
    assertThat(spectrum).isEqualTo(BandSpectrum.constant(1.0));
    assertThat(spectrum).hasSameHashCodeAs(BandSpectrum.constant(1.0));
  }

  @Test
  void aMissingBandStaysMissing() {
    double[] values = BandSpectrum.constant(1.0).toArray();
    values[5] = Double.NaN;
    // a function that would turn a missing value into a number must not get to see it
    BandSpectrum mapped = BandSpectrum.of(values).map(value -> Double.isNaN(value) ? 0.0 : 2.0);
    assertThat(mapped.has(5)).isFalse();
    assertThat(mapped.complete()).isFalse();
    assertThat(mapped.has(4)).isTrue();
    assertThat(mapped.value(4)).isEqualTo(2.0);
  }

  @Test
  void refusesAnotherNumberOfBandsAndInfinity() {
    assertThatThrownBy(() -> BandSpectrum.of(1.0, 2.0))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("28");
    assertThatThrownBy(() -> BandSpectrum.constant(Double.NEGATIVE_INFINITY))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("infinite");
  }
}
