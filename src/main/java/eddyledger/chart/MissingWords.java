package eddyledger.chart;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import java.util.List;

/** Says what a partial total lacks. */
final class MissingWords {
  private MissingWords() {}

  /** As "without the missing Crown of Station E and 2 more". */
  static String of(SheetTree tree) {
    List<LedgerRow> lacking =
        tree.leaves().stream().filter(row -> row.status() != Status.OK).toList();
    if (lacking.isEmpty()) {
      return "a part is missing";
    }
    LedgerRow first = lacking.get(0);
    String what =
        first.status() == Status.PARTIAL ? "without the missing bands of " : "without the missing ";
    int more = lacking.size() - 1;
    return what + named(first, tree) + (more == 0 ? "" : " and " + more + " more");
  }

  private static String named(LedgerRow row, SheetTree tree) {
    LedgerRow above = tree.rowOrTotal(row.parent());
    return above.kind() == RowKind.TOTAL
        ? row.name()
        : ShortName.within(row.name(), above.name()) + " of " + above.name();
  }
}
