package eddyledger.chart;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Way;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** The rows of a sheet as a tree, looked up by id. */
final class SheetTree {
  private final LedgerRow total;
  private final Map<String, LedgerRow> rows = new LinkedHashMap<>();
  private final Map<String, List<LedgerRow>> children = new HashMap<>();
  private final Set<String> leaking = new LinkedHashSet<>();
  private final Set<String> otherwise = new LinkedHashSet<>();

  SheetTree(ReceiverSheet sheet) {
    total = sheet.total();
    for (LedgerRow row : sheet.rows()) {
      if (row.way() == Way.ALL) {
        rows.put(row.id(), row);
        children.computeIfAbsent(row.parent(), id -> new ArrayList<>()).add(row);
      } else if (Energies.knownA(row.meanSquares()) > 0.0) {
        (row.way() == Way.LEAK ? leaking : otherwise).add(row.id());
      }
    }
  }

  LedgerRow total() {
    return total;
  }

  /** The row of an id, all ways together; the total if there is no such row. */
  LedgerRow rowOrTotal(String id) {
    return rows.getOrDefault(id, total);
  }

  /** The rows summed into a row, in the order of the sheet. */
  List<LedgerRow> children(String id) {
    return children.getOrDefault(id, List.of());
  }

  /** Panels and other sources of the sheet, in its order. */
  List<LedgerRow> leaves() {
    return rows.values().stream()
        .filter(row -> row.kind() == RowKind.PANEL || row.kind() == RowKind.OTHER)
        .toList();
  }

  /** Whether all that is known of a row comes in through seals and gaps. */
  boolean leak(LedgerRow row) {
    return leaking.contains(row.id()) && !otherwise.contains(row.id());
  }

  /** Whether a section holds no panel at all. */
  boolean empty(LedgerRow row) {
    return row.kind() == RowKind.SECTION && children(row.id()).stream().allMatch(this::empty);
  }

  /** Ids of a row and all below it that have a value. */
  Set<String> known(List<LedgerRow> tops) {
    Set<String> ids = new LinkedHashSet<>();
    for (LedgerRow top : tops) {
      if (Energies.known(top)) {
        ids.add(top.id());
        ids.addAll(known(children(top.id())));
      }
    }
    return ids;
  }
}
