package eddyledger.ledger;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** The curves that explain steps are those of the formulas themselves. */
class PictureCurvesTest {
  private static final double TIGHT = 1.0e-12;

  @Test
  void coherenceOfOrderOneIsAnExponential() {
    double[] distances = {0.0, 0.01, 0.1, 1.0};
    double[] coherence = PictureCurves.coherence(1, 0.116, 150.0, 1000.0, distances);
    for (int i = 0; i < distances.length; i++) {
      double expected = Math.exp(-0.116 * 2.0 * Math.PI * 1000.0 / 150.0 * distances[i]);
      assertThat(coherence[i]).isCloseTo(expected, within(TIGHT));
    }
  }

  @Test
  void coherenceOfOrderTwoKeepsLongerAtFirst() {
    // e^(-s/sqrt 2) (cos(s/sqrt 2) + sin(s/sqrt 2)) at s = decay * omega * distance / speed = 1
    double distance = 150.0 / (0.116 * 2.0 * Math.PI * 1000.0);
    double[] coherence = PictureCurves.coherence(2, 0.116, 150.0, 1000.0, new double[] {distance});
    double part = Math.sqrt(0.5);
    double expected = Math.exp(-part) * (Math.cos(part) + Math.sin(part));
    assertThat(coherence[0]).isCloseTo(expected, within(TIGHT)).isGreaterThan(Math.exp(-1.0));
  }

  @Test
  void temperatureFallsToElevenKilometresAndStays() {
    double[] altitudes = {0.0, 5_000.0, 11_000.0, 15_000.0};
    assertThat(PictureCurves.temperature(altitudes, 0.0))
        .containsExactly(new double[] {288.15, 255.65, 216.65, 216.65}, within(1.0e-9));
    assertThat(PictureCurves.temperature(altitudes, 15.0)[0]).isCloseTo(303.15, within(1.0e-9));
  }
}
