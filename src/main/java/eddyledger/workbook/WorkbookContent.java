package eddyledger.workbook;

import eddyledger.check.Finding;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.TargetResult;
import eddyledger.ledger.Trace;
import eddyledger.model.Vehicle;
import java.util.List;
import java.util.Optional;

/**
 * What a budget workbook holds.
 *
 * @param vehicle the description
 * @param sheets the ledger of each receiver and condition
 * @param targets how the levels stand against the targets
 * @param findings what reading and computing found
 * @param traces the account of every panel in every condition
 */
public record WorkbookContent(
    Vehicle vehicle,
    List<ReceiverSheet> sheets,
    List<TargetResult> targets,
    List<Finding> findings,
    Traces traces) {
  public WorkbookContent {
    sheets = List.copyOf(sheets);
    targets = List.copyOf(targets);
    findings = List.copyOf(findings);
  }

  /** Gives accounts of contributions. */
  public interface Traces {
    /** The account of a panel in a condition at some receiver; empty if there is none. */
    Optional<Trace> of(String panel, String condition);
  }

  /**
   * All of a ledger.
   *
   * @param findings what reading and computing found, each once
   */
  public static WorkbookContent of(Ledger ledger, List<Finding> findings) {
    Traces traces =
        (panel, condition) ->
            ledger.vehicle().receivers().stream()
                .findFirst()
                .flatMap(receiver -> ledger.trace(panel, condition, receiver.id()));
    return new WorkbookContent(
        ledger.vehicle(), ledger.sheets(), ledger.targets(), findings, traces);
  }
}
