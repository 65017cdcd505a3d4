package eddyledger.check;

import eddyledger.model.Vehicle;
import java.util.List;

/** All that can be said of a vehicle's description before anything is computed. */
public final class VehicleCheck {
  private VehicleCheck() {}

  /** Every finding, in the order of the file's groups; empty if there is none. */
  public static List<Finding> of(Vehicle vehicle) {
    Findings findings = new Findings();
    Identities.check(vehicle, findings);
    References.check(vehicle, findings);
    Surroundings.check(vehicle, findings);
    Parts.check(vehicle, findings);
    Allowances.check(vehicle, findings);
    Nodes.check(vehicle, findings);
    Coverage.check(vehicle, findings);
    Completeness.check(vehicle, findings);
    return List.copyOf(findings.all());
  }
}
