package eddyledger.present;

import eddyledger.ledger.Choice;
import eddyledger.ledger.Judgement;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.model.OperatingCondition;
import eddyledger.model.OtherSource;
import eddyledger.model.Panel;
import eddyledger.model.Receiver;
import eddyledger.model.TreePath;
import eddyledger.model.Vehicle;
import eddyledger.quantity.BandSpectrum;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A sheet with every row of the vehicle and no number: what stands there before the first result.
 */
final class BlankSheet {
  private BlankSheet() {}

  /** The sheet of a receiver in a condition; empty if the vehicle has none of these ids. */
  static Optional<ReceiverSheet> of(Vehicle vehicle, String conditionId, String receiverId) {
    Optional<OperatingCondition> condition =
        vehicle.conditions().stream().filter(it -> it.id().equals(conditionId)).findFirst();
    Optional<Receiver> receiver =
        vehicle.receivers().stream().filter(it -> it.id().equals(receiverId)).findFirst();
    if (condition.isEmpty() || receiver.isEmpty()) {
      return Optional.empty();
    }
    List<LedgerRow> rows = new ArrayList<>();
    rows.add(row(vehicle.id(), "", 0, vehicle.name(), RowKind.TOTAL));
    for (TreePath path : TreePath.of(vehicle)) {
      RowKind kind = path.node() instanceof Panel ? RowKind.PANEL : RowKind.SECTION;
      int depth = path.positions().size();
      String parent = path.parentId(vehicle);
      rows.add(row(path.node().id(), parent, depth, path.node().name(), kind));
    }
    for (OtherSource source : vehicle.otherSources()) {
      if (source.condition().equals(conditionId) && source.receiver().equals(receiverId)) {
        rows.add(row(source.id(), vehicle.id(), 1, source.name(), RowKind.OTHER));
      }
    }
    return Optional.of(new ReceiverSheet(condition.get(), receiver.get(), rows, List.of()));
  }

  private static LedgerRow row(String id, String parent, int depth, String name, RowKind kind) {
    return new LedgerRow(
        id,
        parent,
        depth,
        name,
        kind,
        Way.ALL,
        Choice.CHOSEN.name(),
        BandSpectrum.constant(Double.NaN),
        Judgement.NONE,
        Status.MISSING,
        "");
  }
}
