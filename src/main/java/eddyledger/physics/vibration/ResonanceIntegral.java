package eddyledger.physics.vibration;

/**
 * Velocity response of one damped resonance to a flat force spectrum, integrated over a span of
 * frequency, exactly.
 *
 * <p>Formula: ∫ ω² dω / ((ω0² − ω²)² + η²ω0⁴) from ω1 to ω2 = (1/(ηω0²)) Im{(r/2) ln[(ω2 − r)(ω1 +
 * r)/((ω2 + r)(ω1 − r))]} with r = √(ω0²(1 + iη)), Im r &gt; 0. The imaginary part of the product
 * in the logarithm is positive, so its principal value holds: with r = p + iq and Δ = ω2 − ω1, D =
 * (ω2 + r)(ω1 − r), it is ½ ln(1 + 4pΔ(ω1ω2 − |r|²)/|D|²) + i arg, and the numerator of tan arg is
 * 2Δq(|r|² + ω1ω2), free of cancellation.
 *
 * <p>Symbols: ω angular frequency, rad/s; ω0 resonance, rad/s; η loss factor (hysteretic, frozen
 * over the span); result in s/rad. Divide by 2π for an integral in hertz.
 *
 * <p>Source: derived by partial fractions. The single arctangent often printed in its place errs by
 * up to 5 dB for a resonance outside the span.
 *
 * <p>Range: any span 0 ≤ ω1 &lt; ω2 and η &gt; 0; a resonance more than 1000 times above the span
 * costs six digits.
 *
 * <p>Checked by {@code ResonanceIntegralReferenceTest}.
 */
public final class ResonanceIntegral {
  private ResonanceIntegral() {}

  /**
   * The integral over a span.
   *
   * @param lower ω1, rad/s, 0 or more
   * @param upper ω2, rad/s, above ω1
   * @param resonance ω0, rad/s, above 0
   * @param lossFactor η, above 0
   * @throws IllegalArgumentException if a value is out of its range
   */
  public static double over(double lower, double upper, double resonance, double lossFactor) {
    Require.notNegative(lower, "lower angular frequency");
    Require.positive(upper - lower, "span of angular frequency");
    Require.positive(resonance, "resonance");
    Require.positive(lossFactor, "loss factor");
    double square = resonance * resonance;
    return ofSquares(lower, upper, square, lossFactor * square);
  }

  /** The integral from 0 to infinity, (π/(2ηω0)) Re √(1 + iη); arguments as for {@link #over}. */
  public static double whole(double resonance, double lossFactor) {
    Require.positive(resonance, "resonance");
    Require.positive(lossFactor, "loss factor");
    double root = Math.sqrt(0.5 * (1.0 + Math.sqrt(1.0 + lossFactor * lossFactor)));
    return Math.PI / (2.0 * lossFactor * resonance) * root;
  }

  /** The same from ω0² and ηω0², without checks, for loops over many modes. */
  static double ofSquares(double lower, double upper, double square, double damping) {
    double modulus = Math.sqrt(square * square + damping * damping);
    double p = Math.sqrt(0.5 * (modulus + square));
    double q = damping / (2.0 * p);
    double span = upper - lower;
    double product = lower * upper;
    double below = lower - p;
    double above = upper - p;
    double dRe = (upper + p) * below + q * q;
    double dIm = -q * (span + 2.0 * p);
    double nRe = above * (lower + p) + q * q;
    double nIm = q * (span - 2.0 * p);
    double d2 = dRe * dRe + dIm * dIm;
    double excess = 4.0 * p * span * (product - modulus) / d2;
    double logarithm = excess > -0.5 ? Math.log1p(excess) : Math.log((nRe * nRe + nIm * nIm) / d2);
    double angle = Math.atan2(2.0 * span * q * (modulus + product), nRe * dRe + nIm * dIm);
    return 0.5 * (p * angle + 0.5 * q * logarithm) / damping;
  }
}
