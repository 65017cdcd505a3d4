package eddyledger.check;

/** How much a finding matters. */
public enum Severity {
  /** Worth knowing; nothing needs to be done. */
  NOTE("note"),
  /** The result is there, but should not be relied upon before this was looked at. */
  WARNING("warning"),
  /** A panel, zone or other part cannot be computed or used as it is; the rest can. */
  ERROR("error"),
  /** Nothing can be computed before this is mended. */
  FATAL("cannot be used");

  private final String text;

  Severity(String text) {
    this.text = text;
  }

  /** The word used in tables. */
  public String text() {
    return text;
  }

  /** Whether it is as grave as another, or graver. */
  public boolean atLeast(Severity other) {
    return compareTo(other) >= 0;
  }
}
