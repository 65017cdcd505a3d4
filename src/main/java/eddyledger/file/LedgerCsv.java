package eddyledger.file;

import eddyledger.ledger.Judgement;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.util.ArrayList;
import java.util.List;

/**
 * The ledger as a table of comma-separated values: a row per node and way in, then the totals of
 * the model range. New columns are only ever added at the end.
 */
public final class LedgerCsv {
  private static final List<String> COLUMNS =
      List.of(
          "condition_id",
          "receiver_id",
          "node_id",
          "parent_id",
          "name",
          "kind",
          "way",
          "choice",
          "level_dBA",
          "level_dB",
          "target_dBA",
          "reserve_dB",
          "allowance_dBA",
          "margin_dB",
          "state",
          "status",
          "reason");

  private LedgerCsv() {}

  /** The table of some sheets, header first. */
  public static String text(List<ReceiverSheet> sheets) {
    CsvText csv = new CsvText();
    List<String> header = new ArrayList<>(COLUMNS);
    header.addAll(Bands.labels());
    csv.line(header);
    for (ReceiverSheet sheet : sheets) {
      sheet.rows().forEach(row -> csv.line(cells(sheet, row)));
      sheet.range().forEach(row -> csv.line(cells(sheet, row)));
    }
    return csv.toString();
  }

  private static List<String> cells(ReceiverSheet sheet, LedgerRow row) {
    Judgement judgement = row.judgement();
    List<String> cells = new ArrayList<>();
    cells.add(sheet.condition().id());
    cells.add(sheet.receiver().id());
    cells.add(row.id());
    cells.add(row.parent());
    cells.add(CsvText.text(row.name()));
    cells.add(row.kind().text());
    cells.add(row.way().text());
    cells.add(row.choice());
    cells.add(CsvText.number(row.levelA()));
    cells.add(CsvText.number(row.level()));
    cells.add(CsvText.number(judgement.target()));
    cells.add(CsvText.number(judgement.reserve()));
    cells.add(CsvText.number(judgement.allowance()));
    cells.add(CsvText.number(judgement.margin()));
    cells.add(judgement.judged() ? judgement.state().text() : "");
    cells.add(row.status().text());
    cells.add(CsvText.text(row.reason()));
    BandSpectrum levels = row.levels();
    for (int band = 0; band < Bands.COUNT; band++) {
      cells.add(CsvText.number(levels.value(band)));
    }
    return cells;
  }
}
