package eddyledger.physics.flow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.data.Percentage.withPercentage;

import com.fasterxml.jackson.databind.JsonNode;
import eddyledger.physics.ReferenceFile;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Boundary layers against independent values and against other friction laws.
 *
 * <p>{@code boundary-layers.json} (compressible, from the running length) and {@code
 * completion.json} (incompressible, from any quantity) hold an independent computation of Coles's
 * law with wake, White's friction, Eckert's reference temperature, the relation of Drela and Giles
 * and the friction of Ludwieg and Tillmann; SI, ten digits: 1e-8 relative, because friction enters
 * an exponential. The cruise case is printed to three or four digits. Friction at given Re_θ is
 * compared with H. M. Nagib, K. A. Chauhan, P. A. Monkewitz, Phil. Trans. R. Soc. A 365 (2007) 755
 * and with the Kármán-Schoenherr formula; published laws differ among themselves by about 8 %.
 */
class BoundaryLayerReferenceTest {
  private static final double TOLERANCE = 1e-6;

  static List<JsonNode> layers() {
    return ReferenceFile.list(ReferenceFile.json("flow/boundary-layers.json").get("cases"));
  }

  static List<JsonNode> completions() {
    return ReferenceFile.list(ReferenceFile.json("flow/completion.json").get("cases"));
  }

  @ParameterizedTest
  @MethodSource("layers")
  void compressibleLayerFromRunningLength(JsonNode node) {
    AirState air = StandardAtmosphere.at(node.get("H").asDouble(), 0.0);
    EdgeFlow edge =
        EdgeFlow.fromPressureCoefficient(air, node.get("U").asDouble(), node.get("cp").asDouble());
    BoundaryLayer layer =
        BoundaryLayerCompletion.complete(
            edge, BoundaryLayerInput.ofRunningLength(node.get("x").asDouble()));
    JsonNode state = node.get("state");
    check(layer.edgeSpeed(), state, "Ue");
    check(layer.edge().air().density(), state, "rhoe");
    check(layer.edge().mach(), state, "Me");
    check(layer.wallDensity(), state, "rhow");
    check(layer.wallKinematicViscosity(), state, "nuw");
    check(layer.thickness(), state, "delta");
    check(layer.displacementThickness(), state, "dstar");
    check(layer.momentumThickness(), state, "theta");
    check(layer.compressibleDisplacementThickness(), state, "dstar_c");
    check(layer.wallShearStress(), state, "tau_w");
    check(layer.frictionVelocity(), state, "u_tau");
    check(layer.dynamicPressure(), state, "q");
    check(layer.skinFriction(), state, "Cf");
    check(layer.frictionReynolds(), state, "Re_tau");
    check(layer.momentumReynolds(), state, "Re_theta");
    check(layer.timeScaleRatio(), state, "R_T");
    assertThat(layer.runningLength()).isEqualTo(OptionalDouble.of(node.get("x").asDouble()));
  }

  @Test
  void cruiseAtMachPointEight() {
    AirState air = StandardAtmosphere.at(10_700.0, 0.0);
    BoundaryLayer layer =
        BoundaryLayerCompletion.complete(
            EdgeFlow.of(air, 0.8 * air.soundSpeed()), BoundaryLayerInput.ofRunningLength(5.0));
    assertThat(layer.thickness()).isCloseTo(68.9e-3, within(0.06e-3));
    assertThat(layer.displacementThickness()).isCloseTo(8.07e-3, within(0.006e-3));
    assertThat(layer.compressibleDisplacementThickness()).isCloseTo(8.98e-3, within(0.006e-3));
    assertThat(layer.wallShearStress()).isCloseTo(21.57, within(0.006));
    assertThat(layer.frictionVelocity()).isCloseTo(7.97, within(0.006));
    assertThat(layer.frictionReynolds()).isCloseTo(11907, within(0.6));
  }

