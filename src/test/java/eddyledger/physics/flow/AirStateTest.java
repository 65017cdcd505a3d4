package eddyledger.physics.flow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class AirStateTest {
  private static final BoundaryLayerInput LAYER = BoundaryLayerInput.ofRunningLength(5.0);

  @Test
  void impedanceIsDensityTimesSoundSpeed() {
    AirState air = new AirState(295.0, 81_000.0);
    assertThat(air.characteristicImpedance()).isEqualTo(air.density() * air.soundSpeed());
    assertThat(air.kinematicViscosity()).isEqualTo(air.dynamicViscosity() / air.density());
  }

  @Test
  void outsideAndCabinAirAreIndependentOfTheOrderOfComputation() {
    AirState outside = StandardAtmosphere.at(10_700.0, 0.0);
    AirState cabin = new AirState(295.0, 81_000.0);
    BoundaryLayer outsideFirst = layer(outside);
    BoundaryLayer cabinSecond = layer(cabin);
    BoundaryLayer cabinFirst = layer(new AirState(295.0, 81_000.0));
    BoundaryLayer outsideSecond = layer(StandardAtmosphere.at(10_700.0, 0.0));
    assertThat(outsideSecond).isEqualTo(outsideFirst);
    assertThat(cabinFirst).isEqualTo(cabinSecond);
    assertThat(cabin.characteristicImpedance())
        .isGreaterThan(2 * outside.characteristicImpedance());
  }

  private static BoundaryLayer layer(AirState air) {
    return BoundaryLayerCompletion.complete(EdgeFlow.of(air, 200.0), LAYER);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.0, -1.0, Double.NaN, Double.POSITIVE_INFINITY})
  void refusesWhatIsNoAir(double value) {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new AirState(value, 101_325.0))
        .withMessageContaining("temperature");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new AirState(288.15, value))
        .withMessageContaining("pressure");
  }
}
