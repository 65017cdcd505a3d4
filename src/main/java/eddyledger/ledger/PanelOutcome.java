package eddyledger.ledger;

import eddyledger.ledger.ResolvedPanel.Failure;

/**
 * What one piece of a panel does, or why it is not known.
 *
 * @param result the result; null with a failure
 * @param failure why there is none; null with a result
 */
record PanelOutcome(PanelResult result, Failure failure) {

  static PanelOutcome of(PanelResult result) {
    return new PanelOutcome(result, null);
  }

  static PanelOutcome failed(Failure failure) {
    return new PanelOutcome(null, failure);
  }
}
