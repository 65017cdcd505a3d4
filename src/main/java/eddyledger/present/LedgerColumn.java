package eddyledger.present;

/** The columns of the ledger, in their order. */
public enum LedgerColumn {
  /** Name, indented by depth; its header names receiver and condition. */
  NAME("Name"),
  /** Band strip, or the reason why there is none. */
  BANDS("Bands"),
  /** A-weighted overall level. */
  LEVEL("Level"),
  /** Share of the A-weighted energy. */
  SHARE("Share"),
  /** What the row may have. */
  ALLOWANCE("Allowance"),
  /** Allowance less level, with its state. */
  MARGIN("Margin"),
  /** What lies between skin and cabin. */
  LAY_UP("Lay-up"),
  /** Mass of the skin. */
  MASS("Skin mass, kg"),
  /** Who answers for it. */
  SUPPLIER("Supplier");

  private final String title;

  LedgerColumn(String title) {
    this.title = title;
  }

  /** Its heading. */
  public String title() {
    return title;
  }
}
