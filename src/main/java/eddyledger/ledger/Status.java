package eddyledger.ledger;

/** Whether a row has its value. */
public enum Status {
  /** The value is there and whole. */
  OK("ok"),
  /** A part of the value is missing: bands, or rows below. The number is a lower bound. */
  PARTIAL("partial"),
  /** There is no value because something was not entered. */
  MISSING("missing"),
  /** There is no value because it could not be computed. */
  FAILED("failed");

  private final String text;

  Status(String text) {
    this.text = text;
  }

  /** The word used in tables. */
  public String text() {
    return text;
  }
}
