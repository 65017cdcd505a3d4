package eddyledger.window;

import eddyledger.app.ProjectState;
import eddyledger.app.Selection;
import eddyledger.present.TraceAccount;
import java.awt.BorderLayout;
import java.util.Optional;
import javax.swing.JComponent;
import javax.swing.JPanel;

/**
 * The trace page, made when it is first asked for: keeps its view on the selected panel, receiver
 * and condition, and on the band followed.
 */
final class TraceGuide {
  private final ProjectState state;
  private final Runnable back;
  private final JPanel page = new JPanel(new BorderLayout());
  private TraceView view;
  private int band = TraceAccount.FIRST_BAND;

  TraceGuide(ProjectState state, Runnable back) {
    this.state = state;
    this.back = back;
  }

  /** The page, empty until {@link #begin}. */
  JComponent page() {
    return page;
  }

  /** Begins at the band that is loudest. */
  void begin() {
    if (view == null) {
      view = new TraceView(back);
      view.onBand(this::follow);
      page.add(view);
    }
    Selection at = state.selection();
    band =
        state
            .ledger()
            .map(
                ledger ->
                    TraceAccount.loudestBand(ledger, at.rowId(), at.conditionId(), at.receiverId()))
            .orElse(TraceAccount.FIRST_BAND);
  }

  /** Moves the keyboard's focus into the account. */
  void focus() {
    view.requestFocusInWindow();
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
