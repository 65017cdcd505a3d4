package eddyledger.physics.wallpressure;

/**
 * Cross-spectrum of Corcos and its generalisation by Butterworth filters of order n along and m
 * across the flow; orders (1, 1) are Corcos's own.
 *
 * <p>Formula: with the half-width κ = α ω/U_c in each direction, the wavenumber density is B_n(k) =
 * n sin(π/2n)/(πκ) / (1 + (k/κ)^{2n}) with k = kx − ω/U_c along and k = ky across the flow. In
 * space f(ξ) = Σ_{p=1..n} A_p exp(−c_p|ξ|) with θ_p = π(2p − 1)/(2n), e_p = sin θ_p − i cos θ_p,
 * A_p = sin(π/2n) e_p and c_p = κ e_p.
 *
 * <p>Symbols: α decay rate, dimensionless (along about 0.116, across about 0.7); ω angular
 * frequency, rad/s; U_c convection speed, m/s.
 *
 * <p>Source: G. M. Corcos, "Resolution of pressure in turbulence", J. Acoust. Soc. Am. 35 (1963)
 * 192, and J. Sound Vib. 1 (1964) 59; generalisation by Butterworth filters published in J. Sound
 * Vib. 372 (2016); the sum of exponentials follows by residues.
 *
 * <p>Range: attached layers without strong pressure gradient. Order 1 is known to be too high by
 * about 20 dB at low wavenumbers (common practice, no source); that is what the higher orders mend.
 * A decay rate keeps its half-power wavenumber width from order to order, not its correlation
 * length (see {@link DecayRule}).
 *
 * <p>Checked by {@code ButterworthCrossSpectrumReferenceTest}.
 */
public final class ButterworthCrossSpectrum implements SeparableCrossSpectrum {
  /** Highest order for which the closed form was proved to keep its digits. */
  public static final int HIGHEST_ORDER = 5;

  private final int orderAlong;
  private final int orderAcross;
  private final double decayAlong;
  private final double decayAcross;

  /**
   * Makes the cross-spectrum.
   *
   * @param orderAlong n, 1 to 5
   * @param orderAcross m, 1 to 5
   * @param decayAlong decay rate along the flow at this order, above 0
   * @param decayAcross decay rate across the flow at this order, above 0
   * @throws IllegalArgumentException if an order or a decay rate is out of its range
   */
  public ButterworthCrossSpectrum(
      int orderAlong, int orderAcross, double decayAlong, double decayAcross) {
    if (Math.min(orderAlong, orderAcross) < 1
        || Math.max(orderAlong, orderAcross) > HIGHEST_ORDER) {
      throw new IllegalArgumentException(
          "orders are 1 to " + HIGHEST_ORDER + ", not " + orderAlong + ", " + orderAcross);
    }
    if (!(decayAlong > 0.0 && decayAcross > 0.0)) {
      throw new IllegalArgumentException(
          "decay rates are above 0, not " + decayAlong + ", " + decayAcross);
    }
    this.orderAlong = orderAlong;
    this.orderAcross = orderAcross;
    this.decayAlong = decayAlong;
    this.decayAcross = decayAcross;
  }

  @Override
  public String label() {
    return "orders-" + orderAlong + "-" + orderAcross;
  }

  @Override
  public String source() {
    return "Corcos, J. Acoust. Soc. Am. 35 (1963); Butterworth generalisation, J. Sound Vib. 372 (2016)";
  }

  @Override
  public int order() {
    return Math.max(orderAlong, orderAcross);
  }

  @Override
  public ExponentialTerms alongFlow(double omega, double convectionSpeed) {
    double kc = omega / convectionSpeed;
    return terms(orderAlong, decayAlong * kc, kc);
  }

  @Override
  public ExponentialTerms acrossFlow(double omega, double convectionSpeed) {
    return terms(orderAcross, decayAcross * omega / convectionSpeed, 0.0);
  }

  @Override
  public double wavenumberDensity(double kx, double ky, double omega, double convectionSpeed) {
    double kc = omega / convectionSpeed;
    return density(orderAlong, decayAlong * kc, kx - kc)
        * density(orderAcross, decayAcross * kc, ky);
  }

  /** B_n(k) in m/rad, ∫B_n dk = 1. */
  private static double density(int order, double halfWidth, double k) {
    double peak = order * Math.sin(Math.PI / (2 * order)) / (Math.PI * halfWidth);
    return peak / (1.0 + Math.pow(k / halfWidth, 2 * order));
  }

  private static ExponentialTerms terms(int order, double halfWidth, double wavenumber) {
    double[] amplitudeRe = new double[order];
    double[] amplitudeIm = new double[order];
    double[] decayRe = new double[order];
    double[] decayIm = new double[order];
    double scale = Math.sin(Math.PI / (2 * order));
    for (int p = 1; p <= order; p++) {
      double angle = Math.PI * (2 * p - 1) / (2 * order);
      // the middle term of an odd order is real; cos(π/2) in double arithmetic is not quite 0
      boolean middle = 2 * p - 1 == order;
      double re = middle ? 1.0 : Math.sin(angle);
      double im = middle ? 0.0 : -Math.cos(angle);
      amplitudeRe[p - 1] = scale * re;
      amplitudeIm[p - 1] = scale * im;
      decayRe[p - 1] = halfWidth * re;
      decayIm[p - 1] = halfWidth * im;
    }
    return new ExponentialTerms(amplitudeRe, amplitudeIm, decayRe, decayIm, wavenumber);
  }
}
