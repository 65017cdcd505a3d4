package eddyledger.model;

/** What an entered value is: wanted, computed, promised or measured. The kinds are never mixed. */
public enum ValueKind {
  /** A value that is to be reached. */
  TARGET("target"),
  /** A value somebody computed or estimated. */
  PREDICTED("predicted"),
  /** A value a supplier offers. */
  OFFERED("offered"),
  /** A value somebody measured. */
  MEASURED("measured");

  private final String text;

  ValueKind(String text) {
    this.text = text;
  }

  /** The word used in files and tables. */
  public String text() {
    return text;
  }
}
