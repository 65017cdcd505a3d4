package eddyledger.physics.flow;

import eddyledger.physics.Wording;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;

/**
 * All thicknesses and the friction of a flat-plate turbulent layer from any one of them, by the law
 * of the wall with a wake.
 *
 * <p>Formula: λ = U_e/u_τ = √(2/C_f) = ln(Re_τ)/κ + B + 2Π/κ; δ* / δ = (1 + Π)/(κλ); θ/δ = (1 +
 * Π)/(κλ) − (2 + 3.179 Π + 1.5 Π²)/(κλ)².
 *
 * <p>Symbols: U_e edge speed, m/s; u_τ friction velocity, m/s; Re_τ = u_τ δ/ν; ν kinematic
 * viscosity, m²/s; κ = 0.41; B = 5.0; Π = 0.45 wake strength without pressure gradient; δ, δ*, θ
 * thicknesses, m.
 *
 * <p>Source: D. Coles, J. Fluid Mech. 1 (1956) 191; integrals as in F. M. White, "Viscous Fluid
 * Flow"; both from memory.
 *
 * <p>Range: attached layers without pressure gradient on smooth walls, Re_τ about 100 to 1e6. Below
 * Re_τ = 10 and above 1e9 no layer is given and an exception says so.
 *
 * <p>Checked by {@code BoundaryLayerReferenceTest} and {@code BoundaryLayerCompletionTest}.
 */
final class WallWakeClosure {
  private static final double KAPPA = 0.41;
  private static final double INTERCEPT = 5.0;
  private static final double WAKE = 0.45;

  /** Value of the law of the wall with wake at Re_τ = 1. */
  private static final double OFFSET = INTERCEPT + 2.0 * WAKE / KAPPA;

  private static final double FIRST = (1.0 + WAKE) / KAPPA;
  private static final double SECOND = (2.0 + 3.179 * WAKE + 1.5 * WAKE * WAKE) / (KAPPA * KAPPA);
  private static final double LOWEST_REYNOLDS = 10.0;
  private static final double HIGHEST_REYNOLDS = 1.0e9;

  private final double unitReynolds;

  /**
   * A closure for one flow.
   *
   * @param speed U_e, m/s
   * @param kinematicViscosity ν, m²/s
   */
  WallWakeClosure(double speed, double kinematicViscosity) {
    this.unitReynolds = speed / kinematicViscosity;
  }

  /** The layer of a 99 % thickness, m. */
  WallWakeState fromThickness(double thickness) {
    double reynolds = unitReynolds * thickness;
    return state(
        solve(lambda -> logLaw(Math.log(reynolds / lambda)) - lambda, reynolds), thickness);
  }

  /** The layer of a displacement thickness, m. */
  WallWakeState fromDisplacementThickness(double displacement) {
    // δ = δ* λ/FIRST, so that λ drops out of Re_τ = U_e δ/(λ ν)
    double lambda = logLaw(Math.log(unitReynolds * displacement / FIRST));
    return state(lambda, displacement * lambda / FIRST);
  }

  /** The layer of a momentum thickness, m. */
  WallWakeState fromMomentumThickness(double momentum) {
    double reynolds = unitReynolds * momentum;
    double lambda = solve(λ -> logLaw(Math.log(reynolds / (FIRST - SECOND / λ))) - λ, reynolds);
    return state(lambda, momentum / (FIRST / lambda - SECOND / (lambda * lambda)));
  }

  /** The layer of a ratio of edge speed to friction velocity. */
  WallWakeState fromSpeedRatio(double lambda) {
    double frictionReynolds = Math.exp(KAPPA * (lambda - OFFSET));
    return state(lambda, frictionReynolds * lambda / unitReynolds);
  }

  private static double logLaw(double logReynolds) {
    return logReynolds / KAPPA + OFFSET;
  }

  private static double solve(UnivariateFunction excess, double reynolds) {
    double lowest = logLaw(Math.log(LOWEST_REYNOLDS));
    double highest = logLaw(Math.log(HIGHEST_REYNOLDS));
    if (!(excess.value(lowest) >= 0.0 && excess.value(highest) <= 0.0)) {
      throw outside("a thickness with a Reynolds number of " + Wording.number(reynolds));
    }
    return new BracketingNthOrderBrentSolver(1e-15, 1e-14, 0.0, 5)
        .solve(200, excess, lowest, highest);
  }

  private WallWakeState state(double lambda, double thickness) {
    double frictionReynolds = unitReynolds * thickness / lambda;
    // the bounds themselves belong to the range, rounding must not throw them out
    if (!(frictionReynolds > LOWEST_REYNOLDS * 0.999
        && frictionReynolds < HIGHEST_REYNOLDS * 1.001)) {
      throw outside("a friction Reynolds number of " + Wording.number(frictionReynolds));
    }
    double displacement = thickness * FIRST / lambda;
    double momentum = thickness * (FIRST / lambda - SECOND / (lambda * lambda));
    return new WallWakeState(lambda, thickness, displacement, momentum);
  }

  private static IllegalArgumentException outside(String what) {
    return new IllegalArgumentException(
        "no turbulent boundary layer of the law of the wall has "
            + what
            + " (friction Reynolds numbers are 10 to 1e9)");
  }
}
