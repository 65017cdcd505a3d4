package eddyledger.window;

import eddyledger.app.ProjectState;
import eddyledger.app.Selection;
import eddyledger.present.TraceAccount;
import java.util.Optional;

/** Keeps the trace view on the selected panel, receiver and condition, and on the band followed. */
final class TraceGuide {
  private final ProjectState state;
  private final TraceView view;
  private int band = TraceAccount.FIRST_BAND;

  TraceGuide(ProjectState state, TraceView view) {
    this.state = state;
    this.view = view;
    view.onBand(this::follow);
  }

  /** Begins at the band that is loudest. */
  void begin() {
    Selection at = state.selection();
    band =
        state
            .ledger()
            .map(
                ledger ->
                    TraceAccount.loudestBand(ledger, at.rowId(), at.conditionId(), at.receiverId()))
            .orElse(TraceAccount.FIRST_BAND);
  }

  private void follow(int other) {
    band = other;
    show();
  }

  /** Shows the account as it is now; false if the selected row has none. */
  boolean show() {
    Selection at = state.selection();
    Optional<TraceAccount> account =
        state
            .ledger()
            .flatMap(
                ledger ->
                    TraceAccount.of(ledger, at.rowId(), at.conditionId(), at.receiverId(), band));
    account.ifPresent(view::show);
    return account.isPresent();
  }
}
