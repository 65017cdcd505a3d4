package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import eddyledger.quantity.Bands;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Slices fill the bands without gap or overlap. */
class BandSlicesTest {

  @ParameterizedTest
  @ValueSource(ints = {1, 5, 6, 12})
  void slicesFollowOneAnotherInEqualRatios(int perBand) {
    BandSlices slices = new BandSlices(perBand);
    assertThat(slices.count()).isEqualTo(28 * perBand);
    assertThat(slices.centres()).hasSize(28 * perBand).isSorted();
    double ratio = Math.pow(10.0, 0.1 / perBand);
    for (int i = 0; i < slices.count(); i++) {
      assertThat(slices.upper(i) / slices.lower(i)).isCloseTo(ratio, within(1e-12));
      assertThat(slices.centre(i)).isCloseTo(slices.lower(i) * Math.sqrt(ratio), within(1e-8));
      if (i + 1 < slices.count()) {
        assertThat(slices.upper(i)).isEqualTo(slices.lower(i + 1));
      }
    }
    for (int band = 0; band < Bands.COUNT; band++) {
      assertThat(slices.lower(band * perBand)).isEqualTo(Bands.lower(band));
      assertThat(slices.upper((band + 1) * perBand - 1)).isCloseTo(Bands.upper(band), within(1e-9));
    }
  }

  @Test
  void theCentresHandedOutAreACopy() {
    BandSlices slices = new BandSlices(6);
    slices.centres()[0] = 1.0;
    assertThat(slices.centre(0)).isGreaterThan(20.0).isEqualTo(slices.centres()[0]);
  }

  @Test
  void higherOrdersNeedFinerSlices() {
    assertThat(BandSlices.forOrder(1).perBand()).isEqualTo(6);
    assertThat(BandSlices.forOrder(2).perBand()).isEqualTo(12);
    assertThat(BandSlices.forOrder(5).perBand()).isEqualTo(12);
    assertThatIllegalArgumentException().isThrownBy(() -> new BandSlices(0));
  }
}
