package eddyledger.physics.flow;

/**
 * Dry air at rest relative to the observer, as a perfect gas, and what follows from its state.
 *
 * <p>Formula: ρ = p/(R T); c = √(γ R T); μ = β T^1.5/(T + S); ν = μ/ρ; Z = ρ c.
 *
 * <p>Symbols: T temperature, K; p static pressure, Pa; ρ density, kg/m³; c speed of sound, m/s; μ
 * dynamic viscosity, Pa s; ν kinematic viscosity, m²/s; Z characteristic impedance, Pa s/m; R =
 * 287.05287 J/(kg K); γ = 1.4; β = 1.458e-6 kg/(m s √K); S = 110.4 K.
 *
 * <p>Source: ISO 2533:1975, Standard Atmosphere (gas law, speed of sound, Sutherland's viscosity).
 *
 * <p>Range: viscosity about 100 K to 1900 K, moisture left out. Outside, the formulas are followed
 * without a remark. The outside and the cabin air of one computation are two states.
 *
 * <p>Checked by {@code StandardAtmosphereReferenceTest} and {@code AirStateTest}.
 *
 * @param temperature T, K, above 0
 * @param pressure p, Pa, above 0
 */
public record AirState(double temperature, double pressure) {
  /** Specific gas constant of dry air R, J/(kg K). */
  public static final double GAS_CONSTANT = 287.05287;

  /** Ratio of the specific heats γ. */
  public static final double HEAT_RATIO = 1.4;

  private static final double SUTHERLAND_FACTOR = 1.458e-6;
  private static final double SUTHERLAND_TEMPERATURE = 110.4;

  /**
   * Checks the state.
   *
   * @throws IllegalArgumentException if temperature or pressure is not finite and above 0
   */
  public AirState {
    Numbers.requirePositive("air temperature", temperature, "K");
    Numbers.requirePositive("air pressure", pressure, "Pa");
  }

  /** Density ρ, kg/m³. */
  public double density() {
    return pressure / (GAS_CONSTANT * temperature);
  }

  /** Speed of sound c, m/s. */
  public double soundSpeed() {
    return Math.sqrt(HEAT_RATIO * GAS_CONSTANT * temperature);
  }

  /** Dynamic viscosity μ after Sutherland, Pa s. */
  public double dynamicViscosity() {
    return SUTHERLAND_FACTOR
        * temperature
        * Math.sqrt(temperature)
        / (temperature + SUTHERLAND_TEMPERATURE);
  }

  /** Kinematic viscosity ν, m²/s. */
  public double kinematicViscosity() {
    return dynamicViscosity() / density();
  }

  /** Characteristic impedance ρ c, Pa s/m. */
  public double characteristicImpedance() {
    return density() * soundSpeed();
  }
}
