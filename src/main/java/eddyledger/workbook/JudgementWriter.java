package eddyledger.workbook;

import eddyledger.ledger.Judgement;
import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Way;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;
import java.util.Optional;

/** Writes what a row may have and how it stands: targets from the summary, allowances entered. */
final class JudgementWriter {
  private final BookPlan plan;
  private final Block block;

  JudgementWriter(BookPlan plan, Block block) {
    this.plan = plan;
    this.block = block;
  }

  /** Nothing is asked of the row. */
  static void none(Line line, LedgerLooks looks) {
    for (int column = LedgerColumns.TARGET; column <= LedgerColumns.STATE; column++) {
      line.text(column, Answer.NOT_ASKED, looks.result(Format.WORD));
    }
  }

  /** Target or allowance, margin and state of a row of the tree. */
  void write(Line line, LedgerLine planned, LedgerLooks looks) {
    RowKind kind = planned.row().kind();
    boolean node = kind == RowKind.SECTION || kind == RowKind.PANEL;
    if (kind == RowKind.TOTAL && planned.row().way() == Way.ALL) {
      total(line, planned.row(), looks);
    } else if (node && planned.row().way() == Way.ALL) {
      allowance(line, planned.row(), looks);
    } else {
      none(line, looks);
    }
  }

  private void total(Line line, LedgerRow row, LedgerLooks looks) {
    if (asked(TargetTable.TARGET).isEmpty()) {
      none(line, looks);
      return;
    }
    Judgement judgement = row.judgement();
    Look level = looks.result(Format.LEVEL);
    line.formula(
        LedgerColumns.TARGET,
        asked(TargetTable.TARGET).orElseThrow(),
        Answer.number(judgement.target()),
        level);
    line.formula(
        LedgerColumns.RESERVE,
        asked(TargetTable.RESERVE).orElseThrow(),
        Answer.number(judgement.reserve()),
        level);
    line.formula(
        LedgerColumns.ALLOWED,
        asked(TargetTable.ALLOWED).orElseThrow(),
        Answer.number(judgement.allowance()),
        level);
    margin(line, row, looks);
    line.formula(
        LedgerColumns.STATE,
        asked(TargetTable.STATE).orElseThrow(),
        Answer.state(judgement.state()),
        looks.result(Format.WORD));
  }

  /** A cell of the target as a formula; empty if the total has none. */
  private Optional<String> asked(int column) {
    return plan.targets().overall(block.pair(), column);
  }

  private static void allowance(Line line, LedgerRow row, LedgerLooks looks) {
    Look word = looks.result(Format.WORD);
    line.text(LedgerColumns.TARGET, Answer.NOT_ASKED, word);
    line.text(LedgerColumns.RESERVE, Answer.NOT_ASKED, word);
    Look input = looks.result(Format.LEVEL).in(Role.INPUT);
    double allowance = row.judgement().allowance();
    if (Double.isNaN(allowance)) {
      line.blank(LedgerColumns.ALLOWED, input);
    } else {
      line.number(LedgerColumns.ALLOWED, allowance, input);
    }
    margin(line, row, looks);
    line.formula(
        LedgerColumns.STATE,
        new JudgementFormulas(line.number()).state(),
        Results.state(row),
        looks.result(Format.WORD));
  }

  private static void margin(Line line, LedgerRow row, LedgerLooks looks) {
    line.formula(
        LedgerColumns.MARGIN,
        new JudgementFormulas(line.number()).margin(),
        Results.margin(row.judgement().allowance(), row.levelA()),
        looks.result(Format.MARGIN));
  }

  /** Margin of a row of the model range under the total's target. */
  void range(Line line, LedgerRow row) {
    LedgerLooks looks = new LedgerLooks(Look.Emphasis.PLAIN, Role.RESULT);
    Look word = looks.result(Format.WORD);
    line.text(LedgerColumns.TARGET, Answer.NOT_ASKED, word);
    line.text(LedgerColumns.RESERVE, Answer.NOT_ASKED, word);
    double allowed = block.total().row().judgement().allowance();
    Answer answer = Double.isNaN(allowed) ? Answer.words(Answer.NOT_ASKED) : Answer.number(allowed);
    line.formula(
        LedgerColumns.ALLOWED,
        Columns.fixed(LedgerColumns.ALLOWED, block.total().number()),
        answer,
        looks.result(Format.LEVEL));
    line.formula(
        LedgerColumns.MARGIN,
        new JudgementFormulas(line.number()).margin(),
        Results.margin(allowed, row.levelA()),
        looks.result(Format.MARGIN));
    line.text(LedgerColumns.STATE, Answer.NOT_ASKED, word);
  }
}
