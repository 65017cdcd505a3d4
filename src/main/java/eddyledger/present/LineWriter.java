package eddyledger.present;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Way;
import eddyledger.present.BandStrip.Fill;
import eddyledger.present.LedgerLine.Twig;
import eddyledger.quantity.BandSpectrum;
import java.util.List;

/** Writes the lines of a sheet. */
final class LineWriter {
  private final LedgerTree tree;
  private final VehicleFacts facts;
  private final double totalEnergy;
  private final LineNames names = new LineNames();

  /** For the rows of a tree. */
  LineWriter(LedgerTree tree, VehicleFacts facts) {
    this.tree = tree;
    this.facts = facts;
    this.totalEnergy = tree.root().row().meanSquareA();
  }

  /** The line of a node. */
  LedgerLine line(LedgerNode node, boolean open) {
    LedgerRow row = node.row();
    boolean all = node.key().way() == Way.ALL;
    String name = all ? names.of(node) : LineWords.wayName(row.way());
    double share = row.meanSquareA() / totalEnergy;
    boolean shared = Double.isFinite(share);
    double allowance = row.judgement().allowance();
    Facts own = all ? facts.of(row.id()) : Facts.NONE;
    return new LedgerLine(
        row.id(),
        node.key().way(),
        node.depth(),
        twig(node, open),
        name,
        all ? row.name() : row.name() + ", " + LineWords.way(row.way()),
        kind(row, all),
        open || row.kind() == RowKind.TOTAL,
        ruled(node),
        strip(row),
        DeskNumbers.level(row.levelA(), row.status()),
        row.status(),
        shared ? DeskNumbers.share(share) : "",
        shared ? Math.min(1.0, share) : 0.0,
        Double.isNaN(allowance) ? "" : DeskNumbers.level(allowance),
        Verdict.of(row.judgement(), row.status(), facts.tightBand()),
        own.layUp(),
        DeskNumbers.mass(own.mass()),
        own.supplier(),
        Reasons.full(row));
  }

  private static Twig twig(LedgerNode node, boolean open) {
    if (node.children().isEmpty()) {
      return Twig.LEAF;
    }
    return open ? Twig.OPEN : Twig.CLOSED;
  }

  /** The only way into a panel, unless it is the usual one, over which no word need be lost. */
  private String kind(LedgerRow row, boolean all) {
    List<LedgerRow> ways = all ? tree.ways(row.id()) : List.of();
    boolean one = ways.size() == 1 && ways.get(0).way() != Way.BOUNDARY_LAYER;
    return one ? LineWords.way(ways.get(0).way()) : "";
  }

  /** Hairlines stand under the total and over the other sources. */
  private boolean ruled(LedgerNode node) {
    boolean first = node.above() == tree.root() && tree.root().children().get(0) == node;
    return first || node.key().id().equals(LedgerLine.OTHER_SOURCES);
  }

  private BandStrip strip(LedgerRow row) {
    BandSpectrum levels = BandLevels.weighted(row);
    int peak = BandLevels.peak(levels);
    // where a band is missing there is no level, and the reason says more than the bars would
    boolean none = peak < 0 || !Double.isFinite(row.levelA());
    return new BandStrip(levels, none ? -1 : peak, fill(row), none ? Reasons.brief(row) : "");
  }

  private Fill fill(LedgerRow row) {
    if (row.kind() == RowKind.OTHER) {
      return Fill.HOLLOW;
    }
    if (row.way() == Way.LEAK) {
      return Fill.HATCHED;
    }
    List<LedgerRow> ways = row.way() == Way.ALL ? tree.ways(row.id()) : List.of();
    return ways.size() == 1 && ways.get(0).way() == Way.LEAK ? Fill.HATCHED : Fill.SOLID;
  }
}
