package eddyledger.physics.wallpressure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.data.Percentage.withPercentage;

import com.fasterxml.jackson.databind.JsonNode;
import eddyledger.physics.ReferenceFile;
import eddyledger.quantity.Decibels;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Cross-spectra against Corcos and against independent values.
 *
 * <p>Orders (1, 1) against the formulas of G. M. Corcos, J. Acoust. Soc. Am. 35 (1963) 192, written
 * out here: 1e-13 relative, rounding only. {@code cross-spectra.json}: density m²/rad² and
 * normalised cross-spectrum of five pairs of orders by an independent computation, ten digits: 3e-8
 * relative, because density far from the peak takes a difference of wavenumbers to the eighth
 * power. {@code butterworth-terms.json}: the sums of exponentials, twelve digits: 1e-11. The drop
 * of orders (2, 1) below Corcos at low wavenumber, at the same decay rate, is 16 to 20 dB; common
 * practice knows "about 20 dB", no source.
 */
class ButterworthCrossSpectrumReferenceTest {
  static List<JsonNode> cases() {
    return ReferenceFile.list(ReferenceFile.json("wallpressure/cross-spectra.json").get("cases"));
  }

  static List<JsonNode> terms() {
    return ReferenceFile.list(
        ReferenceFile.json("wallpressure/butterworth-terms.json").get("terms"));
  }

  static LongStream seeds() {
    // spread out, because the first draws of neighbouring seeds are alike
    return LongStream.range(400, 420).map(i -> i * 0x9E3779B97F4A7C15L);
  }

  /** Real and imaginary part of the normalised cross-spectrum at two separations, m. */
  private static double[] cross(
      SeparableCrossSpectrum model, double xi, double eta, double omega, double speed) {
    ExponentialTerms along = model.alongFlow(omega, speed);
    ExponentialTerms across = model.acrossFlow(omega, speed);
    double size = along.coherence(xi) * across.coherence(eta);
    double phase = -along.wavenumber() * xi - across.wavenumber() * eta;
    return new double[] {size * Math.cos(phase), size * Math.sin(phase)};
  }

  private static ButterworthCrossSpectrum model(String orders, JsonNode node) {
    return new ButterworthCrossSpectrum(
        orders.charAt(0) - '0',
        orders.charAt(2) - '0',
        node.get("ax").asDouble(),
        node.get("ay").asDouble());
  }

  @ParameterizedTest
  @MethodSource("seeds")
  void ordersOneOneAreCorcos(long seed) {
    Random random = new Random(seed);
    double ax = 0.05 + 0.2 * random.nextDouble();
    double ay = 0.5 + 0.5 * random.nextDouble();
    double omega = 100.0 * Math.pow(100.0, random.nextDouble());
    double speed = 20.0 + 200.0 * random.nextDouble();
    double kc = omega / speed;
    double xi = random.nextGaussian() / (ax * kc);
    double eta = random.nextGaussian() / (ay * kc);
    double kx = kc * (1.0 + random.nextGaussian());
    double ky = kc * random.nextGaussian();
    ButterworthCrossSpectrum model = new ButterworthCrossSpectrum(1, 1, ax, ay);

    double size = Math.exp(-ax * kc * Math.abs(xi) - ay * kc * Math.abs(eta));
    double[] actual = cross(model, xi, eta, omega, speed);
    assertThat(actual[0]).as("seed %d", seed).isCloseTo(size * Math.cos(kc * xi), within(1e-14));
    assertThat(actual[1]).as("seed %d", seed).isCloseTo(-size * Math.sin(kc * xi), within(1e-14));

    double density =
        ax
            * ay
            * kc
            * kc
            / (Math.PI * Math.PI)
            / (((kx - kc) * (kx - kc) + ax * ax * kc * kc) * (ky * ky + ay * ay * kc * kc));
    assertThat(model.wavenumberDensity(kx, ky, omega, speed))
        .as("seed %d", seed)
        .isCloseTo(density, withPercentage(1e-11));
  }

  @ParameterizedTest
  @MethodSource("cases")
  void densityAgreesWithIndependentComputation(JsonNode node) {
    for (JsonNode point : node.get("psi")) {
      for (String orders : List.of("1_1", "2_1", "2_2", "3_1", "4_2")) {
        double density =
            model(orders, node)
                .wavenumberDensity(
                    point.get("kx").asDouble(),
                    point.get("ky").asDouble(),
                    node.get("w").asDouble(),
                    node.get("Uc").asDouble());
        assertThat(density)
            .as("%s at %s", orders, point)
            .isCloseTo(point.get(orders).asDouble(), withPercentage(3e-6));
      }
    }
  }

  @ParameterizedTest
  @MethodSource("cases")
  void crossSpectrumAgreesWithIndependentComputation(JsonNode node) {
    for (JsonNode point : node.get("gamma")) {
      int compared = 0;
      for (Map.Entry<String, JsonNode> field : point.properties()) {
        if (field.getValue().isArray()) {
          double[] actual =
              cross(
                  model(field.getKey(), node),
                  point.get("xi").asDouble(),
                  point.get("eta").asDouble(),
                  node.get("w").asDouble(),
                  node.get("Uc").asDouble());
          assertThat(actual[0]).isCloseTo(field.getValue().get(0).asDouble(), within(1e-8));
          assertThat(actual[1]).isCloseTo(field.getValue().get(1).asDouble(), within(1e-8));
          compared++;
        }
      }
      assertThat(compared).isEqualTo(4);
    }
  }

  @ParameterizedTest
  @MethodSource("terms")
  void termsAgreeWithIndependentComputation(JsonNode node) {
    int order = node.get("order").asInt();
    // ω/U_c = 1 makes the decay rate the half-width
    ExponentialTerms actual =
        new ButterworthCrossSpectrum(order, 1, node.get("halfwidth").asDouble(), 1.0)
            .alongFlow(10.0, 10.0);
    assertThat(actual.count()).isEqualTo(order);
    for (int p = 0; p < order; p++) {
      assertThat(actual.amplitudeRe()[p])
          .isCloseTo(node.get("A_re").get(p).asDouble(), within(1e-11));
      assertThat(actual.amplitudeIm()[p])
          .isCloseTo(node.get("A_im").get(p).asDouble(), within(1e-11));
      assertThat(actual.decayRe()[p]).isCloseTo(node.get("c_re").get(p).asDouble(), within(1e-11));
      assertThat(actual.decayIm()[p]).isCloseTo(node.get("c_im").get(p).asDouble(), within(1e-11));
    }
  }

  @ParameterizedTest
  @CsvSource({"0.100, -18.5", "0.116, -17.2", "0.125, -16.5"})
  void orderTwoLiesFarBelowCorcosAtLowWavenumber(double decay, double expectedDb) {
    ButterworthCrossSpectrum corcos = new ButterworthCrossSpectrum(1, 1, decay, 0.7);
    ButterworthCrossSpectrum second = new ButterworthCrossSpectrum(2, 1, decay, 0.7);
    double ratio =
        second.wavenumberDensity(0.0, 0.0, 6283.0, 30.0)
            / corcos.wavenumberDensity(0.0, 0.0, 6283.0, 30.0);
    assertThat(Decibels.ofRatio(ratio)).isBetween(-20.0, -16.0).isCloseTo(expectedDb, within(0.06));
  }
}
