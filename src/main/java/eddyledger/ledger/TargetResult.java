package eddyledger.ledger;

import eddyledger.model.Target;

/**
 * How the levels stand against one target.
 *
 * @param target the target
 * @param receiver id of the receiver that counts; all receivers together have none (empty)
 * @param level the level that counts, not rounded, in the rating's unit; NaN if there is none
 * @param judged the level rounded by the pass rule
 * @param allowed the target less its reserve
 * @param margin allowed less level, not rounded, dB
 * @param state inside, tight or over after the pass rule; null if it cannot be said
 * @param status whether the level is whole
 * @param reason why it is not; empty if it is
 */
public record TargetResult(
    Target target,
    String receiver,
    double level,
    double judged,
    double allowed,
    double margin,
    State state,
    Status status,
    String reason) {

  /** Whether the target is missed. */
  public boolean missed() {
    return state == State.OVER;
  }
}
