package eddyledger.physics.wallpressure;

/**
 * A cross-spectrum that is a product of one function along and one across the flow, each a sum of
 * exponentials: γ(ξ, η) = f(ξ) exp(−i k_c ξ) g(η). Its joint acceptance with a plate mode has a
 * closed form.
 */
public interface SeparableCrossSpectrum extends CrossSpectrum {
  /** Highest order of the two directions, which rules how finely a band must be cut. */
  int order();

  /**
   * Terms along the flow, with the convective wavenumber ω/U_c.
   *
   * @param omega angular frequency, rad/s, above 0
   * @param convectionSpeed convection speed, m/s, above 0
   */
  ExponentialTerms alongFlow(double omega, double convectionSpeed);

  /** Terms across the flow; their wavenumber is 0. Arguments as for {@link #alongFlow}. */
  ExponentialTerms acrossFlow(double omega, double convectionSpeed);
}
