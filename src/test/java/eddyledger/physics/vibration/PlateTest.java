package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Limits and laws of the plate. */
class PlateTest {

  @ParameterizedTest
  @ValueSource(doubles = {0.0, -1.0, Double.NaN, Double.POSITIVE_INFINITY})
  void sizesAndMassMustBePositive(double bad) {
    assertThatIllegalArgumentException().isThrownBy(() -> Plate.uniform(bad, 1.0, 1.0, 1.0));
    assertThatIllegalArgumentException().isThrownBy(() -> Plate.uniform(1.0, bad, 1.0, 1.0));
    assertThatIllegalArgumentException().isThrownBy(() -> Plate.uniform(1.0, 1.0, bad, 1.0));
    assertThatIllegalArgumentException().isThrownBy(() -> Plate.uniform(1.0, 1.0, 1.0, bad));
    assertThatIllegalArgumentException().isThrownBy(() -> new FluidFace(bad, 343.0));
    assertThatIllegalArgumentException().isThrownBy(() -> new FluidFace(1.2, bad));
  }

  @Test
  void compressionAndImpossiblePoissonRatioAreRefused() {
    Plate plate = Plate.uniform(1.0, 1.0, 1.0, 1.0);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> plate.withTension(-1.0, 0.0))
        .withMessageContaining("tension along");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Plate.isotropic(1.0, 1.0, 0.001, 70e9, 2700.0, 1.0))
        .withMessageContaining("Poisson");
  }

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void tensionAndCurvatureOnlyEverLiftModes(long seed) {
    Random random = new Random(seed);
    Plate flat = Plate.isotropic(0.2 + random.nextDouble(), 0.3, 0.0012, 71e9, 2780.0, 0.33);
    Plate tense = flat.withTension(1e4 * random.nextDouble(), 1e4 * random.nextDouble());
    Plate curved = tense.withRadius(71e9, 2780.0, 1.0 + random.nextDouble());
    for (int m = 1; m < 8; m++) {
      for (int n = 1; n < 8; n++) {
        assertThat(tense.modeFrequency(m, n))
            .as("seed %d", seed)
            .isGreaterThan(flat.modeFrequency(m, n));
        assertThat(curved.modeFrequency(m, n))
            .as("seed %d", seed)
            .isGreaterThan(tense.modeFrequency(m, n));
      }
    }
  }

  /** A membrane in the limit: ω² = N k²/m''. */
  @Test
  void limpSheetUnderTensionIsAMembrane() {
    Plate sheet = Plate.uniform(0.8, 0.6, 1e-9, 0.5).withTension(200.0, 200.0);
    double kx = 2.0 * Math.PI / 0.8;
    double ky = 3.0 * Math.PI / 0.6;
    assertThat(sheet.modeAngularFrequency(2, 3))
        .isCloseTo(Math.sqrt(200.0 * (kx * kx + ky * ky) / 0.5), Percentage.withPercentage(1e-6));
  }

  /** Turning an orthotropic plate by a right angle swaps the meaning of m and n. */
  @Test
  void turnedPlateHasTheSameModes() {
    Plate plate = new Plate(0.9, 0.5, 40.0, 25.0, 10.0, 5.0, 100.0, 300.0, 0.0);
    Plate turned = new Plate(0.5, 0.9, 10.0, 25.0, 40.0, 5.0, 300.0, 100.0, 0.0);
    assertThat(plate.modeFrequency(3, 2)).isCloseTo(turned.modeFrequency(2, 3), within(1e-9));
    assertThat(plate.modalDensity()).isCloseTo(turned.modalDensity(), within(1e-15));
  }

  /** D = √(Dx Dy) counts modes of an orthotropic plate right when H is that mean too. */
  @Test
  void modeCountHoldsForOrthotropicPlates() {
    Plate plate = new Plate(1.1, 0.8, 400.0, 200.0, 100.0, 10.0, 0.0, 0.0, 0.0);
    double limit = 4000.0;
    int count = 0;
    for (int m = 1; m < 120; m++) {
      for (int n = 1; n < 120; n++) {
        count += plate.modeFrequency(m, n) <= limit ? 1 : 0;
      }
    }
    assertThat(plate.modeCountBelow(limit)).isCloseTo(count, Percentage.withPercentage(3.0));
    assertThat(plate.modeCountBelow(0.0)).isEqualTo(0.25);
  }

  /** A mode that is almost uniform around the cylinder rings at √(E/ρ)/(2πR). */
  @Test
  void curvatureGivesTheRingFrequency() {
    Plate limp = Plate.uniform(0.01, 100.0, 1e-9, 1.0);
    double ring = Math.sqrt(71e9 / 2780.0) / (2.0 * Math.PI * 1.5);
    assertThat(limp.withRadius(71e9, 2780.0, 1.5).modeFrequency(1, 1))
        .isCloseTo(ring, Percentage.withPercentage(1e-3));
  }
}
