package eddyledger.physics.flow;

import eddyledger.physics.Wording;
import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;

/**
 * Momentum thickness after a running length of turbulent flow over a flat plate, and back.
 *
 * <p>Formula: θ = x C_F/2 with C_F = 0.523/ln²(0.06 Re_x).
 *
 * <p>Symbols: x running length, m; C_F mean skin friction over it; Re_x = U_e x/ν; θ momentum
 * thickness, m.
 *
 * <p>Source: F. M. White, "Viscous Fluid Flow", chapter on turbulent plate friction, from memory.
 *
 * <p>Range: 5e5 ≤ Re_x ≤ 1e9, remarked by {@link BoundaryLayerCompletion}. The formula turns over
 * at Re_x = e²/0.06 = 123; at and below it there is no layer: an exception, or an empty length.
 *
 * <p>Checked by {@code BoundaryLayerReferenceTest} and {@code BoundaryLayerCompletionTest}.
 */
final class WhiteFriction {
  private static final double FACTOR = 0.523;
  private static final double INSIDE = 0.06;

  private WhiteFriction() {}

  /**
   * Momentum thickness, m, of a running length.
   *
   * @param length x, m
   * @param unitReynolds U_e/ν, 1/m
   * @throws IllegalArgumentException if the length is too short for any turbulent layer
   */
  static double momentumThickness(double length, double unitReynolds) {
    double log = Math.log(INSIDE * unitReynolds * length);
    if (!(log > 2.0)) {
      throw new IllegalArgumentException(
          "running length "
              + Wording.number(length)
              + " m is too short for a turbulent boundary layer: Reynolds number "
              + Wording.number(unitReynolds * length));
    }
    return 0.5 * FACTOR * length / (log * log);
  }

  /**
   * Running length, m, that gives a momentum thickness; empty below the thinnest layer.
   *
   * @param momentum θ, m
   * @param unitReynolds U_e/ν, 1/m
   */
  static OptionalDouble runningLength(double momentum, double unitReynolds) {
    // with y = ln(0.06 Re_x) the formula reads y − 2 ln y = known
    double known = Math.log(INSIDE * unitReynolds * momentum / (0.5 * FACTOR));
    if (!(known > 2.0 - 2.0 * Math.log(2.0))) {
      return OptionalDouble.empty();
    }
    double log =
        new BracketingNthOrderBrentSolver(1e-15, 1e-14, 0.0, 5)
            .solve(200, y -> y - 2.0 * Math.log(y) - known, 2.0, 4.0 + 3.0 * known);
    return OptionalDouble.of(momentum * log * log / (0.5 * FACTOR));
  }
}
