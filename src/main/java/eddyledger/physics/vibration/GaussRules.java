package eddyledger.physics.vibration;

import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ConcurrentMap;

/**
 * Gauss-Legendre rules on [0, 1], made when first asked for and kept.
 *
 * <p>Own code because Commons Math builds a rule of n points from all the shorter ones, a cost of
 * n³ that shows at the hundreds of points a large panel needs; here it is n². Checked against
 * Commons Math by {@code GaussRulesTest}.
 */
final class GaussRules {
  /**
   * One rule.
   *
   * @param nodes in (0, 1), ascending, shape [points]
   * @param weights sum 1, shape [points]
   */
  record Rule(double[] nodes, double[] weights) {}

  private static final int STEP = 8;

  private final ConcurrentMap<Integer, Rule> rules = new ConcurrentHashMap<>();

  /**
   * The rule that integrates, to rounding, an entire function turning by no more than a phase of 2z
   * from end to end: z/2 + 6 + 4 z^(1/3) points, rounded up to a whole multiple of eight so that
   * few rules are needed and inner loops come out even.
   */
  Rule forHalfPhase(double z) {
    int points = (int) Math.ceil(0.5 * z + 6.0 + 4.0 * Math.cbrt(z));
    return rules.computeIfAbsent((points + STEP - 1) / STEP * STEP, GaussRules::make);
  }

  /** The rule of so many points, by Newton's method on the Legendre polynomial. */
  static Rule make(int points) {
    double[] nodes = new double[points];
    double[] weights = new double[points];
    for (int i = 0; i < (points + 1) / 2; i++) {
      double x = Math.cos(Math.PI * (i + 0.75) / (points + 0.5));
      double slope = 0.0;
      for (int step = 0; step < 10; step++) {
        double p = 1.0;
        double before = 0.0;
        for (int k = 1; k <= points; k++) {
          double next = ((2 * k - 1) * x * p - (k - 1) * before) / k;
          before = p;
          p = next;
        }
        slope = points * (before - x * p) / ((1.0 - x) * (1.0 + x));
        double change = p / slope;
        x -= change;
        if (Math.abs(change) < 1e-15) {
          break;
        }
      }
      nodes[i] = 0.5 * (1.0 - x);
      nodes[points - 1 - i] = 0.5 * (1.0 + x);
      weights[i] = 1.0 / ((1.0 - x) * (1.0 + x) * slope * slope);
      weights[points - 1 - i] = weights[i];
    }
    return new Rule(nodes, weights);
  }
}
