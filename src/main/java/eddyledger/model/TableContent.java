package eddyledger.model;

/** What a table of a treatment or lay-up includes besides the insertion itself. */
public enum TableContent {
  /** Its own mass on the panel. */
  MASS("mass"),
  /** Its own damping of the panel. */
  DAMPING("damping");

  private final String text;

  TableContent(String text) {
    this.text = text;
  }

  /** The word used in files. */
  public String text() {
    return text;
  }
}
