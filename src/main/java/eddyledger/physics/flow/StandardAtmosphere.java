package eddyledger.physics.flow;

/**
 * Air of the standard atmosphere at a pressure altitude, on a standard day or one warmer or colder.
 *
 * <p>Formula: for H ≤ 11 000 m T = T0 − L H and p = p0 (T/T0)^(g/(R L)); for 11 000 m &lt; H ≤ 20
 * 000 m T = T11 and p = p11 exp(−g (H − 11 000)/(R T11)). On another day p stays and T grows by ΔT.
 * A geometric height z becomes H = r z/(r + z).
 *
 * <p>Symbols: H geopotential altitude, m (a flight level is a pressure altitude and is used as H);
 * T0 = 288.15 K; p0 = 101 325 Pa; L = 0.0065 K/m; g = 9.80665 m/s²; R = 287.05287 J/(kg K); r = 6
 * 356 766 m; ΔT temperature offset, K.
 *
 * <p>Source: ISO 2533:1975, Standard Atmosphere.
 *
 * <p>Range: 0 to 20 000 m; outside, an exception.
 *
 * <p>Checked by {@code StandardAtmosphereReferenceTest}.
 */
public final class StandardAtmosphere {
  /** Highest altitude, m. */
  public static final double HIGHEST = 20_000.0;

  private static final double SEA_TEMPERATURE = 288.15;
  private static final double SEA_PRESSURE = 101_325.0;
  private static final double LAPSE = 0.0065;
  private static final double GRAVITY = 9.80665;
  private static final double TROPOPAUSE = 11_000.0;
  private static final double EARTH_RADIUS = 6_356_766.0;

  private StandardAtmosphere() {}

  /**
   * The air at an altitude.
   *
   * @param pressureAltitude geopotential pressure altitude H, m, 0 to 20 000
   * @param temperatureOffset ΔT, K, against the standard day
   * @throws IllegalArgumentException outside the range, or if the offset leaves no air above 0 K
   */
  public static AirState at(double pressureAltitude, double temperatureOffset) {
    if (!(pressureAltitude >= 0.0 && pressureAltitude <= HIGHEST)) {
      throw new IllegalArgumentException(
          "pressure altitude must be 0 to 20000 m, not " + pressureAltitude + " m");
    }
    double lower = Math.min(pressureAltitude, TROPOPAUSE);
    double temperature = SEA_TEMPERATURE - LAPSE * lower;
    double exponent = GRAVITY / (AirState.GAS_CONSTANT * LAPSE);
    double pressure = SEA_PRESSURE * Math.pow(temperature / SEA_TEMPERATURE, exponent);
    double above = pressureAltitude - lower;
    pressure *= Math.exp(-GRAVITY * above / (AirState.GAS_CONSTANT * temperature));
    return new AirState(temperature + temperatureOffset, pressure);
  }

  /**
   * Geopotential altitude of a geometric height.
   *
   * @param geometricHeight z, m above mean sea level
   * @return H, m
   */
  public static double geopotential(double geometricHeight) {
    return EARTH_RADIUS * geometricHeight / (EARTH_RADIUS + geometricHeight);
  }
}
