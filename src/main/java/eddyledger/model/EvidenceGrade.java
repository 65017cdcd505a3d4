package eddyledger.model;

/** How well a value is founded, from a guess to a test in the vehicle. */
public enum EvidenceGrade {
  /** E0: somebody's guess. */
  GUESS("guess"),
  /** E1: a calculation. */
  CALCULATION("calculation"),
  /** E2: read across from a similar part. */
  READ_ACROSS("read-across"),
  /** E3: laboratory test of a flat sample. */
  FLAT_SAMPLE("flat-sample"),
  /** E4: laboratory test of the part or assembly. */
  PART("part"),
  /** E5: test in the vehicle. */
  VEHICLE("vehicle");

  private final String text;

  EvidenceGrade(String text) {
    this.text = text;
  }

  /** The word used in files and tables. */
  public String text() {
    return text;
  }
}
