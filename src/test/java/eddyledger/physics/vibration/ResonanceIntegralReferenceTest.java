package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.stream.Stream;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * The resonance integral, s/rad, against values and quadrature.
 *
 * <p>Sources: {@code reference/resonance-integral.json}, independent computation of the published
 * formula, 12 digits, relative tolerance 1e-10; composite Gauss-Legendre quadrature by Commons Math
 * in pieces narrower than the resonance, relative 1e-11.
 */
class ResonanceIntegralReferenceTest {

  static Stream<JsonNode> values() {
    return Reference.read("resonance-integral.json").get("resonance_integral").valueStream();
  }

  @ParameterizedTest
  @MethodSource("values")
  void spans(JsonNode value) {
    double expected = value.get("value").asDouble();
    assertThat(
            ResonanceIntegral.over(
                value.get("w1").asDouble(),
                value.get("w2").asDouble(),
                value.get("w0").asDouble(),
                value.get("eta").asDouble()))
        .isCloseTo(expected, within(1e-10 * expected));
  }

  @ParameterizedTest
  @CsvSource({
    "900, 1100, 5000, 0.02", "900, 1100, 30000, 0.05", "900, 1100, 100, 0.01", "0, 50, 60, 0.1",
    "999, 1001, 1000, 0.5", "100, 4000, 700, 0.8", "990, 1000, 1000, 0.02",
        "1000, 1010, 1000, 0.01",
  })
  void quadrature(double lower, double upper, double resonance, double lossFactor) {
    int pieces = (int) Math.ceil(4.0 * (upper - lower) / (lossFactor * resonance)) + 4;
    double square = resonance * resonance;
    double sum = 0.0;
    for (int i = 0; i < pieces; i++) {
      double step = (upper - lower) / pieces;
      sum +=
          new GaussIntegratorFactory()
              .legendre(20, lower + i * step, lower + (i + 1) * step)
              .integrate(
                  w -> w * w / (Math.pow(square - w * w, 2) + Math.pow(lossFactor * square, 2)));
    }
    assertThat(ResonanceIntegral.over(lower, upper, resonance, lossFactor))
        .isCloseTo(sum, within(1e-11 * sum));
  }

  @ParameterizedTest
  @CsvSource({"1000, 0.001", "300, 0.1", "7, 1.5"})
  void wholeRange(double resonance, double lossFactor) {
    double far = 1e6 * resonance;
    double whole = ResonanceIntegral.whole(resonance, lossFactor);
    // beyond the far end the integrand is 1/ω²
    double span = ResonanceIntegral.over(0.0, far, resonance, lossFactor) + 1.0 / far;
    assertThat(span).isCloseTo(whole, within(1e-9 * whole));
  }

  @Test
  void argumentsMustMakeSense() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> ResonanceIntegral.over(2.0, 1.0, 1.0, 0.1));
    assertThatIllegalArgumentException()
        .isThrownBy(() -> ResonanceIntegral.over(1.0, 2.0, 1.0, 0.0));
  }
}
