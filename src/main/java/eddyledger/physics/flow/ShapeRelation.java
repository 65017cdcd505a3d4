package eddyledger.physics.flow;

import eddyledger.physics.Wording;

/**
 * The third thickness of a turbulent layer from two of them.
 *
 * <p>Formula: (δ − δ*)/θ = 3.15 + 1.72/(H − 1), H = δ* / θ.
 *
 * <p>Symbols: δ 99 % thickness, δ* displacement thickness, θ momentum thickness, all in m; H shape
 * factor.
 *
 * <p>Source: M. Drela, M. B. Giles, AIAA J. 25 (1987) 1347 (after J. E. Green).
 *
 * <p>Range: attached layers, 1 &lt; H; of the two shapes that share δ/θ the attached one, H &lt; 1
 * + √1.72, is taken. Pairs that no layer has throw an exception.
 *
 * <p>Checked by {@code BoundaryLayerReferenceTest} and {@code ShapeRelationTest}.
 */
final class ShapeRelation {
  private static final double CONSTANT = 3.15;
  private static final double SLOPE = 1.72;

  private ShapeRelation() {}

  /** Thickness δ, m, of displacement and momentum thickness. */
  static double thickness(double displacement, double momentum) {
    double h = displacement / momentum - 1.0;
    if (!(h > 0.0)) {
      throw new IllegalArgumentException(
          "displacement thickness "
              + Wording.number(displacement)
              + " m must be above the momentum thickness "
              + Wording.number(momentum)
              + " m");
    }
    return displacement + momentum * (CONSTANT + SLOPE / h);
  }

  /** Displacement thickness δ*, m, of thickness and momentum thickness. */
  static double displacement(double thickness, double momentum) {
    // h + SLOPE/h = sum with h = H − 1; the smaller root, written so that it keeps its digits
    double sum = thickness / momentum - CONSTANT - 1.0;
    double discriminant = sum * sum - 4.0 * SLOPE;
    if (!(sum > 0.0 && discriminant >= 0.0)) {
      throw new IllegalArgumentException(
          "thickness "
              + Wording.number(thickness)
              + " m is less than 6.77 times the momentum thickness "
              + Wording.number(momentum)
              + " m: no attached boundary layer");
    }
    return momentum * (1.0 + 2.0 * SLOPE / (sum + Math.sqrt(discriminant)));
  }

  /** Momentum thickness θ, m, of thickness and displacement thickness. */
  static double momentum(double thickness, double displacement) {
    // (r − 1)(1 + h) h = CONSTANT h + SLOPE with r = δ/δ*; its one root above 0
    double a = thickness / displacement - 1.0;
    if (!(a > 0.0)) {
      throw new IllegalArgumentException(
          "thickness "
              + Wording.number(thickness)
              + " m must be above the displacement thickness "
              + Wording.number(displacement)
              + " m");
    }
    double b = CONSTANT - a;
    double root = Math.sqrt(b * b + 4.0 * a * SLOPE);
    double h = b > 0.0 ? (b + root) / (2.0 * a) : 2.0 * SLOPE / (root - b);
    return displacement / (1.0 + h);
  }
}
