package eddyledger.workbook;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.quantity.Progress;
import eddyledger.workbook.LedgerLine.Part;
import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;

/** Writes one receiver and condition on the ledger sheet. */
final class BlockWriter {
  /** Size of a heading's letters over that of the body. */
  private static final double HEADING_SIZE = 1.3;

  private final Page page;
  private final BookPlan plan;
  private final LedgerWidths widths;

  BlockWriter(Page page, BookPlan plan, LedgerWidths widths) {
    this.page = page;
    this.plan = plan;
    this.widths = widths;
  }

  void write(Block block, Progress progress) {
    heading(block);
    for (LedgerLine line : block.lines()) {
      progress.check();
      line(block, line);
    }
    new FlowWriter(page).write(block);
    new RangeWriter(page, plan, widths).write(block);
  }

  private void heading(Block block) {
    Look small = Look.of(Format.TEXT, Emphasis.SMALL);
    Look heading = Look.of(Format.TEXT, Emphasis.HEADING);
    String receiver = block.sheet().receiver().name() + " (" + block.pair().receiver() + ")";
    String condition =
        "in " + block.sheet().condition().name() + " (" + block.pair().condition() + ")";
    // the condition stands beside the repeated columns on both pages of a print
    page.line(block.title())
        .height(Heights.most(20, Heights.of(receiver, widths.name() / HEADING_SIZE)))
        .text(LedgerColumns.CONDITION, block.pair().condition(), small)
        .text(LedgerColumns.RECEIVER, block.pair().receiver(), small)
        .text(LedgerColumns.NAME, receiver, Look.of(Format.WRAPPED, Emphasis.HEADING))
        .text(LedgerColumns.ID, condition, heading)
        .text(LedgerColumns.BAND, condition, heading);
    String notes = block.total().row().reason();
    page.line(block.title() + 1)
        .height(Heights.of(notes, widths.notes()))
        .text(LedgerColumns.CONDITION, block.pair().condition(), small)
        .text(LedgerColumns.RECEIVER, block.pair().receiver(), small)
        .text(LedgerColumns.ID, notes, Look.of(Format.WRAPPED, Emphasis.SMALL));
    page.merge(block.title() + 1, LedgerColumns.ID, LedgerColumns.REASON);
  }

  private void line(Block block, LedgerLine planned) {
    LedgerRow row = planned.row();
    int number = planned.number();
    LedgerLooks looks = LedgerLooks.of(planned);
    LedgerFormulas formulas = new LedgerFormulas(number);
    Line line = page.line(number);
    names(line, block, looks.emphasis());
    line.text(LedgerColumns.NAME, row.name(), looks.result(Format.TEXT).indented(planned.depth()));
    line.text(LedgerColumns.ID, row.id(), looks.result(Format.TEXT));
    line.text(LedgerColumns.KIND, row.kind().text(), looks.result(Format.TEXT));
    boolean none = row.kind() == RowKind.OTHER || planned.part() == Part.SILENT;
    String way = none ? Answer.NOT_ASKED : LedgerLooks.word(planned.way());
    line.text(LedgerColumns.WAY, way, looks.way(planned.way()));
    overall(line, formulas, looks, Answer.level(row.levelA()), Answer.level(row.level()));
    line.formula(
        LedgerColumns.SHARE,
        formulas.share(block.total().number()),
        Results.share(row.levelA(), block.total().row().levelA()),
        looks.result(Format.SHARE));
    new JudgementWriter(plan, block).write(line, planned, looks);
    String nothing = Results.nothing(row.status());
    line.formula(
        LedgerColumns.STATUS,
        formulas.status(planned, planned.contributions(), nothing),
        Results.status(
            planned.contributes(),
            row.meanSquares(),
            planned.contributions(),
            planned.lacking(),
            nothing),
        looks.result(Format.TEXT));
    reason(line, formulas, planned, looks);
    for (int band = 0; band < Bands.COUNT; band++) {
      band(line, formulas, planned, band, looks);
    }
    helpers(line, formulas, planned);
  }

  /** What every row of a block begins with, so that it can be filtered. */
  static void names(Line line, Block block, Emphasis emphasis) {
    Look small = Look.of(Format.TEXT, emphasis == Emphasis.TOTAL ? emphasis : Emphasis.PLAIN);
    line.text(LedgerColumns.CONDITION, block.pair().condition(), small);
    line.text(LedgerColumns.RECEIVER, block.pair().receiver(), small);
    line.number(LedgerColumns.LINE, line.number(), Look.of(Format.COUNT, small.emphasis()));
  }

