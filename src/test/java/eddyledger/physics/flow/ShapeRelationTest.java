package eddyledger.physics.flow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.data.Percentage.withPercentage;

import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ShapeRelationTest {
  static LongStream seeds() {
    // spread out, because the first draws of neighbouring seeds are alike
    return LongStream.range(100, 130).map(i -> i * 0x9E3779B97F4A7C15L);
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void anyTwoThicknessesGiveTheThirdBack(long seed) {
    Random random = new Random(seed);
    double momentum = Math.pow(10.0, -5.0 + 4.0 * random.nextDouble());
    double displacement = momentum * (1.05 + 1.2 * random.nextDouble());
    double thickness = ShapeRelation.thickness(displacement, momentum);
    assertThat(ShapeRelation.displacement(thickness, momentum))
        .as("seed %d", seed)
        .isCloseTo(displacement, withPercentage(1e-10));
    assertThat(ShapeRelation.momentum(thickness, displacement))
        .as("seed %d", seed)
        .isCloseTo(momentum, withPercentage(1e-11));
  }

  @Test
  void momentumIsFoundOnBothSidesOfItsTurningPoint() {
    // δ/δ* − 1 crosses the constant 3.15 at H about 2.1, where the two ways to write the root meet
    for (double shape : new double[] {1.9, 2.0, 2.05, 2.1, 2.5, 4.0}) {
      double thickness = ShapeRelation.thickness(shape, 1.0);
      assertThat(ShapeRelation.momentum(thickness, shape)).isCloseTo(1.0, withPercentage(1e-11));
    }
  }

  @Test
  void refusesPairsThatNoLayerHas() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> ShapeRelation.thickness(1.0, 1.0))
        .withMessageContaining("momentum thickness");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> ShapeRelation.displacement(6.76, 1.0))
        .withMessageContaining("no attached boundary layer");
    assertThatIllegalArgumentException()
        .isThrownBy(() -> ShapeRelation.momentum(1.0, 1.0))
        .withMessageContaining("displacement thickness");
    assertThat(ShapeRelation.displacement(6.78, 1.0)).isBetween(2.2, 2.32);
  }
}
