package eddyledger.model;

/**
 * An operating condition at which levels are wanted.
 *
 * @param id identity
 * @param name name shown
 * @param speed true speed of the vehicle, m/s; null if the Mach number is given
 * @param mach Mach number of the vehicle; null if the speed is given
 * @param outsideAir the air outside
 * @param cabinAir the air in the zones; null for 20 °C at the outside pressure
 * @param yaw yaw angle, degrees, a label; null if not stated
 * @param incidence angle of incidence, degrees, a label; null if not stated
 * @param skinTemperature temperature of the skins, K; null if not stated
 * @param interlayerTemperature temperature of interlayers, K; null if not stated
 * @param occupied whether the cabin is occupied; null if not stated
 * @param extras unknown properties
 */
public record OperatingCondition(
    String id,
    String name,
    Double speed,
    Double mach,
    AirGiven outsideAir,
    AirGiven cabinAir,
    Double yaw,
    Double incidence,
    Double skinTemperature,
    Double interlayerTemperature,
    Boolean occupied,
    Extras extras) {}
