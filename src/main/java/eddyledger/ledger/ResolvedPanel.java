package eddyledger.ledger;

import eddyledger.model.MeasuredPanel;
import eddyledger.model.Panel;
import eddyledger.model.TabulatedLayUp;

/**
 * A panel in one condition, every lookup done and every default filled in; or the reason why it
 * cannot be computed.
 *
 * @param panel the panel as described
 * @param condition the condition
 * @param zone id of the zone it radiates into; null if unknown
 * @param input what is computed with; null for a measured panel or with a reason
 * @param measured flow and measurement of a measured panel; null for a computed one
 * @param layUp the lay-up; null for none
 * @param origins where the values come from
 * @param failure why it cannot be computed; null if it can
 */
record ResolvedPanel(
    Panel panel,
    ResolvedCondition condition,
    String zone,
    PanelInput input,
    MeasuredInput measured,
    TabulatedLayUp layUp,
    Origins origins,
    Failure failure) {

  /**
   * Flow and measurement of a measured panel.
   *
   * @param flow the flow over it
   * @param spectrum id of the chosen wall-pressure spectrum
   * @param data the measurement
   */
  record MeasuredInput(FlowInput flow, String spectrum, MeasuredPanel data) {}

  /**
   * Why there is no value.
   *
   * @param status missing or failed
   * @param reason in words
   */
  record Failure(Status status, String reason) {}

  static ResolvedPanel failed(
      Panel panel, ResolvedCondition condition, Origins origins, Failure failure) {
    return new ResolvedPanel(panel, condition, null, null, null, null, origins, failure);
  }
}
