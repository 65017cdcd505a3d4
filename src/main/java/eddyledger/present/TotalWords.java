package eddyledger.present;

import eddyledger.ledger.Judgement;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.model.Section;
import eddyledger.model.TreePath;
import eddyledger.quantity.Bands;
import java.util.List;
import java.util.Optional;

/** Puts the end of an account into words: level, share, allowance, margin and state. */
final class TotalWords {
  private final ReceiverSheet sheet;
  private final LedgerRow row;
  private final TreePath path;

  TotalWords(ReceiverSheet sheet, LedgerRow row, TreePath path) {
    this.sheet = sheet;
    this.row = row;
    this.path = path;
  }

  TraceTotal total() {
    String heading = "All " + Bands.COUNT + " bands, summed as energies";
    LedgerRow judged = judged().orElse(null);
    if (judged == null) {
      return new TraceTotal(
          heading, "No allowance is set for it", "", null, false, share(), level());
    }
    Judgement judgement = judged.judgement();
    String allowance = "llowance " + Readable.level(judgement.allowance()) + " dB(A), margin";
    String margin =
        Double.isFinite(judgement.margin())
            ? Readable.difference(judgement.margin()) + " dB"
            : Readable.NONE;
    return new TraceTotal(
        heading,
        judged == row ? "A" + allowance : judged.name() + ": a" + allowance,
        margin,
        judgement.state(),
        true,
        share(),
        level());
  }

  /** The panel's row if it has an allowance, else the nearest section's above it that has one. */
  private Optional<LedgerRow> judged() {
    if (Double.isFinite(row.judgement().allowance())) {
      return Optional.of(row);
    }
    List<Section> sections = path.sections();
    for (int i = sections.size() - 1; i >= 0; i--) {
      Optional<LedgerRow> section =
          sheet
              .row(sections.get(i).id(), Way.ALL)
              .filter(it -> Double.isFinite(it.judgement().allowance()));
      if (section.isPresent()) {
        return section;
      }
    }
    return Optional.empty();
  }

  private String level() {
    double level = row.levelA();
    return row.status() == Status.OK && Double.isFinite(level)
        ? Readable.level(level) + " dB(A)"
        : "no level: " + (row.status() == Status.OK ? "silent" : row.status().text());
  }

  private String share() {
    double share = row.meanSquareA() / sheet.total().meanSquareA();
    String place = "the energy at " + sheet.receiver().name();
    if (!Double.isFinite(share) || row.status() != Status.OK) {
      return "Share of " + place + " not known";
    }
    String known = sheet.total().status() == Status.OK ? "" : ", as far as it is known";
    return Readable.share(share) + " of " + place + known;
  }
}
