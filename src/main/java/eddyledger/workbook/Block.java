package eddyledger.workbook;

import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import java.util.List;

/**
 * Where the ledger of one receiver in one condition stands on the ledger sheet.
 *
 * @param sheet the ledger's own
 * @param title row of its title; a row of notes follows
 * @param lines total, tree and other sources
 */
record Block(ReceiverSheet sheet, int title, List<LedgerLine> lines) {
  /** Rows above the total: title and notes. */
  static final int HEADING_ROWS = 2;

  Block {
    lines = List.copyOf(lines);
  }

  /** The total. */
  LedgerLine total() {
    return lines.get(0);
  }

  /** Last row of the tree and the other sources. */
  int last() {
    return lines.get(lines.size() - 1).number();
  }

  /** Panels and sections right below the total that are summed into it. */
  List<LedgerLine> top() {
    return lines.stream()
        .filter(line -> line.into() == total().number() && line.row().kind() != RowKind.OTHER)
        .toList();
  }

  /** Row of the flow over all panels. */
  int flow() {
    return last() + 1;
  }

  /** Row of the chosen models, first of the model range. */
  int chosen() {
    return flow() + 1;
  }

  /** Last row of the model range, and of the block. */
  int end() {
    return chosen() + sheet.range().size();
  }

  /** Key of its receiver and condition. */
  Pair pair() {
    return new Pair(sheet.condition().id(), sheet.receiver().id());
  }

  /**
   * A receiver in a condition.
   *
   * @param condition id of the condition
   * @param receiver id of the receiver
   */
  record Pair(String condition, String receiver) {}
}
