package eddyledger.workbook;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.Status;
import eddyledger.model.PassRule;
import eddyledger.model.Rating;
import eddyledger.model.Target;
import eddyledger.quantity.Decibels;
import eddyledger.quantity.SpeechInterferenceLevel;
import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;
import eddyledger.workbook.TargetPlan.TargetLine;
import java.util.Optional;

/** Writes the targets and how the levels stand, each after its own pass rule. */
final class TargetTable {
  static final int TARGET = 2;
  static final int RESERVE = 3;
  static final int ALLOWED = 4;
  static final int LEVEL = 5;
  static final int JUDGED = 6;
  static final int MARGIN = 7;
  static final int STATE = 8;

  /** How many contributions lack bands; hidden like the next two. */
  static final int LACKING = 15;

  /** The level where it cannot be judged. */
  static final int UNKNOWN = 16;

  /** Mean square of the level over (20 µPa)². */
  static final int ENERGY = 17;

  /** What puts overall targets in order: the one that allows least, then the least tolerance. */
  static final int KEY = 18;

  private static final Look LEVELS = Look.of(Format.LEVEL);

  private final Page page;
  private final double tightBand;

  TargetTable(Page page, double tightBand) {
    this.page = page;
    this.tightBand = tightBand;
  }

  /** A cell of a target's row as other sheets name it. */
  static String outside(int column, int row) {
    return SummaryPlan.SHEET + "!" + Columns.fixed(column, row);
  }

  /** Writes the rows of a target. */
  void write(TargetLine planned) {
    if (planned.result() == null) {
      unjudged(planned);
      return;
    }
    int row = planned.first();
    for (Block block : planned.blocks()) {
      seat(planned, block, row);
      row++;
    }
    if (planned.blocks().size() > 1) {
      new TargetOverSeats(page, this, planned).write(row);
    }
  }

  private void unjudged(TargetLine planned) {
    Line line = page.line(planned.first());
    Target target = planned.target();
    String receivers = String.join(", ", target.receivers());
    TargetWords.write(line, target, Answer.words(receivers), null);
    line.number(TARGET, target.value(), Look.of(Format.LEVEL, Role.PROGRAM));
    line.number(RESERVE, target.reserve(), Look.of(Format.LEVEL, Role.PROGRAM));
    for (int column = ALLOWED; column < STATE; column++) {
      line.text(column, Answer.UNAVAILABLE, LEVELS);
    }
    line.text(STATE, Answer.NOT_KNOWN, Look.of(Format.WORD));
    line.text(SummaryPlan.LAST_COLUMN, "not judged: see its finding", Look.of(Format.WRAPPED));
  }

  private void seat(TargetLine planned, Block block, int row) {
    Target target = planned.target();
    Line line = page.line(row);
    TargetWords.write(line, target, Answer.words(block.pair().receiver()), null);
    asked(line, target, planned.first());
    LedgerRow total = block.total().row();
    Optional<SpeechInterferenceLevel> speech = SpeechFormula.of(target.rating());
    double level = level(target, total);
    line.formula(LEVEL, levelFormula(target, block, speech), Answer.level(level), LEVELS);
    boolean whole = total.status() == Status.OK;
    String lacking = LedgerColumns.outside(LedgerColumns.LACKING, block.total().number());
    judged(line, target, level, whole);
    Look helper = Look.of(Format.ENERGY);
    Answer lacks = Answer.number((double) block.total().lacking());
    line.formula(LACKING, lacking, lacks, Look.of(Format.WHOLE));
    String cell = Columns.cell(LEVEL, row);
    boolean unknown = state(target, level, whole).is(Answer.NOT_KNOWN);
    line.formula(
        UNKNOWN,
        "IF(AND(ISNUMBER("
            + cell
            + "),"
            + Columns.cell(STATE, row)
            + "=\"not known\"),"
            + cell
            + ",\"\")",
        unknown && Answer.level(level).isNumber() ? Answer.number(level) : Answer.words(""),
        helper);
    if (target.rating() == Rating.OVERALL_A) {
      key(line, target);
    }
    line.formula(
        ENERGY,
        "IF(ISNUMBER(" + cell + "),10^(" + cell + "/10),0)",
        Answer.number(Answer.level(level).isNumber() ? Decibels.ratio(level) : 0.0),
        helper);
  }

