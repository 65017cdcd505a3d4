package eddyledger.workbook;

import eddyledger.ledger.Judgement;
import eddyledger.ledger.LedgerRow;
import eddyledger.workbook.Block.Pair;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Writes levels and margins: a row for each receiver and condition. */
final class PairTable {
  private static final int LOWEST = 10;
  private static final int HIGHEST = 11;
  private static final int MODELS = 12;

  private static final List<String> HEADERS =
      List.of(
          "Condition",
          "Receiver",
          "Target, dB(A)",
          "Reserve, dB",
          "Allowed, dB(A)",
          "Level, dB(A)",
          "Level, dB",
          "Margin, dB",
          "State",
          "Status",
          "Model range from, dB(A)",
          "Model range up to, dB(A)",
          "Which models give the lowest, and the highest");

  private final Page page;
  private final BookPlan plan;

  PairTable(Page page, BookPlan plan) {
    this.page = page;
    this.plan = plan;
  }

  void write() {
    int row = plan.summary().firstPair();
    SummaryPage.table(
        page,
        row,
        "Levels and margins",
        "At every receiver in every condition, all sources together, held against the A-weighted"
            + " target.",
        HEADERS);
    for (Block block : plan.blocks()) {
      pair(page.line(row), block);
      row++;
    }
  }

  private void pair(Line line, Block block) {
    LedgerRow total = block.total().row();
    int at = block.total().number();
    Look text = Look.of(Format.WRAPPED);
    String condition = block.sheet().condition().name() + " (" + block.pair().condition() + ")";
    String receiver = block.sheet().receiver().name() + " (" + block.pair().receiver() + ")";
    line.text(0, condition, text);
    line.text(1, receiver, text);
    judgement(line, block);
    Look level = Look.of(Format.LEVEL);
    line.formula(
        TargetTable.LEVEL,
        LedgerColumns.outside(LedgerColumns.LEVEL_A, at),
        Answer.level(total.levelA()),
        level);
    line.formula(
        TargetTable.JUDGED,
        LedgerColumns.outside(LedgerColumns.LEVEL, at),
        Answer.level(total.level()),
        level);
    Answer status =
        Results.status(
            block.total().contributes(),
            total.meanSquares(),
            block.total().contributions(),
            block.total().lacking(),
            Results.nothing(total.status()));
    line.formula(9, JudgementFormulas.statusOf(at), status, text.indented(1));
    range(line, block);
    line.height(
        Heights.most(
            Heights.of(condition, 27), Heights.of(receiver, 25), Heights.of(models(block), 46)));
  }

  private void judgement(Line line, Block block) {
    Judgement judgement = block.total().row().judgement();
    TargetPlan targets = plan.targets();
    Pair pair = block.pair();
    Look level = Look.of(Format.LEVEL);
    Look word = Look.of(Format.WORD);
    if (targets.overall(pair, TargetTable.TARGET).isEmpty()) {
      for (int column = TargetTable.TARGET; column <= TargetTable.ALLOWED; column++) {
        line.text(column, Answer.NOT_ASKED, word);
      }
      line.text(TargetTable.MARGIN, Answer.NOT_ASKED, word);
      line.text(TargetTable.STATE, "no target", word);
      return;
    }
    double[] asked = {judgement.target(), judgement.reserve(), judgement.allowance()};
    for (int i = 0; i < asked.length; i++) {
      int column = TargetTable.TARGET + i;
      line.formula(
          column, targets.overall(pair, column).orElseThrow(), Answer.number(asked[i]), level);
    }
    line.formula(
        TargetTable.MARGIN,
        LedgerColumns.outside(LedgerColumns.MARGIN, block.total().number()),
        Results.margin(judgement.allowance(), block.total().row().levelA()),
        Look.of(Format.MARGIN));
    line.formula(
        TargetTable.STATE,
        targets.overall(pair, TargetTable.STATE).orElseThrow(),
        Answer.state(judgement.state()),
        word);
  }

  private void range(Line line, Block block) {
    String levels = LedgerColumns.outside(LedgerColumns.LEVEL_A, block.chosen(), block.end());
    Look look = Look.of(Format.LEVEL);
    List<LedgerRow> known = known(block);
    extreme(line, LOWEST, "MIN", levels, known.isEmpty() ? null : known.get(0), look);
    LedgerRow last = known.isEmpty() ? null : known.get(known.size() - 1);
    extreme(line, HIGHEST, "MAX", levels, last, look);
    String names = LedgerColumns.outside(LedgerColumns.ID, block.chosen(), block.end());
    String formula =
        "IF(ISNUMBER("
            + Columns.cell(LOWEST, line.number())
            + "),"
            + name(names, levels, LOWEST, line.number())
            + "&\"; \"&"
            + name(names, levels, HIGHEST, line.number())
            + ",\"n/a\")";
    line.formula(MODELS, formula, Answer.words(models(block)), Look.of(Format.WRAPPED).indented(1));
  }

  private static void extreme(
      Line line, int column, String function, String levels, LedgerRow row, Look look) {
    line.formula(
        column,
        "IF(COUNT(" + levels + ")>0," + function + "(" + levels + "),\"n/a\")",
        row == null ? Answer.words(Answer.UNAVAILABLE) : Answer.number(row.levelA()),
        look.in(Role.RESULT));
  }

  private static String name(String names, String levels, int column, int row) {
    return "INDEX(" + names + ",MATCH(" + Columns.cell(column, row) + "," + levels + ",0))";
  }

  private static String models(Block block) {
    List<LedgerRow> known = known(block);
    if (known.isEmpty()) {
      return Answer.UNAVAILABLE;
    }
    double highest = known.get(known.size() - 1).levelA();
    // as the formula does, the first of equals
    LedgerRow first =
        known.stream().filter(row -> row.levelA() == highest).findFirst().orElseThrow();
    return known.get(0).choice() + "; " + first.choice();
  }

  /** The models with a level, the lowest first. */
  private static List<LedgerRow> known(Block block) {
    List<LedgerRow> rows = new ArrayList<>();
    rows.add(block.total().row());
    rows.addAll(block.sheet().range());
    return rows.stream()
        .filter(row -> Answer.level(row.levelA()).isNumber())
        .sorted(Comparator.comparingDouble(LedgerRow::levelA))
        .toList();
  }
}
