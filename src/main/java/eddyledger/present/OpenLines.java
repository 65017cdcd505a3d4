package eddyledger.present;

import eddyledger.ledger.Way;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** Which lines are open; kept by id, so that it outlives results, undo and other receivers. */
final class OpenLines {
  private final Set<String> open = new HashSet<>();

  /** Forgets everything; only the heading over other sources is open. */
  void reset() {
    open.clear();
    open.add(LedgerLine.OTHER_SOURCES);
  }

  boolean isOpen(LedgerNode node) {
    return node.key().way() == Way.ALL && open.contains(node.key().id());
  }

  /** Opens a line that has lines below it; whether it was closed. */
  boolean open(LedgerNode node) {
    return !node.children().isEmpty() && open.add(node.key().id());
  }

  void close(LedgerNode node) {
    open.remove(node.key().id());
  }

  /** Opens everything above a node; whether something was closed. */
  boolean reveal(LedgerNode node) {
    boolean opened = false;
    for (LedgerNode above = node.above(); above != null; above = above.above()) {
      opened |= open(above);
    }
    return opened;
  }

  /** Opens a node and everything above it. */
  void show(LedgerNode node) {
    reveal(node);
    open(node);
  }

  /** Opens every line that has lines below it. */
  void openAll(LedgerTree tree) {
    tree.nodes().forEach(this::open);
  }

  /** Closes every line but the vehicle's. */
  void closeAll(LedgerTree tree) {
    open.clear();
    open(tree.root());
  }

  /** The visible nodes, top to bottom. */
  List<LedgerNode> visible(LedgerTree tree) {
    List<LedgerNode> visible = new ArrayList<>();
    collect(tree.root(), visible);
    return visible;
  }

  private void collect(LedgerNode node, List<LedgerNode> visible) {
    visible.add(node);
    if (isOpen(node)) {
      node.children().forEach(child -> collect(child, visible));
    }
  }
}
