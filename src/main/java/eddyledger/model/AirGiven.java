package eddyledger.model;

/**
 * A state of air as entered: by pressure altitude in the standard atmosphere, or by temperature and
 * pressure.
 *
 * @param altitude pressure altitude, m; null if not given that way
 * @param temperatureOffset temperature above the standard day's, K; null for none
 * @param temperature temperature, K; null if not given that way
 * @param pressure static pressure, Pa; null if not given that way
 * @param extras unknown properties
 */
public record AirGiven(
    Double altitude, Double temperatureOffset, Double temperature, Double pressure, Extras extras) {

  /** Air of the standard atmosphere at a pressure altitude in metres. */
  public static AirGiven atAltitude(double altitude) {
    return new AirGiven(altitude, null, null, null, Extras.NONE);
  }

  /** Air of a temperature in kelvin and a pressure in pascal. */
  public static AirGiven of(double temperature, double pressure) {
    return new AirGiven(null, null, temperature, pressure, Extras.NONE);
  }
}
