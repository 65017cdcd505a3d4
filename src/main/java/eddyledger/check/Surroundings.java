package eddyledger.check;

import eddyledger.model.AirGiven;
import eddyledger.model.Aperture;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Receiver;
import eddyledger.model.Vehicle;
import eddyledger.model.Zone;

/** The values of conditions, zones, apertures and receivers. */
final class Surroundings {
  private final Findings findings;

  private Surroundings(Findings findings) {
    this.findings = findings;
  }

  static void check(Vehicle vehicle, Findings findings) {
    Surroundings surroundings = new Surroundings(findings);
    for (int i = 0; i < vehicle.conditions().size(); i++) {
      surroundings.condition(vehicle.conditions().get(i), "conditions[" + i + "]");
    }
    for (int i = 0; i < vehicle.zones().size(); i++) {
      surroundings.zone(vehicle.zones().get(i), "zones[" + i + "]");
    }
    for (int i = 0; i < vehicle.apertures().size(); i++) {
      Aperture aperture = vehicle.apertures().get(i);
      String place = "apertures[" + i + "]";
      findings.required(Limit.AREA, aperture.area(), aperture.id(), place + ".area_m2");
      findings.bands(
          Limit.LOSS, aperture.transmissionLoss(), aperture.id(), place + ".transmission_loss_dB");
    }
    for (int i = 0; i < vehicle.receivers().size(); i++) {
      Receiver receiver = vehicle.receivers().get(i);
      for (int k = 0; k < receiver.direct().size(); k++) {
        String place = "receivers[" + i + "].direct[" + k + "].distance_m";
        findings.required(
            Limit.DISTANCE, receiver.direct().get(k).distance(), receiver.id(), place);
      }
    }
  }

  private void condition(OperatingCondition condition, String place) {
    String id = condition.id();
    if ((condition.speed() == null) == (condition.mach() == null)) {
      findings.add(
          Severity.ERROR,
          "speed",
          id,
          place,
          condition.speed() == null
              ? "Neither a speed nor a Mach number is given."
              : "Both a speed and a Mach number are given.",
          "Give one of speed_m_per_s and mach.");
    }
    findings.within(Limit.SPEED, condition.speed(), id, place + ".speed_m_per_s");
    findings.within(Limit.MACH, condition.mach(), id, place + ".mach");
    if (condition.outsideAir() == null) {
      findings.add(
          Severity.ERROR,
          "missing-value",
          id,
          place + ".outside_air",
          "The air outside is missing.",
          "Give an altitude, or a temperature and a pressure.");
    } else {
      air(condition.outsideAir(), id, place + ".outside_air");
    }
    if (condition.cabinAir() != null) {
      air(condition.cabinAir(), id, place + ".cabin_air");
    }
    findings.within(Limit.ANGLE, condition.yaw(), id, place + ".yaw_deg");
    findings.within(Limit.ANGLE, condition.incidence(), id, place + ".incidence_deg");
    findings.within(
        Limit.TEMPERATURE, condition.skinTemperature(), id, place + ".skin_temperature_K");
    findings.within(
        Limit.TEMPERATURE,
        condition.interlayerTemperature(),
        id,
        place + ".interlayer_temperature_K");
  }

  private void air(AirGiven air, String id, String place) {
    boolean byAltitude = air.altitude() != null;
    boolean byState = air.temperature() != null || air.pressure() != null;
    if (byAltitude == byState) {
      findings.add(
          Severity.ERROR,
          "air",
          id,
          place,
          byAltitude
              ? "The air is given by altitude and by its state as well."
              : "The air is given neither by altitude nor by its state.",
          "Give altitude_m, or temperature_K and pressure_Pa.");
    }
    if (byState && !byAltitude) {
      findings.required(Limit.TEMPERATURE, air.temperature(), id, place + ".temperature_K");
      findings.required(Limit.PRESSURE, air.pressure(), id, place + ".pressure_Pa");
    }
    findings.within(Limit.ALTITUDE, air.altitude(), id, place + ".altitude_m");
    findings.within(
        Limit.TEMPERATURE_OFFSET, air.temperatureOffset(), id, place + ".temperature_offset_K");
  }

  private void zone(Zone zone, String place) {
    findings.within(Limit.VOLUME, zone.volume(), zone.id(), place + ".volume_m3");
    findings.within(Limit.AREA, zone.innerSurface(), zone.id(), place + ".inner_surface_m2");
    String absorption = place + ".absorption_area_m2";
    if (zone.absorptionArea() == null) {
      findings.add(
          Severity.ERROR,
          "missing-value",
          zone.id(),
          absorption,
          "The absorption area is missing.",
          "Enter it per band, or one number for all bands.");
    }
    findings.each(
        zone.absorptionArea(),
        absorption,
        (value, at) -> findings.bands(Limit.AREA, value, zone.id(), at));
  }
}
