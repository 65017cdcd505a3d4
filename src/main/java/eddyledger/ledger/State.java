package eddyledger.ledger;

/** State of a margin. */
public enum State {
  /** At least the tight band in hand. */
  INSIDE("inside"),
  /** Between nothing and the tight band in hand. */
  TIGHT("tight"),
  /** Over the target or allowance. */
  OVER("over");

  /** Below this many decibels a difference is arithmetic noise, not a judgement. */
  private static final double NOISE = 1.0e-9;

  private final String text;

  State(String text) {
    this.text = text;
  }

  /** The word used in tables. */
  public String text() {
    return text;
  }

  /** The state of a margin in dB, given the tight band in dB. */
  public static State of(double margin, double tightBand) {
    if (margin < -NOISE) {
      return OVER;
    }
    return margin < tightBand - NOISE ? TIGHT : INSIDE;
  }
}
