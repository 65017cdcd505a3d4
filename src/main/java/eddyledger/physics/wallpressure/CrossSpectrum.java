package eddyledger.physics.wallpressure;

/**
 * How the wall pressures at two points hang together: the cross-spectrum over the point spectrum.
 *
 * <p>Conventions of every implementation: time factor exp(+iωt); x along the local flow, y across
 * it; the wavenumber density is normalised so that its integral over the whole plane is 1.
 */
public interface CrossSpectrum {
  /** Short name for tables and files, for instance {@code orders-2-1}. */
  String label();

  /** Author, journal, year, or "from memory". */
  String source();

  /**
   * Normalised wavenumber density ψ(kx, ky; ω), m²/rad², ∬ψ dkx dky = 1.
   *
   * @param kx wavenumber along the flow, rad/m
   * @param ky wavenumber across the flow, rad/m
   * @param omega angular frequency, rad/s
   * @param convectionSpeed convection speed, m/s
   */
  double wavenumberDensity(double kx, double ky, double omega, double convectionSpeed);
}
