package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Radiation efficiency of plate modes against values and against published limits.
 *
 * <p>Sources: {@code reference/radiation-efficiency.json}, independent computation of the published
 * formula (Wallace's integral), relative tolerance 1e-6, for the product and the table alike; C. E.
 * Wallace, J. Acoust. Soc. Am. 51 (1972) 946, low-frequency forms by parity, from memory (0.1 dB
 * for k · length below 1); the supersonic limit (1 − (k_mn/k)²)^(−1/2), e.g. Fahy and Gardonio,
 * "Sound and Structural Vibration", 2nd ed. 2007 (0.1 dB for k above 2 k_mn of higher modes, up to
 * 0.6 dB at 1.4 k_mn).
 */
class RadiationEfficiencyReferenceTest {

  static Stream<JsonNode> values() {
    return Reference.read("radiation-efficiency.json").get("radiation_efficiency").valueStream();
  }

  @ParameterizedTest
  @MethodSource("values")
  void modes(JsonNode value) {
    double a = value.get("a").asDouble();
    double b = value.get("b").asDouble();
    double k = value.get("k").asDouble();
    int m = value.get("m").asInt();
    int n = value.get("n").asInt();
    double expected = value.get("sigma").asDouble();
    double exact = new MatrixRadiationEfficiency(a, b).efficiencies(k, m, n)[n - 1][m - 1];
    double kept = new RadiationCache().table(a, b).efficiencies(k, m, n)[n - 1][m - 1];
    assertThat(exact).isCloseTo(expected, within(1e-6 * expected));
    assertThat(kept).isCloseTo(expected, within(1e-6 * expected));
    double diffuse = value.get("diffuse_j2").asDouble();
    assertThat(Math.PI * exact / (2.0 * k * k * a * b)).isCloseTo(diffuse, within(1e-6 * diffuse));
  }

  /** σ_11, σ_12 and σ_22 as published for wavelengths long against the plate. */
  @ParameterizedTest
  @ValueSource(doubles = {0.1, 0.3, 0.9})
  void lowFrequencyFormsByParity(double k) {
    double a = 1.0;
    double b = 0.7;
    double[][] sigma = new MatrixRadiationEfficiency(a, b).efficiencies(k, 2, 2);
    double pi5 = Math.pow(Math.PI, 5);
    double ka = k * a;
    double kb = k * b;
    assertDecibels(sigma[0][0], 32.0 * ka * kb / pi5 * bothOdd(ka, kb));
    assertDecibels(sigma[0][1], 8.0 / 3.0 * ka * ka * ka * kb / (4.0 * pi5) * oneOdd(ka, kb));
    assertDecibels(sigma[1][1], 2.0 * Math.pow(ka * kb, 3) / (15.0 * 16.0 * pi5) * noneOdd(ka, kb));
  }

  private static double bothOdd(double ka, double kb) {
    double s = 8.0 / (Math.PI * Math.PI);
    return 1.0 - ka * kb / 12.0 * ((1.0 - s) * ka / kb + (1.0 - s) * kb / ka);
  }

  /** Even along a, odd along b, first modes. */
  private static double oneOdd(double ka, double kb) {
    double odd = 1.0 - 8.0 / (Math.PI * Math.PI);
    double even = 1.0 - 24.0 / (4.0 * Math.PI * Math.PI);
    return 1.0 - ka * kb / 20.0 * (even * ka / kb + odd * kb / ka);
  }

  private static double noneOdd(double ka, double kb) {
    double even = 1.0 - 24.0 / (4.0 * Math.PI * Math.PI);
    return 1.0 - 5.0 * ka * kb / 64.0 * (even * ka / kb + even * kb / ka);
  }

  private static void assertDecibels(double found, double expected) {
    assertThat(10.0 * Math.log10(found / expected)).isBetween(-0.1, 0.1);
  }

  @ParameterizedTest(name = "({0}, {1}) at {2} times its wavenumber")
  @CsvSource({
    "8, 5, 3.0, 0.1",
    "12, 9, 2.0, 0.1",
    "5, 5, 2.5, 0.1",
    "10, 8, 1.4, 0.6",
    "20, 3, 2.0, 0.1",
  })
  void supersonicLimit(int m, int n, double ratio, double decibels) {
    double a = 0.9;
    double b = 0.45;
    double k = ratio * Math.PI * Math.hypot(m / a, n / b);
    double sigma = new MatrixRadiationEfficiency(a, b).efficiencies(k, m, n)[n - 1][m - 1];
    double limit = 1.0 / Math.sqrt(1.0 - 1.0 / (ratio * ratio));
    assertThat(10.0 * Math.log10(sigma / limit)).isBetween(-decibels, decibels);
  }
}
