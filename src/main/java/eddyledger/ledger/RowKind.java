package eddyledger.ledger;

/** What a row of the ledger is about. */
public enum RowKind {
  /** A panel. */
  PANEL("panel"),
  /** A section: the sum of its panels and sections. */
  SECTION("section"),
  /** A source that is not flow over a panel. */
  OTHER("other"),
  /** Everything at the receiver. */
  TOTAL("total");

  private final String text;

  RowKind(String text) {
    this.text = text;
  }

  /** The word used in tables. */
  public String text() {
    return text;
  }
}
