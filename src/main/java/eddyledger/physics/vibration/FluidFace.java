package eddyledger.physics.vibration;

/**
 * The fluid on one side of a panel.
 *
 * @param density density ρ, kg/m³, above 0
 * @param soundSpeed speed of sound c, m/s, above 0
 */
public record FluidFace(double density, double soundSpeed) {

  /**
   * Checks the values.
   *
   * @throws IllegalArgumentException if one is not above 0 or not finite
   */
  public FluidFace {
    Require.positive(density, "density of the fluid");
    Require.positive(soundSpeed, "speed of sound");
  }

  /** Characteristic impedance ρc, Pa s/m. */
  public double impedance() {
    return density * soundSpeed;
  }
}
