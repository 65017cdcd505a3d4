package eddyledger.present;

import eddyledger.app.ProjectState;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Way;

/** What the line at the bottom of the desk says. */
public final class StatusPresenter {
  private final ProjectState state;
  private boolean cancelled;
  private String work = "";

  /** On a project's state. */
  public StatusPresenter(ProjectState state) {
    this.state = state;
  }

  /** Notes how far the computation is. */
  public void computing(int steps, int of) {
    // of what is counted only the different ones are computed, so the share says more than numbers
    work = of > 0 ? "Computing, " + 100 * steps / of + " %" : "Computing";
  }

  /** Notes other work that is going on; empty when it has ended. */
  public void working(String words) {
    work = words;
  }

  /** Notes that the computation was cancelled, or begins anew. */
  public void cancelled(boolean value) {
    cancelled = value;
    work = "";
  }

  /** Whether the numbers shown are those of the vehicle as it is now, and what goes on if not. */
  public String readiness() {
    if (!state.open()) {
      return "";
    }
    if (state.unusable()) {
      return "Not computed: see the findings";
    }
    if (!state.stale()) {
      return work.isEmpty() || work.startsWith("Computing") ? "Ready" : work;
    }
    if (cancelled) {
      return "Cancelled: the numbers are older than the edits, F5 computes them";
    }
    return work.isEmpty() ? "Computing" : work;
  }

  /** How much the ledger holds. */
  public String extent() {
    if (!state.open()) {
      return "";
    }
    return state.ledger().map(StatusPresenter::extent).orElse("no level yet");
  }

  private static String extent(Ledger ledger) {
    if (ledger.sheets().isEmpty()) {
      return "no receiver or no condition";
    }
    long parts =
        ledger.sheets().get(0).rows().stream()
            .filter(row -> row.way() == Way.ALL)
            .filter(row -> row.kind() == RowKind.PANEL || row.kind() == RowKind.OTHER)
            .count();
    return counted(parts, "contribution") + ", " + counted(ledger.targets().size(), "target");
  }

  private static String counted(long number, String word) {
    return number + " " + word + (number == 1 ? "" : "s");
  }
}
