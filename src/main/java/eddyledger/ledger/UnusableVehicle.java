package eddyledger.ledger;

import eddyledger.check.Finding;
import java.util.List;

/** Thrown when a vehicle's description allows no computation at all; the findings say why. */
public final class UnusableVehicle extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient List<Finding> findings;

  UnusableVehicle(List<Finding> findings) {
    super("the vehicle cannot be computed");
    this.findings = List.copyOf(findings);
  }

  /** What is wrong, and what to do. */
  public List<Finding> findings() {
    return findings;
  }
}
