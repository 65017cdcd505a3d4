package eddyledger.physics.path;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Decibels;
import java.util.Arrays;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Insertion loss on radiated power. */
class InsertionLossTest {
  @ParameterizedTest
  @CsvSource({"0, 1.0", "10, 0.1", "30, 0.001", "-10, 10.0", "-3.010299956639812, 2.0"})
  void dividesThePowerAndIsNeverClipped(double loss, double ratio) {
    assertThat(InsertionLoss.power(2e-6, loss)).isCloseTo(2e-6 * ratio, within(1e-18));
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void levelsOfPowerFallByTheLossBandByBand(long seed) {
    Random random = new Random(seed);
    double[] bare = random.doubles(Bands.COUNT, 1e-9, 1e-3).toArray();
    BandSpectrum loss = BandSpectrum.of(random.doubles(Bands.COUNT, -12.0, 60.0).toArray());
    double[] treated = InsertionLoss.powers(bare, loss);
    for (int i = 0; i < Bands.COUNT; i++) {
      assertThat(Decibels.powerLevel(bare[i]) - Decibels.powerLevel(treated[i]))
          .as("seed %d, band %s", seed, Bands.label(i))
          .isCloseTo(loss.value(i), within(1e-10));
    }
  }

  @Test
  void aMissingLossMakesThePowerMissing() {
    double[] bare = new double[Bands.COUNT];
    Arrays.fill(bare, 1e-6);
    double[] loss = BandSpectrum.constant(6.0).toArray();
    loss[9] = Double.NaN;
    double[] treated = InsertionLoss.powers(bare, BandSpectrum.of(loss));
    assertThat(treated[9]).isNaN();
    assertThat(treated[8]).isPositive();
  }

  @Test
  void refusesAnotherNumberOfBands() {
    assertThatThrownBy(() -> InsertionLoss.powers(new double[9], BandSpectrum.constant(0.0)))
        .isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining("28");
  }
}
