package eddyledger.present;

import eddyledger.app.ProjectState;
import eddyledger.ledger.Status;
import java.util.List;
import java.util.Optional;

/** Writes what stands over the ledger. */
final class Headings {
  private Headings() {}

  static LedgerHeading of(Optional<SheetOnDesk> desk, LedgerTree tree, ProjectState state) {
    if (desk.isEmpty()) {
      String note = state.open() ? "a receiver and a condition are needed" : "";
      return new LedgerHeading("", note, false, "Share", "", BandScale.of(List.of()));
    }
    boolean partial = tree.root().row().status() == Status.PARTIAL;
    String all = "Share of the A-weighted energy of the total";
    String missing = Missing.text(tree.contributions());
    return new LedgerHeading(
        desk.get().title(),
        note(desk.get(), state),
        state.stale(),
        partial ? "Share of known" : "Share",
        partial ? all + " as far as it is known: " + missing : all,
        BandScale.ofRows(desk.get().sheet().rows()));
  }

  private static String note(SheetOnDesk desk, ProjectState state) {
    if (!desk.counted()) {
      return SheetOnDesk.why(state);
    }
    if (!state.stale()) {
      return "levels in dB(A)";
    }
    return state.unusable() ? "earlier, see findings" : "earlier levels\u2026";
  }
}