  /** The overall levels of a row that is summed. */
  static void overall(
      Line line, LedgerFormulas formulas, LedgerLooks looks, Answer levelA, Answer level) {
    Look look = looks.result(Format.LEVEL);
    line.formula(LedgerColumns.LEVEL_A, formulas.overallA(), levelA, look);
    line.formula(LedgerColumns.LEVEL, formulas.overall(), level, look);
  }

  private static void reason(
      Line line, LedgerFormulas formulas, LedgerLine planned, LedgerLooks looks) {
    boolean total = planned.row().kind() == RowKind.TOTAL;
    Look look = total ? looks.result(Format.WRAPPED) : Look.of(Format.WRAPPED);
    // what a total lacks stands in the notes above it
    if (planned.row().status() == Status.OK || total) {
      if (planned.part() == Part.SILENT) {
        line.text(LedgerColumns.REASON, "holds no panel", look);
      } else {
        line.blank(LedgerColumns.REASON, look);
      }
      return;
    }
    String reason = planned.row().reason();
    line.formula(
        LedgerColumns.REASON,
        new JudgementFormulas(planned.number()).reason(),
        Answer.words(reason),
        look);
    line.text(LedgerColumns.NOTE, reason, Look.of(Format.TEXT));
    line.height(Heights.most(Heights.of(reason, LedgerWidths.REASON)));
  }

  private void band(
      Line line, LedgerFormulas formulas, LedgerLine planned, int band, LedgerLooks looks) {
    int level = LedgerColumns.BAND + band;
    int energy = LedgerColumns.ENERGY + band;
    Look ratio = Look.of(Format.ENERGY);
    BandSpectrum meanSquares = planned.row().meanSquares();
    boolean entered = planned.part() == Part.ENTERED;
    String word = entered ? Results.nothing(planned.row().status()) : Answer.MISSING;
    Answer result = Results.band(meanSquares, band, word);
    Look look = looks.level();
    switch (planned.part()) {
      case ENTERED, SILENT -> line.value(level, result, look);
      case LINKED ->
          line.formula(
              level, LedgerFormulas.linked(plan.source(planned.row().id(), band)), result, look);
      case SUM, SUM_OF_WAY ->
          line.formula(level, formulas.levelSummed(planned, band), result, look);
    }
    Answer sum = Answer.number(Results.energy(meanSquares, band));
    switch (planned.part()) {
      case ENTERED, LINKED -> line.formula(energy, formulas.energyEntered(band), sum, ratio);
      case SUM, SUM_OF_WAY -> line.formula(energy, formulas.sum(planned, energy), sum, ratio);
      case SILENT -> line.number(energy, 0.0, ratio);
    }
  }

  private static void helpers(Line line, LedgerFormulas formulas, LedgerLine planned) {
    Look whole = Look.of(Format.WHOLE);
    line.number(LedgerColumns.INTO, planned.into(), whole);
    line.number(LedgerColumns.INTO_WAY, planned.intoWay(), whole);
    switch (planned.part()) {
      case ENTERED, LINKED ->
          line.formula(
              LedgerColumns.LACKING,
              formulas.lacking(),
              Answer.number((double) planned.lacking()),
              whole);
      case SUM, SUM_OF_WAY ->
          line.formula(
              LedgerColumns.LACKING,
              formulas.sum(planned, LedgerColumns.LACKING),
              Answer.number((double) planned.lacking()),
              whole);
      case SILENT -> line.number(LedgerColumns.LACKING, 0, whole);
    }
    LedgerRow row = planned.row();
    boolean ranked = Largest.ranked(planned);
    if (ranked) {
      String level = Columns.cell(LedgerColumns.LEVEL_A, planned.number());
      String formula =
          "IF(ISNUMBER("
              + level
              + "),"
              + level
              + "-"
              + Columns.cell(LedgerColumns.LINE, planned.number())
              + "*"
              + JudgementFormulas.NOISE
              + ",\"\")";
      double levelA = row.levelA();
      Answer key =
          Answer.level(levelA).isNumber() ? Answer.number(Largest.key(planned)) : Answer.words("");
      line.formula(LedgerColumns.RANK, formula, key, Look.of(Format.THREE));
    }
  }
}
