package eddyledger.check;

import eddyledger.model.ByCondition;
import eddyledger.model.OperatingCondition;
import eddyledger.model.PlateConstruction;
import eddyledger.model.Tension;
import eddyledger.model.Vehicle;
import eddyledger.model.Zone;

/** Whether what nothing above could supply has a value in every operating condition. */
final class Coverage {
  private final Vehicle vehicle;
  private final Findings findings;

  private Coverage(Vehicle vehicle, Findings findings) {
    this.vehicle = vehicle;
    this.findings = findings;
  }

  static void check(Vehicle vehicle, Findings findings) {
    Coverage coverage = new Coverage(vehicle, findings);
    for (int i = 0; i < vehicle.zones().size(); i++) {
      Zone zone = vehicle.zones().get(i);
      String place = "zones[" + i + "].absorption_area_m2";
      if (zone.absorptionArea() != null) {
        coverage.everywhere(zone.absorptionArea(), zone.id(), place, "absorption area");
      }
    }
    for (int i = 0; i < vehicle.constructions().size(); i++) {
      if (vehicle.constructions().get(i) instanceof PlateConstruction plate) {
        coverage.tension(plate, "constructions[" + i + "].tension");
      }
    }
  }

  private void tension(PlateConstruction plate, String place) {
    Tension tension = plate.tension();
    if (tension == null || tension.along() == null && tension.across() == null) {
      return;
    }
    entered(tension.along(), plate.id(), place + ".along_N_per_m", "tension along");
    entered(tension.across(), plate.id(), place + ".across_N_per_m", "tension across");
  }

  private void entered(ByCondition<?> value, String subject, String place, String name) {
    if (value == null) {
      missing(subject, place, "The " + name + " is missing.", "Enter it, 0 if there is none.");
    } else {
      everywhere(value, subject, place, name);
    }
  }

  private void everywhere(ByCondition<?> value, String subject, String place, String name) {
    for (OperatingCondition condition : vehicle.conditions()) {
      if (value.in(condition.id()) == null) {
        missing(
            subject,
            place,
            "There is no " + name + " in condition \"" + condition.id() + "\".",
            "Enter one for all conditions, or one more for this condition.");
      }
    }
  }

  private void missing(String subject, String place, String what, String remedy) {
    findings.add(Severity.ERROR, "missing-value", subject, place, what, remedy);
  }
}
