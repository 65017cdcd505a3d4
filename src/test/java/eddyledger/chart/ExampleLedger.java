package eddyledger.chart;

import eddyledger.file.ProjectReader;
import eddyledger.ledger.Judgement;
import eddyledger.ledger.Ledger;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.model.Node;
import eddyledger.model.Panel;
import eddyledger.model.Section;
import eddyledger.model.Vehicle;
import eddyledger.quantity.BandSpectrum;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** The example's ledger, and what becomes of it when something is missing. */
final class ExampleLedger {
  private ExampleLedger() {}

  static Vehicle vehicle() throws IOException {
    return new ProjectReader()
        .read(Path.of("examples/quillon-82.eddyledger"))
        .vehicle()
        .orElseThrow();
  }

  static Ledger ledger() throws IOException {
    return Ledger.of(vehicle());
  }

  /** The example without the construction of one panel, which then has no value. */
  static Ledger without(String panelId) throws IOException {
    Vehicle vehicle = vehicle();
    List<Node> tree = vehicle.tree().stream().map(node -> stripped(node, panelId)).toList();
    return Ledger.of(vehicle.edit().tree(tree).build());
  }

  private static Node stripped(Node node, String panelId) {
    if (node instanceof Section section) {
      List<Node> children =
          section.children().stream().map(child -> stripped(child, panelId)).toList();
      return section.withChildren(children);
    }
    Panel panel = (Panel) node;
    return panel.id().equals(panelId)
        ? panel.withSettings(panel.settings().edit().construction(null).build())
        : panel;
  }

  /** A sheet whose total has no target. */
  static ReceiverSheet withoutTarget(ReceiverSheet sheet) {
    List<LedgerRow> rows = new ArrayList<>(sheet.rows());
    LedgerRow total = rows.get(0);
    rows.set(
        0, row("", total.id(), total.name(), RowKind.TOTAL, total.meanSquares(), Judgement.NONE));
    return new ReceiverSheet(sheet.condition(), sheet.receiver(), rows, sheet.range());
  }

  static LedgerRow row(
      String parent,
      String id,
      String name,
      RowKind kind,
      BandSpectrum meanSquares,
      Judgement judgement) {
    return new LedgerRow(
        id, parent, 0, name, kind, Way.ALL, "chosen", meanSquares, judgement, Status.OK, "");
  }
}
