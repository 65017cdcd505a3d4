package eddyledger.physics.wallpressure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Percentage.withPercentage;

import eddyledger.physics.flow.AirState;
import eddyledger.physics.flow.BoundaryLayer;
import eddyledger.physics.flow.BoundaryLayerCompletion;
import eddyledger.physics.flow.BoundaryLayerInput;
import eddyledger.physics.flow.EdgeFlow;
import eddyledger.physics.flow.StandardAtmosphere;
import eddyledger.quantity.Bands;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** What every wall-pressure spectrum must keep. A model's test extends this and names the model. */
abstract class WallPressureSpectrumContract {
  /** The model under test. */
  abstract WallPressureSpectrum spectrum();

  /** A layer that lies inside the model's range, as far as it states one. */
  abstract BoundaryLayer layerInRange();

  /**
   * Whether the formula is free of constants with a unit, so that it holds in any system of units.
   */
  boolean freeOfUnits() {
    return true;
  }

  static LongStream seeds() {
    // spread out, because the first draws of neighbouring seeds are alike
    return LongStream.range(300, 330).map(i -> i * 0x9E3779B97F4A7C15L);
  }

  static BoundaryLayer layer(double altitude, double speed, double runningLength) {
    AirState air = StandardAtmosphere.at(altitude, 0.0);
    return BoundaryLayerCompletion.complete(
        EdgeFlow.of(air, speed), BoundaryLayerInput.ofRunningLength(runningLength));
  }

  private static BoundaryLayer random(Random random) {
    double altitude = 12_000.0 * random.nextDouble();
    double speed = 20.0 + 220.0 * random.nextDouble();
    return layer(altitude, speed, 0.5 + 20.0 * random.nextDouble());
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void isPositiveAndFiniteInEveryBand(long seed) {
    BoundaryLayer layer = random(new Random(seed));
    for (double frequency : Bands.centres()) {
      assertThat(spectrum().spectralDensity(frequency, layer))
          .as("%.1f Hz, seed %d", frequency, seed)
          .isPositive()
          .isFinite();
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void holdsInAnySystemOfUnits(long seed) {
    if (!freeOfUnits()) {
      return;
    }
    Random random = new Random(seed);
    BoundaryLayer layer = random(random);
    double length = Math.exp(random.nextGaussian());
    double time = Math.exp(random.nextGaussian());
    double mass = Math.exp(random.nextGaussian());
    BoundaryLayer other = LayerStates.inOtherUnits(layer, length, time, mass);
    double pressure = mass / (length * time * time);
    for (double frequency : Bands.centres()) {
      // Pa²/Hz grows as a squared pressure times a time
      assertThat(spectrum().spectralDensity(frequency / time, other))
          .as("%.1f Hz, seed %d", frequency, seed)
          .isCloseTo(
              spectrum().spectralDensity(frequency, layer) * pressure * pressure * time,
              withPercentage(1e-9));
    }
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void twiceTheDensityGivesFourTimesTheMeanSquare(long seed) {
    BoundaryLayer layer = random(new Random(seed));
    BoundaryLayer dense =
        new BoundaryLayer(
            EdgeFlow.of(
                new AirState(layer.edge().air().temperature(), 2.0 * layer.edge().air().pressure()),
                layer.edgeSpeed()),
            layer.thickness(),
            layer.displacementThickness(),
            layer.momentumThickness(),
            layer.compressibleDisplacementThickness(),
            2.0 * layer.wallShearStress(),
            2.0 * layer.wallDensity(),
            layer.wallKinematicViscosity(),
            layer.runningLength(),
            layer.remarks());
    for (double frequency : Bands.centres()) {
      assertThat(spectrum().spectralDensity(frequency, dense))
          .as("%.1f Hz, seed %d", frequency, seed)
          .isCloseTo(4.0 * spectrum().spectralDensity(frequency, layer), withPercentage(1e-10));
    }
  }

  @Test
  void saysNothingInsideItsRange() {
    assertThat(spectrum().remarks(layerInRange())).isEmpty();
  }

  @Test
  void saysWhoItIs() {
    assertThat(spectrum().id()).matches("[a-z0-9][a-z0-9-]*");
    assertThat(WallPressureSpectra.byId(spectrum().id()))
        .hasValueSatisfying(found -> assertThat(found).hasSameClassAs(spectrum()));
    assertThat(spectrum().name()).isNotBlank();
    assertThat(spectrum().source()).containsPattern("(19|20)\\d\\d");
    assertThat(spectrum().confidence()).isNotBlank();
  }
}
