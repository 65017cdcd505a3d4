package eddyledger.app;

import eddyledger.check.Finding;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerCache;
import eddyledger.ledger.LedgerOptions;
import eddyledger.ledger.UnusableVehicle;
import eddyledger.model.Vehicle;
import eddyledger.quantity.Progress;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * Computes a vehicle with all its findings: those of its description as the file would hold it, and
 * those of the computation. Keeps what was computed before, so an edit costs what it touches.
 */
public final class Computation {
  private final Projects projects;
  private final int threads;
  private final LedgerCache cache = new LedgerCache();

  /** With all processors. */
  public Computation(Projects projects) {
    this.projects = projects;
    this.threads = Runtime.getRuntime().availableProcessors();
  }

  /**
   * Computes a vehicle.
   *
   * @param revision number of the revision, handed through
   * @throws java.util.concurrent.CancellationException if the progress was cancelled
   */
  public ComputedLedger compute(long revision, Vehicle vehicle, Progress progress) {
    try {
      Ledger ledger = Ledger.of(vehicle, new LedgerOptions(threads, progress, cache));
      List<Finding> read = projects.findings(vehicle);
      return new ComputedLedger(revision, Optional.of(ledger), together(read, ledger.findings()));
    } catch (UnusableVehicle e) {
      return new ComputedLedger(
          revision, Optional.empty(), together(projects.findings(vehicle), e.findings()));
    }
  }

  /** What the reader said of a place is not said again by the computation. */
  public static List<Finding> together(List<Finding> read, List<Finding> computed) {
    Set<Finding> all = new LinkedHashSet<>(read);
    all.addAll(computed);
    return new ArrayList<>(all);
  }
}
