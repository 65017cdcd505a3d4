package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.AirGiven;
import eddyledger.model.OperatingCondition;

/** An operating condition. */
final class ConditionCodec implements RecordCodec<OperatingCondition> {
  static final ConditionCodec CONDITION = new ConditionCodec();

  private static final String SPEED = "speed_m_per_s";
  private static final String MACH = "mach";
  private static final String OUTSIDE_AIR = "outside_air";
  private static final String CABIN_AIR = "cabin_air";
  private static final String YAW = "yaw_deg";
  private static final String INCIDENCE = "incidence_deg";
  private static final String SKIN = "skin_temperature_K";
  private static final String INTERLAYER = "interlayer_temperature_K";
  private static final String OCCUPIED = "occupied";

  private ConditionCodec() {}

  @Override
  public OperatingCondition read(JsonObject object) {
    return new OperatingCondition(
        object.text("id"),
        object.requiredText("name"),
        object.number(SPEED),
        object.number(MACH),
        object.record(OUTSIDE_AIR, AirCodec.AIR),
        object.record(CABIN_AIR, AirCodec.AIR),
        object.number(YAW),
        object.number(INCIDENCE),
        object.number(SKIN),
        object.number(INTERLAYER),
        object.flag(OCCUPIED),
        object.extras());
  }

  @Override
  public ObjectNode write(OperatingCondition condition) {
    return new JsonBuilder()
        .text("id", condition.id())
        .name("name", condition.name())
        .number(SPEED, condition.speed())
        .number(MACH, condition.mach())
        .record(OUTSIDE_AIR, condition.outsideAir(), AirCodec.AIR)
        .record(CABIN_AIR, condition.cabinAir(), AirCodec.AIR)
        .number(YAW, condition.yaw())
        .number(INCIDENCE, condition.incidence())
        .number(SKIN, condition.skinTemperature())
        .number(INTERLAYER, condition.interlayerTemperature())
        .flag(OCCUPIED, condition.occupied())
        .with(condition.extras());
  }

  /** A state of air. */
  private static final class AirCodec implements RecordCodec<AirGiven> {
    static final AirCodec AIR = new AirCodec();

    private static final String ALTITUDE = "altitude_m";
    private static final String OFFSET = "temperature_offset_K";
    private static final String TEMPERATURE = "temperature_K";
    private static final String PRESSURE = "pressure_Pa";

    @Override
    public AirGiven read(JsonObject object) {
      return new AirGiven(
          object.number(ALTITUDE),
          object.number(OFFSET),
          object.number(TEMPERATURE),
          object.number(PRESSURE),
          object.extras());
    }

    @Override
    public ObjectNode write(AirGiven air) {
      return new JsonBuilder()
          .number(ALTITUDE, air.altitude())
          .number(OFFSET, air.temperatureOffset())
          .number(TEMPERATURE, air.temperature())
          .number(PRESSURE, air.pressure())
          .with(air.extras());
    }
  }
}
