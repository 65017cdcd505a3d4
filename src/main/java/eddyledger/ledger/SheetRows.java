package eddyledger.ledger;

import eddyledger.model.Allowance;
import eddyledger.model.Node;
import eddyledger.model.OperatingCondition;
import eddyledger.model.OtherSource;
import eddyledger.model.Panel;
import eddyledger.model.Receiver;
import eddyledger.model.Section;
import eddyledger.model.Vehicle;
import eddyledger.quantity.BandSpectrum;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** The rows of a sheet below its total. */
final class SheetRows {
  private final Vehicle vehicle;
  private final TargetJudge judge;
  private final Map<String, Double> allowances = new HashMap<>();
  private final List<LedgerRow> rows = new ArrayList<>();

  SheetRows(Vehicle vehicle, OperatingCondition condition, Receiver receiver, TargetJudge judge) {
    this.vehicle = vehicle;
    this.judge = judge;
    for (Allowance allowance : vehicle.allowances()) {
      boolean here =
          condition.id().equals(allowance.condition())
              && receiver.id().equals(allowance.receiver());
      if (here) {
        // of two for the same row, which the check tells of, the first one holds
        allowances.putIfAbsent(allowance.node(), allowance.level());
      }
    }
  }

  /** Sections and panels down the tree, then other sources. */
  List<LedgerRow> rows(TreeSum sum) {
    for (Node node : vehicle.tree()) {
      node(node, vehicle.id(), 1, sum);
    }
    for (Map.Entry<OtherSource, Contribution> other : sum.others().entrySet()) {
      OtherSource source = other.getKey();
      rows.add(row(source.id(), vehicle.id(), 1, source.name(), RowKind.OTHER, other.getValue()));
    }
    return rows;
  }

  private void node(Node node, String parent, int depth, TreeSum sum) {
    Contribution contribution = sum.node(node.id());
    RowKind kind = node instanceof Panel ? RowKind.PANEL : RowKind.SECTION;
    LedgerRow all = row(node.id(), parent, depth, node.name(), kind, contribution);
    rows.add(all.judged(judgement(all)));
    // so far every sound of a panel comes in by way of the boundary layer's pressure
    rows.add(all.by(Way.BOUNDARY_LAYER));
    if (node instanceof Section section) {
      for (Node child : section.children()) {
        node(child, section.id(), depth + 1, sum);
      }
    }
  }

  private Judgement judgement(LedgerRow row) {
    Double allowance = allowances.get(row.id());
    if (allowance == null) {
      return Judgement.NONE;
    }
    double margin = allowance - row.levelA();
    return new Judgement(
        Double.NaN, Double.NaN, allowance, margin, judge.state(margin, row.status()));
  }

  private static LedgerRow row(
      String id, String parent, int depth, String name, RowKind kind, Contribution contribution) {
    return new LedgerRow(
        id,
        parent,
        depth,
        name,
        kind,
        Way.ALL,
        Choice.CHOSEN.name(),
        BandSpectrum.of(contribution.meanSquares()),
        Judgement.NONE,
        contribution.status(),
        contribution.reason());
  }
}
