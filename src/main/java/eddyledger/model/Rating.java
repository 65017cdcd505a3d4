package eddyledger.model;

/** What a target is about. */
public enum Rating {
  /** A-weighted overall level, dB(A). */
  OVERALL_A("overall-a", "dB(A)"),
  /** Unweighted overall level, dB. */
  OVERALL_LINEAR("overall-linear", "dB"),
  /** Speech interference level of the octaves 500, 1000 and 2000 Hz, dB. */
  SIL_500_2K("sil-500-1k-2k", "dB"),
  /** Speech interference level of the octaves 1000, 2000 and 4000 Hz, dB. */
  SIL_1K_4K("sil-1k-2k-4k", "dB"),
  /** Speech interference level of the octaves 500, 1000, 2000 and 4000 Hz, dB. */
  SIL_500_4K("sil-500-1k-2k-4k", "dB");

  private final String text;
  private final String unit;

  Rating(String text, String unit) {
    this.text = text;
    this.unit = unit;
  }

  /** The word used in files and tables. */
  public String text() {
    return text;
  }

  /** Its unit. */
  public String unit() {
    return unit;
  }
}
