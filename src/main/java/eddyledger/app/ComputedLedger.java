package eddyledger.app;

import eddyledger.check.Finding;
import eddyledger.ledger.Ledger;
import java.util.List;
import java.util.Optional;

/**
 * What came of computing one revision of the vehicle.
 *
 * @param revision the revision that was computed
 * @param ledger the result; empty if nothing could be computed
 * @param findings everything found about it, each once
 */
public record ComputedLedger(long revision, Optional<Ledger> ledger, List<Finding> findings) {
  public ComputedLedger {
    findings = List.copyOf(findings);
  }
}
