package eddyledger.ledger;

/**
 * How a row stands against what it may have.
 *
 * @param target overall target in dB(A), of several the one with the least margin; NaN if there is
 *     none
 * @param reserve reserve in dB; NaN if there is no target
 * @param allowance what the row may have in dB(A): the target less its reserve, or the allowance
 *     entered; NaN if there is none
 * @param margin allowance less level, dB; NaN if one of them is missing
 * @param state inside, tight or over; null if it cannot be said
 */
public record Judgement(
    double target, double reserve, double allowance, double margin, State state) {
  /** Neither target nor allowance. */
  public static final Judgement NONE =
      new Judgement(Double.NaN, Double.NaN, Double.NaN, Double.NaN, null);

  /** Whether a state is known. */
  public boolean judged() {
    return state != null;
  }
}
