package eddyledger.physics.flow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.data.Percentage.withPercentage;

import eddyledger.physics.Remark;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class EdgeFlowTest {
  private static final AirState SEA = StandardAtmosphere.at(0.0, 0.0);

  static LongStream seeds() {
    // spread out, because the first draws of neighbouring seeds are alike
    return LongStream.range(0, 40).map(i -> i * 0x9E3779B97F4A7C15L);
  }

  /** A random free stream and pressure coefficient inside its limits. */
  private record Draw(AirState air, double speed, double pressureCoefficient) {
    static Draw of(long seed) {
      Random random = new Random(seed);
      AirState air = StandardAtmosphere.at(20_000.0 * random.nextDouble(), 0.0);
      double mach = Math.pow(10.0, -3.0 + 3.1 * random.nextDouble());
      double low = Math.max(-3.0, 0.9 * IsentropicFlow.vacuumPressureCoefficient(mach));
      double high = 0.99 * IsentropicFlow.stagnationPressureCoefficient(mach);
      double cp = low + (high - low) * random.nextDouble();
      return new Draw(air, mach * air.soundSpeed(), cp);
    }

    EdgeFlow edge() {
      return EdgeFlow.fromPressureCoefficient(air, speed, pressureCoefficient);
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void keepsTotalEnthalpyAndEntropy(long seed) {
    Draw draw = Draw.of(seed);
    EdgeFlow edge = draw.edge();
    double heat = 3.5 * AirState.GAS_CONSTANT;
    double before = heat * draw.air.temperature() + 0.5 * draw.speed * draw.speed;
    double after = heat * edge.air().temperature() + 0.5 * edge.speed() * edge.speed();
    assertThat(after).as("enthalpy, seed %d", seed).isCloseTo(before, withPercentage(1e-11));
    assertThat(edge.air().pressure() / Math.pow(edge.air().density(), 1.4))
        .as("entropy, seed %d", seed)
        .isCloseTo(draw.air.pressure() / Math.pow(draw.air.density(), 1.4), withPercentage(1e-11));
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void theThreeWaysAgree(long seed) {
    Draw draw = Draw.of(seed);
    EdgeFlow edge = draw.edge();
    double ratio = edge.speed() / draw.speed;
    for (EdgeFlow other :
        new EdgeFlow[] {
          EdgeFlow.fromSpeed(draw.air, draw.speed, edge.speed()),
          EdgeFlow.fromSpeedRatio(draw.air, draw.speed, ratio)
        }) {
      assertThat(other.speed()).as("seed %d", seed).isCloseTo(edge.speed(), withPercentage(1e-12));
      assertThat(other.air().temperature())
          .as("seed %d", seed)
          .isCloseTo(edge.air().temperature(), withPercentage(1e-10));
      assertThat(other.air().pressure())
          .as("seed %d", seed)
          .isCloseTo(edge.air().pressure(), withPercentage(1e-10));
    }
  }

  @ParameterizedTest
  @ValueSource(doubles = {1e-9, 1e-6, 1e-4, 1e-3, 0.0099, 0.0101})
  void keepsItsDigitsAtVerySmallMach(double mach) {
    double speed = mach * SEA.soundSpeed();
    double ratio = EdgeFlow.fromPressureCoefficient(SEA, speed, -0.5).speed() / speed;
    // expanded in M²: (U_e/U)² = 1 − C_p + M² C_p²/4 + ...
    double expected = Math.sqrt(1.5 + 0.25 * mach * mach * 0.25);
    assertThat(ratio).isCloseTo(expected, withPercentage(100.0 * (1e-14 + Math.pow(mach, 4))));
  }

  @Test
  void refusesPressureCoefficientsThatNoFlowReaches() {
    double speed = 0.8 * SEA.soundSpeed();
    double vacuum = IsentropicFlow.vacuumPressureCoefficient(0.8);
    double stagnation = IsentropicFlow.stagnationPressureCoefficient(0.8);
    for (double cp : new double[] {vacuum - 1e-6, stagnation + 1e-6, Double.NaN}) {
      assertThatIllegalArgumentException()
          .isThrownBy(() -> EdgeFlow.fromPressureCoefficient(SEA, speed, cp))
          .withMessageContaining("pressure coefficient")
          .withMessageContaining("vacuum")
          .withMessageContaining("stagnation");
    }
    assertThat(EdgeFlow.fromPressureCoefficient(SEA, speed, stagnation - 1e-6).speed())
        .isLessThan(0.01 * speed);
    assertThat(EdgeFlow.fromPressureCoefficient(SEA, speed, vacuum + 1e-6).mach())
        .isGreaterThan(5.0);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> EdgeFlow.incompressible(SEA, 40.0, 1.0))
        .withMessageContaining("pressure coefficient");
  }

  @Test
  void refusesSpeedsPastTheVacuumLimit() {
    double speed = 0.8 * SEA.soundSpeed();
    double limit = Math.sqrt(1.0 + 5.0 / 0.64);
    assertThatIllegalArgumentException()
        .isThrownBy(() -> EdgeFlow.fromSpeedRatio(SEA, speed, limit * (1 + 1e-9)))
        .withMessageContaining("vacuum limit");
    assertThat(EdgeFlow.fromSpeedRatio(SEA, speed, limit * (1 - 1e-6)).mach()).isGreaterThan(100.0);
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.0, -40.0, Double.NaN, Double.POSITIVE_INFINITY})
  void refusesSpeedsThatAreNoFlow(double speed) {
    assertThatIllegalArgumentException().isThrownBy(() -> EdgeFlow.fromSpeed(SEA, speed, 40.0));
    assertThatIllegalArgumentException().isThrownBy(() -> EdgeFlow.fromSpeed(SEA, 40.0, speed));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> EdgeFlow.fromPressureCoefficient(SEA, speed, 0.0));
    assertThatIllegalArgumentException().isThrownBy(() -> EdgeFlow.incompressible(SEA, speed, 0.0));
    assertThatIllegalArgumentException().isThrownBy(() -> EdgeFlow.of(SEA, speed));
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.6, 0.8, 0.85, 0.95})
  void remarksTheLocalSonicPoint(double mach) {
    double speed = mach * SEA.soundSpeed();
    double sonic = IsentropicFlow.sonicPressureCoefficient(mach);
    EdgeFlow past = EdgeFlow.fromPressureCoefficient(SEA, speed, sonic - 1e-6);
    EdgeFlow before = EdgeFlow.fromPressureCoefficient(SEA, speed, sonic + 1e-6);
    assertThat(before.remarks()).isEmpty();
    assertThat(past.remarks()).hasSize(1);
    assertThat(past.remarks().get(0).kind()).isEqualTo(Remark.Kind.OUT_OF_RANGE);
    assertThat(past.remarks().get(0).text()).contains("sonic point");
  }

  @Test
  void remarksTheIncompressibleWayAboveItsMach() {
    double sound = SEA.soundSpeed();
    assertThat(EdgeFlow.incompressible(SEA, 0.299 * sound, -0.4).remarks()).isEmpty();
    assertThat(EdgeFlow.incompressible(SEA, 0.301 * sound, -0.4).remarks())
        .singleElement()
        .satisfies(remark -> assertThat(remark.kind()).isEqualTo(Remark.Kind.OUT_OF_RANGE));
  }
}
