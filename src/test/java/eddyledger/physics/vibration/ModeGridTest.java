package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import eddyledger.quantity.Bands;
import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The modes kept for each band, against counting all of a generous rectangle. */
class ModeGridTest {

  @ParameterizedTest
  @ValueSource(longs = {41, 42, 43, 44, 45, 46, 47, 48})
  void keepsEveryModeUpToTwiceTheBandOrThreeTimesTheLowest(long seed) {
    Random random = new Random(seed);
    Plate plate =
        Plate.isotropic(
                0.15 + random.nextDouble(), 0.15 + random.nextDouble(), 0.002, 71e9, 2780.0, 0.33)
            .withTension(3e4 * random.nextDouble(), 8e4 * random.nextDouble());
    if (seed % 2 == 0) {
      plate = plate.withRadius(71e9, 2780.0, 0.5 + random.nextDouble());
    }
    double lowest = Double.POSITIVE_INFINITY;
    for (int n = 1; n <= 120; n++) {
      lowest = Math.min(lowest, plate.modeFrequency(1, n));
    }
    ModeGrid grid = new ModeGrid(plate);
    assertThat(grid.lowest())
        .as("seed %d", seed)
        .isCloseTo(2.0 * Math.PI * lowest, within(1e-9 * grid.lowest()));
    for (int band = 0; band < Bands.COUNT; band++) {
      double limit = Math.max(2.0 * Bands.upper(band), 3.0 * lowest);
      int expected = 0;
      int inBand = 0;
      for (int m = 1; m <= 120; m++) {
        for (int n = 1; n <= 120; n++) {
          double f = plate.modeFrequency(m, n);
          expected += f <= limit ? 1 : 0;
          inBand += f > Bands.lower(band) && f <= Bands.upper(band) ? 1 : 0;
        }
      }
      assertThat(Arrays.stream(grid.kept(band)).sum()).as("seed %d", seed).isEqualTo(expected);
      assertThat(grid.inBand(band)).as("seed %d", seed).isEqualTo(inBand);
    }
  }

  /** A strongly curved bay: the lowest mode has several half-waves around, not one. */
  @Test
  void theLowestModeOfACurvedBayNeedNotBeTheFirst() {
    Plate bay = Plate.isotropic(0.5, 0.5, 0.001, 71e9, 2780.0, 0.33).withRadius(71e9, 2780.0, 0.5);
    assertThat(new ModeGrid(bay).lowest()).isLessThan(bay.modeAngularFrequency(1, 1));
  }
}
