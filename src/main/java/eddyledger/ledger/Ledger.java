package eddyledger.ledger;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.check.VehicleCheck;
import eddyledger.model.Vehicle;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * The result: contributions, sums, margins and findings for every receiver and condition, and the
 * trace of every contribution on request. Immutable; the same vehicle gives the same bits, whatever
 * the number of threads.
 */
public final class Ledger {
  private final Vehicle vehicle;
  private final List<Finding> findings;
  private final List<ReceiverSheet> sheets;
  private final List<TargetResult> targets;
  private final LedgerRun run;

  private Ledger(
      Vehicle vehicle,
      List<Finding> findings,
      List<ReceiverSheet> sheets,
      List<TargetResult> targets,
      LedgerRun run) {
    this.vehicle = vehicle;
    this.findings = List.copyOf(findings);
    this.sheets = List.copyOf(sheets);
    this.targets = List.copyOf(targets);
    this.run = run;
  }

  /** The ledger of a vehicle. Arguments and errors as for {@link #of(Vehicle, LedgerOptions)}. */
  public static Ledger of(Vehicle vehicle) {
    return of(vehicle, LedgerOptions.plain());
  }

  /**
   * The ledger of a vehicle.
   *
   * @throws UnusableVehicle if nothing can be computed, with the findings that say why
   * @throws java.util.concurrent.CancellationException if the progress was cancelled
   */
  public static Ledger of(Vehicle vehicle, LedgerOptions options) {
    List<Finding> described = VehicleCheck.of(vehicle);
    if (described.stream().anyMatch(finding -> finding.severity() == Severity.FATAL)) {
      throw new UnusableVehicle(described);
    }
    LedgerRun run = new LedgerRun(vehicle, described, options);
    run.compute();
    SheetBuilder builder = new SheetBuilder(vehicle, run);
    List<ReceiverSheet> sheets = builder.sheets();
    return new Ledger(vehicle, run.findings(), sheets, builder.targets(), run);
  }

  /** The vehicle it was computed from. */
  public Vehicle vehicle() {
    return vehicle;
  }

  /** Every finding about the description and the computation. */
  public List<Finding> findings() {
    return findings;
  }

  /** One sheet per condition and receiver, conditions first, in the order of the file. */
  public List<ReceiverSheet> sheets() {
    return sheets;
  }

  /** The sheet of a receiver in a condition; empty if there is none. */
  public Optional<ReceiverSheet> sheet(String conditionId, String receiverId) {
    return sheets.stream()
        .filter(
            sheet ->
                sheet.condition().id().equals(conditionId)
                    && sheet.receiver().id().equals(receiverId))
        .findFirst();
  }

  /** How the levels stand against every target, in the order of the file. */
  public List<TargetResult> targets() {
    return targets;
  }

  /** The sheet with the least margin; without any margin the one with the highest level. */
  public ReceiverSheet worst() {
    return worst(sheets);
  }

  /** The sheet with the least margin among some; at least one. */
  public static ReceiverSheet worst(List<ReceiverSheet> among) {
    Comparator<ReceiverSheet> byMargin =
        Comparator.comparingDouble(
            sheet -> {
              double margin = sheet.total().judgement().margin();
              return Double.isNaN(margin) ? Double.MAX_VALUE : margin;
            });
    Comparator<ReceiverSheet> byLevel =
        Comparator.comparingDouble(sheet -> -sheet.total().levelA());
    return among.stream().min(byMargin.thenComparing(byLevel)).orElseThrow();
  }

  /**
   * The account of one panel's contribution.
   *
   * @return empty if there is no such panel, condition or receiver
   */
  public Optional<Trace> trace(String panelId, String conditionId, String receiverId) {
    return new TraceBuilder(vehicle, run).trace(panelId, conditionId, receiverId);
  }
}
