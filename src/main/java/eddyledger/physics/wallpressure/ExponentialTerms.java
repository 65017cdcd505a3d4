package eddyledger.physics.wallpressure;

/**
 * A real, even coherence in one direction as a sum of complex exponentials.
 *
 * <p>Formula: f(ξ) = Σ_p A_p exp(−c_p |ξ|), real because the terms come in conjugate pairs, with
 * f(0) = 1 and Re c_p &gt; 0. A convected field multiplies it by exp(−i k_c ξ).
 *
 * @param amplitudeRe real part of A_p, dimensionless, shape [terms]
 * @param amplitudeIm imaginary part of A_p, shape [terms]
 * @param decayRe real part of c_p, 1/m, shape [terms]
 * @param decayIm imaginary part of c_p, 1/m, shape [terms]
 * @param wavenumber convective wavenumber k_c, rad/m; 0 across the flow
 */
public record ExponentialTerms(
    double[] amplitudeRe,
    double[] amplitudeIm,
    double[] decayRe,
    double[] decayIm,
    double wavenumber) {

  /** Number of terms. */
  public int count() {
    return amplitudeRe.length;
  }

  /** The coherence f(ξ) without the convective phase, for a separation in metres. */
  public double coherence(double separation) {
    double s = Math.abs(separation);
    double sum = 0.0;
    for (int p = 0; p < count(); p++) {
      double size = Math.exp(-decayRe[p] * s);
      double phase = -decayIm[p] * s;
      sum += size * (amplitudeRe[p] * Math.cos(phase) - amplitudeIm[p] * Math.sin(phase));
    }
    return sum;
  }
}
