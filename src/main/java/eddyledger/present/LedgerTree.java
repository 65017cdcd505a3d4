package eddyledger.present;

import eddyledger.ledger.Contributed;
import eddyledger.ledger.Judgement;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Way;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * The rows of a sheet as the ledger shows them: the tree of sections and panels, ways below a panel
 * that has more than one, other sources under a heading of their own.
 */
final class LedgerTree {
  private final Map<LineKey, LedgerNode> nodes = new LinkedHashMap<>();
  private final Map<String, List<LedgerRow>> ways = new HashMap<>();
  private final LedgerNode root;
  private final List<LedgerRow> rows;

  LedgerTree(ReceiverSheet sheet) {
    rows = sheet.rows();
    for (LedgerRow row : rows) {
      if (row.way() != Way.ALL && row.kind() == RowKind.PANEL && sounds(row)) {
        ways.computeIfAbsent(row.id(), id -> new ArrayList<>()).add(row);
      }
    }
    root = add(LineKey.all(sheet.total().id()), sheet.total(), null);
    LedgerNode others = null;
    for (LedgerRow row : rows) {
      if (row.way() != Way.ALL || row.kind() == RowKind.TOTAL) {
        continue;
      }
      if (row.kind() != RowKind.OTHER) {
        LedgerNode node = add(LineKey.all(row.id()), row, nodes.get(LineKey.all(row.parent())));
        addWays(node);
        continue;
      }
      if (others == null) {
        others = add(LineKey.all(LedgerLine.OTHER_SOURCES), heading(sheet), root);
      }
      add(LineKey.all(row.id()), row, others);
    }
  }

  private static boolean sounds(LedgerRow row) {
    for (double value : row.meanSquares().toArray()) {
      if (value > 0.0) {
        return true;
      }
    }
    return false;
  }

  private void addWays(LedgerNode panel) {
    List<LedgerRow> own = ways(panel.key().id());
    if (own.size() > 1) {
      own.forEach(row -> add(new LineKey(row.id(), row.way()), row, panel));
    }
  }

  private LedgerNode add(LineKey key, LedgerRow row, LedgerNode above) {
    LedgerNode node = new LedgerNode(key, row, above, new ArrayList<>());
    nodes.put(key, node);
    if (above != null) {
      above.children().add(node);
    }
    return node;
  }

  private static LedgerRow heading(ReceiverSheet sheet) {
    Contributed sum = sheet.others();
    List<String> reasons =
        sheet.rows().stream()
            .filter(row -> row.kind() == RowKind.OTHER && !Reasons.full(row).isEmpty())
            .map(row -> row.name() + ": " + row.reason())
            .toList();
    return new LedgerRow(
        LedgerLine.OTHER_SOURCES,
        sheet.total().id(),
        1,
        "Other sources",
        RowKind.SECTION,
        Way.ALL,
        sheet.total().choice(),
        sum.meanSquares(),
        Judgement.NONE,
        sum.status(),
        String.join("; ", reasons));
  }

  /** The total. */
  LedgerNode root() {
    return root;
  }

  /** A node; null if there is none. */
  LedgerNode node(LineKey key) {
    return nodes.get(key);
  }

  /** Every node, parents before children. */
  Iterable<LedgerNode> nodes() {
    return nodes.values();
  }

  /** The ways into a panel that carry sound. */
  List<LedgerRow> ways(String panelId) {
    return ways.getOrDefault(panelId, List.of());
  }

  /** Panels and other sources: what the sums are made of. */
  List<LedgerRow> contributions() {
    return contributions(rows);
  }

  /** Panels and other sources among the rows of a sheet: what its sums are made of. */
  static List<LedgerRow> contributions(List<LedgerRow> rows) {
    return rows.stream()
        .filter(row -> row.way() == Way.ALL)
        .filter(row -> row.kind() == RowKind.PANEL || row.kind() == RowKind.OTHER)
        .toList();
  }
}
