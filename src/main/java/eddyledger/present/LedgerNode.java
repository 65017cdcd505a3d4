package eddyledger.present;

import eddyledger.ledger.LedgerRow;
import java.util.List;

/**
 * A row of the ledger with what is shown below it.
 *
 * @param key what it stands for
 * @param row its numbers
 * @param above the node above; null for the total
 * @param children nodes below: sections, panels, other sources, or the ways into a panel; filled
 *     while the tree is built
 */
record LedgerNode(LineKey key, LedgerRow row, LedgerNode above, List<LedgerNode> children) {

  int depth() {
    int depth = 0;
    for (LedgerNode node = above; node != null; node = node.above()) {
      depth++;
    }
    return depth;
  }

  // nodes know one another both ways: comparing by content would not end
  @Override
  public boolean equals(Object other) {
    return this == other;
  }

  @Override
  public int hashCode() {
    return System.identityHashCode(this);
  }

  @Override
  public String toString() {
    return key.toString();
  }
}
