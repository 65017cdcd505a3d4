package eddyledger.ledger;

/** How a panel's sound comes in. */
public enum Way {
  /** All ways together. */
  ALL("all"),
  /** Through the panel, driven by the boundary layer's pressure. */
  BOUNDARY_LAYER("boundary-layer"),
  /** Through the panel, driven by the part of the outside pressure that travels as sound. */
  ACOUSTIC("acoustic"),
  /** Through seals and gaps. */
  LEAK("leak");

  private final String text;

  Way(String text) {
    this.text = text;
  }

  /** The word used in tables. */
  public String text() {
    return text;
  }
}
