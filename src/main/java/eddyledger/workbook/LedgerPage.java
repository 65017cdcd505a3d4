package eddyledger.workbook;

import eddyledger.quantity.AWeighting;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Progress;
import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;
import java.util.List;

/** Writes the ledger sheet: every receiver and condition, a block each, one below the other. */
final class LedgerPage {
  private static final List<String> HEADERS =
      List.of(
          "Condition",
          "Receiver",
          "Line",
          "Vehicle, section, panel or other source",
          "Id",
          "Kind",
          "Way in",
          "Level, dB(A)",
          "Level, dB",
          "Share of the total, %",
          "Target, dB(A)",
          "Reserve, dB",
          "Allowed, dB(A)",
          "Margin, dB",
          "State",
          "Status",
          "Why there is no value");

  private static final String EXPLANATION =
      "Unweighted band levels at the receiver, dB re 20 \u00b5Pa. Levels of sections and totals are"
          + " energy sums of the rows below them; a word in place of a level adds nothing and makes"
          + " every sum above it partial. \"none\" is no sound at all, which is known; \"missing\" and"
          + " \"failed\" are not known. An overall level needs all 28 bands.";

  private static final String HIDDEN =
      "Hidden columns to the right hold mean squares over (20 \u00b5Pa)\u00b2, what is summed into"
          + " what, and how many contributions lack bands. The sheet is locked without a password."
          + " Where a panel's sound comes in more than one way, each way has its own row.";

  private final Page page;
  private final BookPlan plan;

  LedgerPage(Page page, BookPlan plan) {
    this.page = page;
    this.plan = plan;
  }

  /** Writes all blocks, telling how far it is. */
  void write(String title, Progress progress) {
    LedgerWidths widths = LedgerWidths.of(plan.blocks());
    page.widths(widths.columns());
    for (int band = 0; band < Bands.COUNT; band++) {
      page.width(LedgerColumns.BAND + band, 6.7);
      page.width(LedgerColumns.ENERGY + band, 10);
    }
    page.hide(LedgerColumns.ENERGY, LedgerColumns.NOTE);
    page.line(1).height(24).text(0, title, Look.of(Format.TEXT, Emphasis.TITLE));
    explain(2, EXPLANATION, widths);
    explain(3, HIDDEN, widths);
    weights();
    header();
    BlockWriter writer = new BlockWriter(page, plan, widths);
    List<Block> blocks = plan.blocks();
    for (int i = 0; i < blocks.size(); i++) {
      writer.write(blocks.get(i), progress);
      if (i > 0) {
        page.frame().setRowBreak(blocks.get(i).title() - 2);
      }
      progress.done(i + 1, blocks.size());
    }
  }

  /** Stands beside the columns that are repeated, so that no page cuts it. */
  private void explain(int row, String text, LedgerWidths widths) {
    Look look = Look.of(Format.WRAPPED, Emphasis.SMALL);
    double height = Heights.of(text, widths.notes());
    page.line(row).height(height).text(LedgerColumns.ID, text, look);
    page.merge(row, LedgerColumns.ID, LedgerColumns.REASON);
  }

  private void weights() {
    Line line = page.line(LedgerColumns.WEIGHT_ROW);
    Look small = Look.of(Format.TEXT, Emphasis.SMALL);
    line.text(LedgerColumns.REASON, "A-weight of the band, dB", small);
    Look weight = Look.of(Format.BAND, Role.RESULT);
    for (int band = 0; band < Bands.COUNT; band++) {
      double value = AWeighting.weights().value(band);
      line.number(LedgerColumns.BAND + band, value, weight);
      line.formula(
          LedgerColumns.ENERGY + band,
          "10^(" + Columns.cell(LedgerColumns.BAND + band, LedgerColumns.WEIGHT_ROW) + "/10)",
          Answer.number(AWeighting.energyRatios().value(band)),
          Look.of(Format.ENERGY));
    }
  }

  private void header() {
    Line line = page.line(LedgerColumns.HEADER_ROW).height(36);
    Look left = Look.of(Format.TEXT, Emphasis.HEADER);
    Look centre = Look.of(Format.WORD, Emphasis.HEADER);
    for (int column = 0; column < HEADERS.size(); column++) {
      boolean words = column == LedgerColumns.NAME || column == LedgerColumns.ID;
      line.text(column, HEADERS.get(column), words ? left : centre);
    }
    for (int band = 0; band < Bands.COUNT; band++) {
      line.text(LedgerColumns.BAND + band, Bands.label(band) + " Hz, dB", centre);
      line.text(
          LedgerColumns.ENERGY + band, Bands.label(band) + " Hz, (20 \u00b5Pa)\u00b2", centre);
    }
    line.text(LedgerColumns.INTO, "Summed into line", centre);
    line.text(LedgerColumns.INTO_WAY, "Way summed into line", centre);
    line.text(LedgerColumns.LACKING, "Contributions that lack bands", centre);
    line.text(LedgerColumns.RANK, "Level for the order, dB(A)", centre);
    line.text(LedgerColumns.NOTE, "The program's reason", left);
  }
}
