package eddyledger.present;

import eddyledger.app.Selection;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.Trace;
import eddyledger.ledger.TraceStep;
import eddyledger.ledger.Way;
import eddyledger.model.OperatingCondition;
import eddyledger.model.Receiver;
import eddyledger.model.TreeEdit;
import eddyledger.model.Vehicle;
import java.util.Map;
import java.util.Optional;

/**
 * What the fields of the sheet are read from.
 *
 * @param vehicle the vehicle as it is now
 * @param selection row, receiver and condition looked at
 * @param sheet the last result at receiver and condition; empty if there is none
 * @param trace the account of the row's level; empty if there is none
 * @param pending a word for results that are older than the vehicle; empty if they are not
 * @param units the unit a field is shown in, by key, where it is not the usual one
 * @param allPanels whether a thickness is changed for all panels of the construction
 */
record SheetContext(
    Vehicle vehicle,
    Selection selection,
    Optional<ReceiverSheet> sheet,
    Optional<Trace> trace,
    String pending,
    Map<String, Unit> units,
    boolean allPanels) {

  /** The same, with another vehicle. */
  SheetContext in(Vehicle other) {
    return new SheetContext(other, selection, sheet, trace, pending, units, allPanels);
  }

  /** Whether the result is older than the vehicle. */
  boolean stale() {
    return !pending.isEmpty();
  }

  /** Id of the row. */
  String row() {
    return selection.rowId();
  }

  /** The unit a field is shown in. */
  Unit unit(String key, Quantity quantity) {
    Unit chosen = units.get(key);
    return chosen != null && quantity.units().contains(chosen) ? chosen : quantity.usual();
  }

  /** The row of the ledger. */
  Optional<LedgerRow> ledgerRow() {
    return sheet.flatMap(it -> it.row(row(), Way.ALL));
  }

  /** A value of the trace that does not depend on the band; NaN if there is none. */
  double traced(String symbol) {
    return trace.stream()
        .flatMap(it -> it.steps().stream())
        .filter(step -> step.symbol().equals(symbol) && !step.varies())
        .mapToDouble(TraceStep::value)
        .findFirst()
        .orElse(Double.NaN);
  }

  /** Name of a section, panel or the vehicle. */
  String name(String id) {
    if (vehicle.id().equals(id)) {
      return vehicle.name();
    }
    return TreeEdit.find(vehicle, id).map(path -> path.node().name()).orElse(id);
  }

  /** Short name of the condition. */
  String conditionName() {
    return vehicle.conditions().stream()
        .filter(it -> it.id().equals(selection.conditionId()))
        .map(OperatingCondition::name)
        .map(SheetContext::brief)
        .findFirst()
        .orElse(selection.conditionId());
  }

  /** Short name of the receiver. */
  String receiverName() {
    return vehicle.receivers().stream()
        .filter(it -> it.id().equals(selection.receiverId()))
        .map(Receiver::name)
        .map(SheetContext::brief)
        .findFirst()
        .orElse(selection.receiverId());
  }

  private static String brief(String name) {
    int comma = name.indexOf(',');
    return comma > 0 ? name.substring(0, comma) : name;
  }
}
