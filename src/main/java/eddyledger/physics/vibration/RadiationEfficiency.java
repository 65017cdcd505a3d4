package eddyledger.physics.vibration;

/**
 * How well each mode of a plate of one size, in an infinite rigid baffle, radiates into the half
 * space on one side, at one acoustic wavenumber.
 *
 * <p>σ is the radiated power over ρcS⟨v²⟩, dimensionless, each mode by itself. It depends on the
 * size of the plate, the mode and the wavenumber k = ω/c alone.
 */
public interface RadiationEfficiency {
  /**
   * Radiation efficiencies of the modes up to M half-waves along the length and N across.
   *
   * @param wavenumber k = ω/c, rad/m, above 0
   * @param modesAlong M, 1 or more
   * @param modesAcross N, 1 or more
   * @return σ_mn at [n − 1][m − 1], shape [N][M]
   * @throws IllegalArgumentException if an argument is out of its range
   */
  double[][] efficiencies(double wavenumber, int modesAlong, int modesAcross);
}
