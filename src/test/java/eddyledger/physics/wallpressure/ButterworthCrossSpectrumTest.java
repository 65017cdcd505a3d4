package eddyledger.physics.wallpressure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class ButterworthCrossSpectrumTest {
  private static final double ALONG = 0.116;
  private static final double ACROSS = 0.7;
  private static final double OMEGA = 3000.0;
  private static final double SPEED = 30.0;
  private static final double CONVECTIVE = OMEGA / SPEED;

  static Stream<Arguments> allOrders() {
    return IntStream.rangeClosed(1, 5)
        .boxed()
        .flatMap(n -> IntStream.rangeClosed(1, 5).mapToObj(m -> Arguments.of(n, m)));
  }

  private static ButterworthCrossSpectrum model(int along, int across) {
    return new ButterworthCrossSpectrum(along, across, ALONG, ACROSS);
  }

  @ParameterizedTest
  @MethodSource("allOrders")
  void densityIntegratesToOneOverThePlane(int along, int across) {
    ButterworthCrossSpectrum model = model(along, across);
    // k = κ tan a turns the plane into a square with a smooth periodic integrand
    int points = 160;
    double step = Math.PI / points;
    double sum = 0.0;
    for (int i = 0; i < points; i++) {
      double a = -0.5 * Math.PI + (i + 0.5) * step;
      double kx = CONVECTIVE * (1.0 + ALONG * Math.tan(a));
      double stretchX = ALONG * CONVECTIVE / Math.pow(Math.cos(a), 2);
      for (int j = 0; j < points; j++) {
        double b = -0.5 * Math.PI + (j + 0.5) * step;
        double ky = CONVECTIVE * ACROSS * Math.tan(b);
        double stretchY = ACROSS * CONVECTIVE / Math.pow(Math.cos(b), 2);
        sum += model.wavenumberDensity(kx, ky, OMEGA, SPEED) * stretchX * stretchY;
      }
    }
    assertThat(sum * step * step).isCloseTo(1.0, within(1e-9));
  }

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 4, 5})
  void coherenceIsOneAtNoSeparationAndEven(int order) {
    ButterworthCrossSpectrum model = model(order, order);
    for (ExponentialTerms terms :
        List.of(model.alongFlow(OMEGA, SPEED), model.acrossFlow(OMEGA, SPEED))) {
      assertThat(terms.count()).isEqualTo(order);
      assertThat(terms.coherence(0.0)).isCloseTo(1.0, within(1e-14));
      for (double separation : new double[] {0.003, 0.05, 0.4}) {
        assertThat(terms.coherence(-separation)).isEqualTo(terms.coherence(separation));
        assertThat(Math.abs(terms.coherence(separation))).isLessThan(1.0);
      }
      // the sum is real because its terms come in conjugate pairs
      double imaginary = 0.0;
      for (double im : terms.amplitudeIm()) {
        imaginary += im;
      }
      assertThat(imaginary).isCloseTo(0.0, within(1e-15));
      assertThat(DoubleStream.of(terms.decayRe())).allMatch(decay -> decay > 0.0);
    }
  }

  @ParameterizedTest
  @CsvSource({"2, 1e-6", "3, 1e-9", "4, 1e-12", "5, 1e-12"})
  void coherenceIsTheFourierIntegralOfTheDensity(int order, double tolerance) {
    ButterworthCrossSpectrum model = model(order, 1);
    double halfWidth = ALONG * CONVECTIVE;
    double acrossPeak = 1.0 / (Math.PI * ACROSS * CONVECTIVE);
    ExponentialTerms terms = model.alongFlow(OMEGA, SPEED);
    for (double separation : new double[] {0.5, 1.5, 3.0, 6.0}) {
      double step = 0.02;
      int half = (int) (300.0 / step);
      double sum = 0.0;
      for (int i = -half; i <= half; i++) {
        double u = i * step;
        double density =
            model.wavenumberDensity(CONVECTIVE + u * halfWidth, 0.0, OMEGA, SPEED) / acrossPeak;
        sum += density * halfWidth * Math.cos(u * separation) * step;
      }
      assertThat(terms.coherence(separation / halfWidth)).isCloseTo(sum, within(tolerance));
    }
  }

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 4, 5})
  void halfOfThePeakLiesAtTheDecayRateAtEveryOrder(int order) {
    ButterworthCrossSpectrum model = model(order, order);
    double peak = model.wavenumberDensity(CONVECTIVE, 0.0, OMEGA, SPEED);
    double atWidth = model.wavenumberDensity(CONVECTIVE * (1.0 + ALONG), 0.0, OMEGA, SPEED) / peak;
    double acrossWidth =
        model.wavenumberDensity(CONVECTIVE, CONVECTIVE * ACROSS, OMEGA, SPEED) / peak;
    assertThat(atWidth).isCloseTo(0.5, within(1e-12));
    assertThat(acrossWidth).isCloseTo(0.5, within(1e-12));
  }

  @Test
  void phaseTravelsAlongTheFlowOnly() {
    ButterworthCrossSpectrum model = model(2, 1);
    assertThat(model.alongFlow(OMEGA, SPEED).wavenumber()).isEqualTo(CONVECTIVE);
    assertThat(model.acrossFlow(OMEGA, SPEED).wavenumber()).isZero();
    assertThat(model.wavenumberDensity(CONVECTIVE, 0.0, OMEGA, SPEED))
        .isGreaterThan(1e3 * model.wavenumberDensity(-CONVECTIVE, 0.0, OMEGA, SPEED));
  }

  @Test
  void namesItsOrders() {
    assertThat(model(2, 1).label()).isEqualTo("orders-2-1");
    assertThat(model(2, 1).order()).isEqualTo(2);
    assertThat(model(1, 3).order()).isEqualTo(3);
    assertThat(model(1, 1).source()).contains("Corcos");
  }

  @ParameterizedTest
  @CsvSource({
    "0, 1, 0.1, 0.7",
    "1, 6, 0.1, 0.7",
    "1, 1, 0, 0.7",
    "1, 1, 0.1, -0.7",
    "1, 1, NaN, 1"
  })
  void refusesOrdersAndDecayRatesOutOfRange(int along, int across, double ax, double ay) {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new ButterworthCrossSpectrum(along, across, ax, ay));
  }
}
