package eddyledger.present;

import eddyledger.ledger.State;
import java.util.List;

/**
 * How one receiver in one condition stands against its target, ready to be shown.
 *
 * @param conditionId id of the condition
 * @param receiverId id of the receiver
 * @param place the receiver's name, short
 * @param condition the condition's name, short
 * @param bound a sign before the level if it is a lower bound; else empty
 * @param level A-weighted overall level, dB(A); a dash if there is none
 * @param verdict margin and state; its word says so where nothing is asked
 * @param corner how much is missing, else the reserve still held; empty if there is neither
 * @param others another target of this receiver that is tight or over; null if there is none
 * @param target "target 76.0"; empty if there is none
 * @param range "models 75.2 to 77.4" where models differ by more than 1 dB; else empty
 * @param scale places on the scale line
 * @param stale whether the numbers are not those of the vehicle as it is now
 * @param selected whether it rules the desk
 * @param spoken all that matters, in one sentence
 * @param tip all there is to know, line by line
 */
public record TargetTile(
    String conditionId,
    String receiverId,
    String place,
    String condition,
    String bound,
    String level,
    Verdict verdict,
    String corner,
    OtherTarget others,
    String target,
    String range,
    TileScale scale,
    boolean stale,
    boolean selected,
    String spoken,
    List<String> tip) {
  public TargetTile {
    tip = List.copyOf(tip);
  }

  /**
   * A target besides the overall one.
   *
   * @param state tight or over
   * @param text "SIL over"
   */
  public record OtherTarget(State state, String text) {}

  /** Whether there is a number to show. */
  public boolean counted() {
    return scale.hasLevel();
  }
}
