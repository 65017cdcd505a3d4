package eddyledger.physics.wallpressure;

/**
 * How a decay rate fitted at one Butterworth order is carried to another.
 *
 * <p>Formula: the half-power width in wavenumber is κ = α ω/U_c at every order, so as published α
 * stays as it is. The correlation length ∫f dξ = 2 n sin(π/2n)/κ does depend on the order; keeping
 * it gives α_n = α_k · n sin(π/2n) / (k sin(π/2k)) from order k to order n.
 *
 * <p>Source: the generalisation in J. Sound Vib. 372 (2016) keeps the half-power width; the other
 * rule follows from the integral of its coherence. The two differ by 1.5 dB in the peak and by more
 * far from it, so the choice is shown in every output.
 */
public enum DecayRule {
  /** The half-power wavenumber width stays: α is used as published. */
  HALF_POWER_WIDTH,
  /** The correlation length stays: α grows by n sin(π/2n) from order 1. */
  CORRELATION_LENGTH;

  /**
   * The decay rate at another order.
   *
   * @param decay decay rate at the order it was fitted to, dimensionless
   * @param fitted order it was fitted to, 1 or more
   * @param used order it is used at, 1 or more
   */
  public double carry(double decay, int fitted, int used) {
    if (this == HALF_POWER_WIDTH || fitted == used) {
      return decay;
    }
    return decay * lengthFactor(used) / lengthFactor(fitted);
  }

  private static double lengthFactor(int order) {
    return order * Math.sin(Math.PI / (2 * order));
  }
}
