package eddyledger.workbook;

import eddyledger.ledger.RowKind;
import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;
import java.util.List;

/** Writes the five largest contributions at every receiver in every condition, live. */
final class LargestTable {
  private static final int RANK = 2;
  private static final int NAME = 3;
  private static final int LAST_NAME = 8;
  private static final int ID = 9;
  private static final int LEVEL = 10;
  private static final int SHARE = 11;
  private static final int WAY = 12;

  /** Where the contribution stands among the lines of its block; hidden. */
  private static final int POSITION = TargetTable.LACKING;

  private final Page page;
  private final BookPlan plan;

  LargestTable(Page page, BookPlan plan) {
    this.page = page;
    this.plan = plan;
  }

  void write() {
    int first = plan.summary().firstLargest(plan.targets().rows());
    SummaryPage.table(
        page,
        first,
        "Five largest contributions",
        "Panels and other sources with the highest A-weighted level; the share is that of the"
            + " total's A-weighted energy.",
        List.of(
            "Condition",
            "Receiver",
            "Rank",
            "Contribution",
            "",
            "",
            "",
            "",
            "",
            "Id",
            "Level, dB(A)",
            "Share of the total, %",
            "Way in"));
    page.merge(first - 1, NAME, LAST_NAME);
    page.frame().setRowBreak(first - 5);
    int row = first;
    for (Block block : plan.blocks()) {
      List<LedgerLine> largest = Largest.of(block);
      for (int rank = 1; rank <= Largest.SHOWN; rank++) {
        LedgerLine line = rank <= largest.size() ? largest.get(rank - 1) : null;
        contribution(page.line(row), block, rank, line);
        page.merge(row, NAME, LAST_NAME);
        row++;
      }
    }
  }

  /** Last row of the table. */
  static int lastRow(BookPlan plan) {
    int first = plan.summary().firstLargest(plan.targets().rows());
    return first - 1 + Largest.SHOWN * plan.blocks().size();
  }

  private static void contribution(Line line, Block block, int rank, LedgerLine known) {
    Emphasis emphasis = rank == 1 ? Emphasis.SECTION : Emphasis.PLAIN;
    Look text = Look.of(Format.TEXT, emphasis);
    line.text(0, block.pair().condition(), text);
    line.text(1, block.pair().receiver(), text);
    line.number(RANK, rank, Look.of(Format.WHOLE, emphasis));
    String keys = keys(block, LedgerColumns.RANK);
    String position =
        "IF(COUNT("
            + keys
            + ")<"
            + rank
            + ",\"\",MATCH(LARGE("
            + keys
            + ","
            + rank
            + "),"
            + keys
            + ",0))";
    Answer none = Answer.words(Answer.NOT_ASKED);
    boolean there = known != null;
    line.blanks(NAME + 1, LAST_NAME, text);
    Look name = text.indented(1);
    pick(line, NAME, block, LedgerColumns.NAME, there ? words(known.row().name()) : none, name);
    pick(line, ID, block, LedgerColumns.ID, there ? words(known.row().id()) : none, text);
    pick(
        line,
        LEVEL,
        block,
        LedgerColumns.LEVEL_A,
        there ? Answer.number(known.row().levelA()) : none,
        Look.of(Format.LEVEL, emphasis));
    double total = block.total().row().levelA();
    pick(
        line,
        SHARE,
        block,
        LedgerColumns.SHARE,
        there ? Results.share(known.row().levelA(), total) : none,
        Look.of(Format.SHARE, emphasis));
    pick(line, WAY, block, LedgerColumns.WAY, there ? words(way(known)) : none, text.indented(1));
    line.formula(
        POSITION,
        position,
        there
            ? Answer.number((double) (known.number() - block.total().number()))
            : Answer.words(""),
        Look.of(Format.WHOLE));
  }

  private static String way(LedgerLine line) {
    return line.row().kind() == RowKind.OTHER ? Answer.NOT_ASKED : LedgerLooks.word(line.way());
  }

  private static Answer words(String words) {
    return Answer.words(words);
  }

  private static void pick(Line line, int column, Block block, int from, Answer answer, Look look) {
    String position = Columns.fixed(POSITION, line.number());
    line.formula(
        column,
        "IF(ISNUMBER("
            + position
            + "),INDEX("
            + keys(block, from)
            + ","
            + position
            + "),\"\u2013\")",
        answer,
        look);
  }

  private static String keys(Block block, int column) {
    return LedgerColumns.outside(column, block.total().first(), block.last());
  }
}