  private static void key(Line line, Target target) {
    int row = line.number();
    line.formula(
        KEY,
        Columns.cell(ALLOWED, row)
            + "+0.0001*"
            + Columns.cell(TargetWords.TOLERANCE, row)
            + "+0.000000001*ROW()",
        Answer.number(target.allowed() + 1.0e-4 * target.rule().tolerance() + 1.0e-9 * row),
        Look.of(Format.THREE));
  }

  /** Target, reserve and what is allowed; entered once, in the target's first row. */
  void asked(Line line, Target target, int first) {
    if (line.number() == first) {
      Look input = Look.of(Format.LEVEL, Role.INPUT);
      line.number(TARGET, target.value(), input);
      line.number(RESERVE, target.reserve(), input);
    } else {
      line.formula(TARGET, Columns.cell(TARGET, first), Answer.number(target.value()), LEVELS);
      line.formula(RESERVE, Columns.cell(RESERVE, first), Answer.number(target.reserve()), LEVELS);
    }
    line.formula(
        ALLOWED,
        Columns.cell(TARGET, line.number()) + "-" + Columns.cell(RESERVE, line.number()),
        Answer.number(target.allowed()),
        LEVELS);
  }

  /** The level as the pass rule rounds it, the margin of the level as it is, and the state. */
  void judged(Line line, Target target, double level, boolean whole) {
    int row = line.number();
    String cell = Columns.cell(LEVEL, row);
    String step = Columns.cell(TargetWords.STEP, row);
    PassRule rule = target.rule();
    line.formula(
        JUDGED,
        "IF(ISNUMBER("
            + cell
            + "),IF("
            + step
            + ">0,INT("
            + cell
            + "/"
            + step
            + "+0.5)*"
            + step
            + ","
            + cell
            + "),"
            + cell
            + ")",
        Answer.level(rule.rounding().apply(level)),
        LEVELS);
    String allowed = Columns.cell(ALLOWED, row);
    line.formula(
        MARGIN,
        "IF(ISNUMBER(" + cell + ")," + allowed + "-" + cell + ",\"n/a\")",
        Results.margin(target.allowed(), level),
        Look.of(Format.MARGIN));
    String judged = Columns.cell(JUDGED, row);
    String lacks = Columns.cell(LACKING, row);
    String left =
        "(" + allowed + "+" + Columns.cell(TargetWords.TOLERANCE, row) + "-" + judged + ")";
    line.formula(
        STATE,
        "IF(ISNUMBER("
            + judged
            + "),"
            + JudgementFormulas.state(left, lacks)
            + ",IF(AND("
            + judged
            + "=\"none\","
            + lacks
            + "=0),\"inside\",\"not known\"))",
        state(target, level, whole),
        Look.of(Format.WORD, Emphasis.PLAIN));
  }

  private Answer state(Target target, double level, boolean whole) {
    PassRule rule = target.rule();
    double left = target.allowed() + rule.tolerance() - rule.rounding().apply(level);
    return Results.state(left, whole, tightBand);
  }

  /** Of how many receivers a target's state cannot be said. */
  int unknown(TargetLine planned) {
    Target target = planned.target();
    return (int)
        planned.blocks().stream()
            .map(block -> block.total().row())
            .map(row -> state(target, level(target, row), row.status() == Status.OK))
            .filter(state -> state.is(Answer.NOT_KNOWN))
            .count();
  }

  private static double level(Target target, LedgerRow total) {
    return switch (target.rating()) {
      case OVERALL_A -> total.levelA();
      case OVERALL_LINEAR -> total.level();
      case SIL_500_2K, SIL_1K_4K, SIL_500_4K ->
          total.speechInterference(SpeechFormula.of(target.rating()).orElseThrow());
    };
  }

  private static String levelFormula(
      Target target, Block block, Optional<SpeechInterferenceLevel> speech) {
    int total = block.total().number();
    return switch (target.rating()) {
      case OVERALL_A -> LedgerColumns.outside(LedgerColumns.LEVEL_A, total);
      case OVERALL_LINEAR -> LedgerColumns.outside(LedgerColumns.LEVEL, total);
      case SIL_500_2K, SIL_1K_4K, SIL_500_4K -> SpeechFormula.text(speech.orElseThrow(), total);
    };
  }
}
