package eddyledger.present;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.RowKind;
import java.util.Comparator;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.function.ToDoubleFunction;

/** The row that needs attention first. */
final class WorstLine {
  private final LedgerTree tree;

  WorstLine(LedgerTree tree) {
    this.tree = tree;
  }

  /**
   * The panel with the least margin; where no panel has one, the section with the least margin; and
   * where nothing was allotted, the panel that contributes most. Empty if nothing has a level.
   */
  Optional<LedgerNode> find() {
    ToDoubleFunction<LedgerRow> margin = row -> row.judgement().margin();
    return least(RowKind.PANEL, margin)
        .or(() -> least(RowKind.SECTION, margin))
        .or(() -> least(RowKind.PANEL, row -> -row.levelA()));
  }

  private Optional<LedgerNode> least(RowKind kind, ToDoubleFunction<LedgerRow> value) {
    Predicate<LedgerNode> has =
        node -> node.row().kind() == kind && !Double.isNaN(value.applyAsDouble(node.row()));
    LedgerNode least = null;
    Comparator<LedgerNode> order =
        Comparator.comparingDouble(node -> value.applyAsDouble(node.row()));
    for (LedgerNode node : tree.nodes()) {
      boolean candidate = !node.children().isEmpty() || kind == RowKind.PANEL;
      if (candidate && has.test(node) && (least == null || order.compare(node, least) < 0)) {
        least = node;
      }
    }
    return Optional.ofNullable(least);
  }
}
