package eddyledger.present;

import eddyledger.ledger.Way;

/** What a line of the ledger stands for: a row, or one way into it. */
record LineKey(String id, Way way) {
  static LineKey all(String id) {
    return new LineKey(id, Way.ALL);
  }
}
