package eddyledger.present;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.RowKind;
import java.util.Optional;

/**
 * The other source of the same name: other sources have an id for every receiver and condition, so
 * where the one looked at is of another sheet, its namesake is meant.
 */
final class Namesake {
  private Namesake() {}

  /** The namesake, or the total where there is none; empty if it was no other source. */
  static Optional<LedgerRow> of(LedgerNode was, LedgerTree tree) {
    if (was == null || was.row().kind() != RowKind.OTHER) {
      return Optional.empty();
    }
    LedgerRow found =
        tree.contributions().stream()
            .filter(row -> row.kind() == RowKind.OTHER)
            .filter(row -> row.name().equals(was.row().name()))
            .findFirst()
            .orElse(tree.root().row());
    return Optional.of(found);
  }
}
