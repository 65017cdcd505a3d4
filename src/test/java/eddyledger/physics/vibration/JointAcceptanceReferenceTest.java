package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import eddyledger.physics.wallpressure.ButterworthCrossSpectrum;
import eddyledger.physics.wallpressure.ExponentialTerms;
import java.util.stream.Stream;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Joint acceptance in closed form against values and against quadrature.
 *
 * <p>Sources: {@code reference/joint-acceptance.json}, independent computation of the published
 * formula (J_m by 30-digit quadrature; arguments and values printed to 12 digits, so 1e-10 beside a
 * pole; joint acceptances dimensionless), relative tolerance 1e-7; and composite Gauss-Legendre
 * quadrature by Commons Math of the autocorrelation form, relative 1e-10 for order 1 and 1e-7 for
 * higher orders, whose terms cancel.
 */
class JointAcceptanceReferenceTest {

  static Stream<JsonNode> integrals() {
    return Reference.read("joint-acceptance.json").get("J1").valueStream();
  }

  @ParameterizedTest
  @MethodSource("integrals")
  void modeIntegral(JsonNode value) {
    double re = value.get("J").get(0).asDouble();
    double im = value.get("J").get(1).asDouble();
    double[] found =
        JointAcceptance.integral(
            value.get("m").asInt(),
            value.get("z").get(0).asDouble(),
            value.get("z").get(1).asDouble());
    double size = Math.hypot(re, im);
    assertThat(found[0]).isCloseTo(re, within(1e-10 * size));
    assertThat(found[1]).isCloseTo(im, within(1e-10 * size));
  }

  static Stream<JsonNode> acceptances() {
    return Reference.read("joint-acceptance.json").get("joint_acceptance").valueStream();
  }

  @ParameterizedTest
  @MethodSource("acceptances")
  void jointAcceptance(JsonNode value) {
    ButterworthCrossSpectrum spectrum =
        new ButterworthCrossSpectrum(
            value.get("order_x").asInt(),
            value.get("order_y").asInt(),
            value.get("alpha_x").asDouble(),
            value.get("alpha_y").asDouble());
    double omega = 2.0 * Math.PI * value.get("f").asDouble();
    double speed = value.get("Uc").asDouble();
    int m = value.get("m").asInt();
    int n = value.get("n").asInt();
    double along =
        JointAcceptance.of(spectrum.alongFlow(omega, speed), value.get("a").asDouble(), m);
    double across =
        JointAcceptance.of(spectrum.acrossFlow(omega, speed), value.get("b").asDouble(), n);
    double jx = value.get("jx").asDouble();
    double jy = value.get("jy").asDouble();
    assertThat(along).isCloseTo(jx, within(1e-7 * jx));
    assertThat(across).isCloseTo(jy, within(1e-7 * jy));
    assertThat(along * across).isCloseTo(value.get("j2").asDouble(), within(2e-7 * jx * jy));
  }

  @ParameterizedTest(name = "order {0}, mode {1}, {2} Hz, {3} m/s")
  @CsvSource({
    "1, 1, 100, 28", "1, 7, 1000, 28", "1, 30, 4000, 160", "2, 1, 50, 28", "2, 12, 900, 60",
    "2, 3, 3000, 200", "3, 5, 400, 28", "3, 26, 800, 56", "4, 9, 500, 40", "5, 4, 250, 100",
  })
  void autocorrelationByQuadrature(int order, int mode, double frequency, double speed) {
    double length = 0.9;
    ExponentialTerms terms =
        new ButterworthCrossSpectrum(order, 1, 0.116, 0.7)
            .alongFlow(2.0 * Math.PI * frequency, speed);
    double pole = mode * Math.PI;
    int pieces = 400;
    double sum = 0.0;
    for (int i = 0; i < pieces; i++) {
      GaussIntegrator rule =
          new GaussIntegratorFactory().legendre(20, i / (double) pieces, (i + 1.0) / pieces);
      sum +=
          rule.integrate(
              u ->
                  ((1.0 - u) * Math.cos(pole * u) + Math.sin(pole * u) / pole)
                      * terms.coherence(u * length)
                      * Math.cos(terms.wavenumber() * length * u));
    }
    double tolerance = order == 1 ? 1e-10 : 1e-7;
    assertThat(JointAcceptance.of(terms, length, mode)).isCloseTo(sum, within(tolerance * sum));
  }
}
