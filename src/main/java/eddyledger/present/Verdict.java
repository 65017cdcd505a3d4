package eddyledger.present;

import eddyledger.ledger.Judgement;
import eddyledger.ledger.State;
import eddyledger.ledger.Status;

/**
 * A margin as it is shown: number, mark and word.
 *
 * @param number margin with its sign, dB; empty if there is none or it says nothing
 * @param state inside, tight or over; null if it is not known or nothing is asked
 * @param word the state's word, "not known", or empty if nothing is asked
 */
public record Verdict(String number, State state, String word) {
  /** Nothing is asked of the row. */
  public static final Verdict NONE = new Verdict("", null, "");

  /** Something is asked, but it cannot be said whether it holds. */
  static final Verdict NOT_KNOWN = new Verdict("", null, "not known");

  /** Whether something is asked of the row, known or not. */
  public boolean asked() {
    return !word.isEmpty();
  }

  /**
   * The verdict on a row.
   *
   * @param tightBand margin below which a state is tight, dB
   */
  static Verdict of(Judgement judgement, Status status, double tightBand) {
    if (Double.isNaN(judgement.allowance())) {
      return NONE;
    }
    if (judgement.state() == null || Double.isNaN(judgement.margin())) {
      return NOT_KNOWN;
    }
    if (Double.isInfinite(judgement.margin())) {
      return new Verdict("", judgement.state(), judgement.state().text());
    }
    String number = DeskNumbers.margin(judgement.margin(), tightBand);
    // the level of a partial sum is a lower bound, so its margin is an upper one
    String bound = status == Status.OK ? "" : DeskNumbers.AT_MOST;
    return new Verdict(bound + number, judgement.state(), judgement.state().text());
  }

  /** As it is spoken: "over by 0.7 dB", "inside by 1.1 dB", "not known"; empty if not asked. */
  String spoken() {
    if (state == null || number.isEmpty()) {
      return word;
    }
    String size = number.replaceAll("[^0-9.]", "");
    boolean negative = number.contains("\u2212");
    if (negative != (state == State.OVER)) {
      // the target's own rule (rounding, tolerance) judged otherwise than the plain margin
      return word + " after the target's rule, margin " + number + " dB";
    }
    String bound = number.startsWith(DeskNumbers.AT_MOST) ? "at least " : "";
    return word + " by " + bound + size + " dB";
  }
}
