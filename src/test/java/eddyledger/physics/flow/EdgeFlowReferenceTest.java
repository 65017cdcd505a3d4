package eddyledger.physics.flow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.data.Percentage.withPercentage;

import eddyledger.physics.ReferenceFile;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Edge of the boundary layer against the isentropic relations of Liepmann and Roshko, "Elements of
 * Gasdynamics" (1957), chapter 2.
 *
 * <p>{@code edge.csv} and {@code sonic-pressure-coefficient.csv} hold an independent computation,
 * SI, ten digits: 1e-9 relative; 2e-9 on the speed, whose input has ten digits too. The sonic
 * pressure coefficients −1.29, −0.43 and −0.30 at M 0.6, 0.8 and 0.85 stand in textbook charts.
 */
class EdgeFlowReferenceTest {
  private static final double TEN_DIGITS = 2e-7;

  static List<double[]> edges() {
    return ReferenceFile.csv("flow/edge.csv");
  }

  static List<double[]> sonicPoints() {
    return ReferenceFile.csv("flow/sonic-pressure-coefficient.csv");
  }

  @ParameterizedTest
  @MethodSource("edges")
  void agreesWithIndependentComputation(double[] row) {
    AirState air = StandardAtmosphere.at(row[0], 0.0);
    EdgeFlow edge = EdgeFlow.fromPressureCoefficient(air, row[1], row[2]);
    assertThat(edge.speed()).isCloseTo(row[4], withPercentage(TEN_DIGITS));
    assertThat(edge.air().temperature()).isCloseTo(row[5], withPercentage(TEN_DIGITS));
    assertThat(edge.air().pressure()).isCloseTo(row[6], withPercentage(TEN_DIGITS));
    assertThat(edge.air().density()).isCloseTo(row[7], withPercentage(TEN_DIGITS));
    assertThat(edge.mach()).isCloseTo(row[8], withPercentage(TEN_DIGITS));
  }

  @ParameterizedTest
  @MethodSource("edges")
  void incompressibleAgreesWithIndependentComputation(double[] row) {
    AirState air = StandardAtmosphere.at(row[0], 0.0);
    EdgeFlow edge = EdgeFlow.incompressible(air, row[1], row[2]);
    assertThat(edge.speed()).isCloseTo(row[3], withPercentage(TEN_DIGITS));
    assertThat(edge.air()).isEqualTo(air);
  }

  @ParameterizedTest
  @MethodSource("sonicPoints")
  void sonicPointAgreesWithIndependentComputation(double[] row) {
    assertThat(IsentropicFlow.sonicPressureCoefficient(row[0]))
        .isCloseTo(row[1], withPercentage(TEN_DIGITS));
  }

  @ParameterizedTest
  @CsvSource({
    "-0.6, 306.280, 299.930, 1.0806",
    "-0.3, 271.972, 270.353, 0.9367",
    "0.0, 237.116, 237.116, 0.8",
    "0.3, 200.273, 198.385, 0.6636"
  })
  void cruiseAtMachPointEight(double cp, double speed, double incompressible, double mach) {
    AirState air = StandardAtmosphere.at(10_700.0, 0.0);
    double freeStream = 0.8 * air.soundSpeed();
    EdgeFlow edge = EdgeFlow.fromPressureCoefficient(air, freeStream, cp);
    assertThat(edge.speed()).isCloseTo(speed, within(0.6e-3));
    assertThat(edge.mach()).isCloseTo(mach, within(0.6e-4));
    assertThat(EdgeFlow.incompressible(air, freeStream, cp).speed())
        .isCloseTo(incompressible, within(0.6e-3));
  }
}
