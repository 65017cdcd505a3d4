package eddyledger.workbook;

import eddyledger.ledger.Choice;
import eddyledger.ledger.LedgerRow;
import eddyledger.quantity.Bands;
import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;
import java.util.List;

/**
 * Writes the model range of a total: the chosen models, which follow the ledger, and the
 * alternatives, which only the program can follow.
 */
final class RangeWriter {
  private final Page page;
  private final BookPlan plan;
  private final LedgerWidths widths;

  RangeWriter(Page page, BookPlan plan, LedgerWidths widths) {
    this.page = page;
    this.plan = plan;
    this.widths = widths;
  }

  void write(Block block) {
    chosen(block);
    List<LedgerRow> range = block.sheet().range();
    for (int i = 0; i < range.size(); i++) {
      alternative(block, range.get(i), block.chosen() + 1 + i);
    }
  }

  private Line begin(Block block, LedgerRow row, int number) {
    Line line = page.line(number);
    BlockWriter.names(line, block, Emphasis.PLAIN);
    line.text(LedgerColumns.NAME, "Total: " + words(row), Look.of(Format.WRAPPED));
    line.text(LedgerColumns.ID, row.choice(), Look.of(Format.TEXT));
    line.text(LedgerColumns.KIND, "range", Look.of(Format.TEXT));
    line.text(LedgerColumns.WAY, LedgerLooks.word(row.way()), Look.of(Format.TEXT));
    line.text(LedgerColumns.SHARE, Answer.NOT_ASKED, Look.of(Format.WORD));
    return line;
  }

  /** What a choice of models means, shortly. */
  static String words(LedgerRow row) {
    return Choice.all().stream()
        .filter(choice -> choice.name().equals(row.choice()))
        .map(Choice::words)
        .findFirst()
        .orElse(row.choice());
  }

  private void chosen(Block block) {
    LedgerRow row = block.total().row();
    Line line = begin(block, row, block.chosen());
    int total = block.total().number();
    Look level = Look.of(Format.LEVEL);
    same(line, LedgerColumns.LEVEL_A, total, Answer.level(row.levelA()), level);
    same(line, LedgerColumns.LEVEL, total, Answer.level(row.level()), level);
    new JudgementWriter(plan, block).range(line, row);
    for (int band = 0; band < Bands.COUNT; band++) {
      Answer answer = Results.band(row.meanSquares(), band, Answer.MISSING);
      same(line, LedgerColumns.BAND + band, total, answer, Look.of(Format.BAND));
    }
    Answer status =
        Results.status(
            block.total().contributes(),
            row.meanSquares(),
            block.total().contributions(),
            block.total().lacking(),
            Results.nothing(row.status()));
    same(line, LedgerColumns.STATUS, total, status, Look.of(Format.TEXT));
    line.blank(LedgerColumns.REASON, Look.of(Format.WRAPPED));
  }

  private static void same(Line line, int column, int row, Answer answer, Look look) {
    line.formula(column, Columns.cell(column, row), answer, look);
  }

  private void alternative(Block block, LedgerRow row, int number) {
    Line line = begin(block, row, number);
    Look level = Look.of(Format.LEVEL, Role.PROGRAM);
    line.value(LedgerColumns.LEVEL_A, Answer.level(row.levelA()), level);
    line.value(LedgerColumns.LEVEL, Answer.level(row.level()), level);
    new JudgementWriter(plan, block).range(line, row);
    line.text(LedgerColumns.STATUS, row.status().text(), Look.of(Format.TEXT, Role.PROGRAM));
    line.text(LedgerColumns.REASON, row.reason(), Look.of(Format.WRAPPED));
    line.height(
        Heights.most(
            Heights.of(row.reason(), LedgerWidths.REASON),
            Heights.of("Total: " + words(row), widths.name())));
    for (int band = 0; band < Bands.COUNT; band++) {
      line.value(
          LedgerColumns.BAND + band,
          Results.band(row.meanSquares(), band, Answer.MISSING),
          Look.of(Format.BAND, Role.PROGRAM));
    }
  }
}
