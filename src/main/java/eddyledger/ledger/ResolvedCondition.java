package eddyledger.ledger;

import eddyledger.model.AirGiven;
import eddyledger.model.OperatingCondition;
import eddyledger.physics.flow.AirState;
import eddyledger.physics.flow.StandardAtmosphere;

/**
 * An operating condition as it is computed with.
 *
 * @param condition as described
 * @param speed speed of the vehicle, m/s
 * @param outside the air outside
 * @param cabin the air in the zones
 * @param cabinAirDefaulted whether the cabin's air was not given and is 20 °C at outside pressure
 */
record ResolvedCondition(
    OperatingCondition condition,
    double speed,
    AirState outside,
    AirState cabin,
    boolean cabinAirDefaulted) {

  /** Temperature of a cabin whose air is not described, K. */
  private static final double CABIN_TEMPERATURE = 293.15;

  static ResolvedCondition of(OperatingCondition condition) {
    AirState outside = air(condition.outsideAir());
    boolean defaulted = condition.cabinAir() == null;
    AirState cabin =
        defaulted ? new AirState(CABIN_TEMPERATURE, outside.pressure()) : air(condition.cabinAir());
    double speed =
        condition.speed() != null ? condition.speed() : condition.mach() * outside.soundSpeed();
    return new ResolvedCondition(condition, speed, outside, cabin, defaulted);
  }

  private static AirState air(AirGiven given) {
    if (given.altitude() == null) {
      return new AirState(given.temperature(), given.pressure());
    }
    double offset = given.temperatureOffset() == null ? 0.0 : given.temperatureOffset();
    return StandardAtmosphere.at(given.altitude(), offset);
  }

  String id() {
    return condition.id();
  }

  /** The cabin's pressure less the outside pressure, Pa. */
  double overpressure() {
    return cabin.pressure() - outside.pressure();
  }
}
