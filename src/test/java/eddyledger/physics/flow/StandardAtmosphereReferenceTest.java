package eddyledger.physics.flow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.data.Percentage.withPercentage;

import eddyledger.physics.ReferenceFile;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The atmosphere against ISO 2533:1975, Standard Atmosphere.
 *
 * <p>{@code isa.csv} and {@code geopotential.csv} hold an independent computation of the standard's
 * formulas, SI, ten digits: 1e-9 relative. The table of 1, 11 and 20 km is printed by the
 * documentation of several public toolboxes: half a unit of the last digit printed.
 */
class StandardAtmosphereReferenceTest {
  private static final double TEN_DIGITS = 1e-7;

  static List<double[]> levels() {
    return ReferenceFile.csv("flow/isa.csv");
  }

  static List<double[]> heights() {
    return ReferenceFile.csv("flow/geopotential.csv");
  }

  @ParameterizedTest
  @MethodSource("levels")
  void agreesWithIndependentComputation(double[] row) {
    AirState air = StandardAtmosphere.at(row[0], 0.0);
    assertThat(air.temperature()).isCloseTo(row[1], withPercentage(TEN_DIGITS));
    assertThat(air.pressure()).isCloseTo(row[2], withPercentage(TEN_DIGITS));
    assertThat(air.density()).isCloseTo(row[3], withPercentage(TEN_DIGITS));
    assertThat(air.soundSpeed()).isCloseTo(row[4], withPercentage(TEN_DIGITS));
    assertThat(air.dynamicViscosity()).isCloseTo(row[5], withPercentage(TEN_DIGITS));
    assertThat(air.kinematicViscosity()).isCloseTo(row[6], withPercentage(TEN_DIGITS));
  }

  @ParameterizedTest
  @CsvSource({
    "1000, 336.4340, 89875, 1.1116",
    "11000, 295.0695, 22632, 0.3639",
    "20000, 295.0695, 5475, 0.0880"
  })
  void agreesWithPrintedTable(double altitude, double soundSpeed, double pressure, double density) {
    AirState air = StandardAtmosphere.at(altitude, 0.0);
    assertThat(air.soundSpeed()).isCloseTo(soundSpeed, within(0.5e-4));
    assertThat(air.pressure()).isCloseTo(pressure, within(0.5));
    assertThat(air.density()).isCloseTo(density, within(0.5e-4));
  }

  @ParameterizedTest
  @MethodSource("heights")
  void geopotentialAgreesWithIndependentComputation(double[] row) {
    assertThat(StandardAtmosphere.geopotential(row[0]))
        .isCloseTo(row[1], withPercentage(TEN_DIGITS));
  }

  @Test
  void anotherDayKeepsThePressure() {
    AirState standard = StandardAtmosphere.at(3000.0, 0.0);
    AirState hot = StandardAtmosphere.at(3000.0, 15.0);
    assertThat(hot.pressure()).isEqualTo(standard.pressure());
    assertThat(hot.temperature()).isCloseTo(standard.temperature() + 15.0, within(1e-12));
    assertThat(hot.density() * hot.temperature())
        .isCloseTo(standard.density() * standard.temperature(), withPercentage(1e-10));
  }

  @ParameterizedTest
  @ValueSource(doubles = {-0.001, 20000.001, Double.NaN, Double.POSITIVE_INFINITY})
  void refusesAltitudesOutsideTheRange(double altitude) {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> StandardAtmosphere.at(altitude, 0.0))
        .withMessageContaining("0 to 20000 m");
  }

  @Test
  void refusesAnOffsetThatLeavesNoAir() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> StandardAtmosphere.at(0.0, -300.0))
        .withMessageContaining("temperature");
  }
}
