package eddyledger.file;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.Vehicle;
import java.util.List;
import java.util.Optional;

/**
 * What came of reading a project file.
 *
 * @param vehicle the vehicle, with NaN for every required number that is missing or unreadable;
 *     empty if the file is no project of a version that can be read
 * @param findings everything that is wrong with the file and the vehicle in it, in the order of the
 *     file first, then of the checks
 */
public record ReadResult(Optional<Vehicle> vehicle, List<Finding> findings) {
  public ReadResult {
    findings = List.copyOf(findings);
  }

  /** Whether nothing can be computed before the file is mended. */
  public boolean fatal() {
    return findings.stream().anyMatch(finding -> finding.severity() == Severity.FATAL);
  }
}
