package eddyledger.model;

/**
 * The local flow speed at the edge of a panel's boundary layer, as entered.
 *
 * @param way how it is given
 * @param value the speed in m/s, the ratio to the vehicle's speed, or the pressure coefficient
 * @param extras unknown properties
 */
public record EdgeSpeed(Way way, Judged value, Extras extras) {

  /** How a local speed is given. */
  public enum Way {
    /** As a speed, m/s. */
    SPEED("speed_m_per_s"),
    /** As a ratio to the vehicle's speed. */
    RATIO("speed_ratio"),
    /** By the pressure coefficient, isentropic flow. */
    PRESSURE_COEFFICIENT("pressure_coefficient"),
    /** By the pressure coefficient, incompressible flow. */
    PRESSURE_COEFFICIENT_INCOMPRESSIBLE("pressure_coefficient_incompressible");

    private final String key;

    Way(String key) {
      this.key = key;
    }

    /** The property of the file that gives it this way. */
    public String key() {
      return key;
    }
  }

  /** A ratio to the vehicle's speed. */
  public static EdgeSpeed ratio(double ratio) {
    return new EdgeSpeed(Way.RATIO, Judged.of(ratio), Extras.NONE);
  }
}
