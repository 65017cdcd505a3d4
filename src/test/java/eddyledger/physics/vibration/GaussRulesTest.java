package eddyledger.physics.vibration;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Own Gauss-Legendre rules against those of Commons Math. */
class GaussRulesTest {

  @ParameterizedTest
  @ValueSource(ints = {1, 2, 3, 8, 16, 61, 104})
  void sameNodesAndWeightsAsCommonsMath(int points) {
    GaussRules.Rule rule = GaussRules.make(points);
    GaussIntegrator library = new GaussIntegratorFactory().legendre(points, 0.0, 1.0);
    for (int i = 0; i < points; i++) {
      assertThat(rule.nodes()[i]).isCloseTo(library.getPoint(i), within(1e-14));
      assertThat(rule.weights()[i]).isCloseTo(library.getWeight(i), within(1e-14));
    }
  }

  /** Long rules: cos(kt) over (0, 1) is sin(k)/k. */
  @ParameterizedTest
  @ValueSource(doubles = {1.0, 20.0, 300.0, 1500.0})
  void integratesToRoundingWhatItsPhaseAllows(double k) {
    GaussRules.Rule rule = new GaussRules().forHalfPhase(0.5 * k);
    double sum = 0.0;
    for (int i = 0; i < rule.nodes().length; i++) {
      sum += rule.weights()[i] * Math.cos(k * rule.nodes()[i]);
    }
    assertThat(sum).isCloseTo(Math.sin(k) / k, within(2e-15));
    assertThat(rule.nodes().length % 8).isZero();
  }

  @Test
  void aRuleIsMadeOnce() {
    GaussRules rules = new GaussRules();
    assertThat(rules.forHalfPhase(10.0)).isSameAs(rules.forHalfPhase(10.1));
  }
}