  @ParameterizedTest
  @CsvSource({
    "0.3, 6.1, 0.94, 0.69, 3.77",
    "1, 17.6, 2.45, 1.85, 3.11",
    "3, 46.8, 6.01, 4.64, 2.64",
    "20, 262, 29.4, 23.6, 2.03",
    "60, 718, 75.3, 61.3, 1.76"
  })
  void printedTableAt36MetresPerSecond(
      double length, double delta, double displacement, double momentum, double friction) {
    BoundaryLayer layer =
        incompressible(36.0, 1.225, 1.46e-5, BoundaryLayerInput.ofRunningLength(length));
    // three digits printed, the smallest number with two
    assertThat(layer.thickness() * 1e3).isCloseTo(delta, withPercentage(0.9));
    assertThat(layer.displacementThickness() * 1e3).isCloseTo(displacement, withPercentage(0.6));
    assertThat(layer.momentumThickness() * 1e3).isCloseTo(momentum, withPercentage(0.8));
    assertThat(layer.skinFriction() * 1e3).isCloseTo(friction, withPercentage(0.3));
  }

  @ParameterizedTest
  @MethodSource("completions")
  void fillsInAsIndependentComputation(JsonNode node) {
    double speed = node.get("Ue").asDouble();
    double density = node.get("rho").asDouble();
    JsonNode given = node.get("given");
    BoundaryLayerInput input =
        new BoundaryLayerInput(
            number(given, "x"),
            number(given, "delta"),
            number(given, "dstar"),
            number(given, "theta"),
            stress(given, density, speed));
    BoundaryLayer layer = incompressible(speed, density, node.get("nu").asDouble(), input);
    JsonNode result = node.get("result");
    check(layer.thickness(), result, "delta");
    check(layer.displacementThickness(), result, "dstar");
    check(layer.momentumThickness(), result, "theta");
    check(layer.wallShearStress(), result, "tau_w");
  }

  @ParameterizedTest
  @CsvSource({"500, 1271", "2000, 5347", "10000, 27876", "49000, 143757"})
  void frictionLiesAmongPublishedLaws(double frictionReynolds, double momentumReynolds) {
    double momentum = momentumReynolds * 1.46e-5 / 40.0;
    BoundaryLayer layer =
        incompressible(40.0, 1.225, 1.46e-5, BoundaryLayerInput.ofMomentumThickness(momentum));
    double log = Math.log10(momentumReynolds);
    double nagib = 2.0 * Math.pow(Math.log(momentumReynolds) / 0.384 + 4.127, -2.0);
    double schoenherr = 1.0 / (17.08 * log * log + 25.11 * log + 6.012);
    assertThat(layer.skinFriction()).isCloseTo(nagib, withPercentage(9.0));
    assertThat(layer.skinFriction()).isCloseTo(schoenherr, withPercentage(5.0));
    assertThat(layer.frictionReynolds()).isCloseTo(frictionReynolds, withPercentage(6.0));
  }

  private static BoundaryLayer incompressible(
      double speed, double density, double viscosity, BoundaryLayerInput input) {
    AirState air = air(density, viscosity);
    return BoundaryLayerCompletion.complete(EdgeFlow.of(air, speed), LayerAir.uniform(air), input);
  }

  /** The air that has a density and a kinematic viscosity. */
  private static AirState air(double density, double viscosity) {
    double temperature =
        new BracketingNthOrderBrentSolver(1e-15, 1e-12, 0.0, 5)
            .solve(
                200,
                t -> new AirState(t, 1.0).dynamicViscosity() - density * viscosity,
                150.0,
                500.0);
    return new AirState(temperature, density * AirState.GAS_CONSTANT * temperature);
  }

  private static Double number(JsonNode given, String field) {
    return given.has(field) ? (Double) given.get(field).asDouble() : null;
  }

  private static Double stress(JsonNode given, double density, double speed) {
    if (given.has("u_tau")) {
      return density * Math.pow(given.get("u_tau").asDouble(), 2.0);
    }
    return given.has("Cf")
        ? (Double) (0.5 * density * speed * speed * given.get("Cf").asDouble())
        : number(given, "tau_w");
  }

  private static void check(double actual, JsonNode state, String field) {
    assertThat(actual).as(field).isCloseTo(state.get(field).asDouble(), withPercentage(TOLERANCE));
  }
}
