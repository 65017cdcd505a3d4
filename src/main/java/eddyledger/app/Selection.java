package eddyledger.app;

/**
 * What the desk looks at.
 *
 * @param conditionId id of the operating condition; empty if the vehicle has none
 * @param receiverId id of the receiver; empty if the vehicle has none
 * @param rowId id of the row: panel, section, other source or vehicle
 */
public record Selection(String conditionId, String receiverId, String rowId) {

  /** The same row at another receiver in another condition. */
  public Selection at(String condition, String receiver) {
    return new Selection(condition, receiver, rowId);
  }

  /** Another row at the same receiver in the same condition. */
  public Selection on(String row) {
    return new Selection(conditionId, receiverId, row);
  }
}
