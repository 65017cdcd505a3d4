package eddyledger.workbook;

import static eddyledger.workbook.LedgerColumns.BAND;
import static eddyledger.workbook.LedgerColumns.ENERGY;
import static eddyledger.workbook.LedgerColumns.INTO;
import static eddyledger.workbook.LedgerColumns.INTO_WAY;
import static eddyledger.workbook.LedgerColumns.KIND;
import static eddyledger.workbook.LedgerColumns.LACKING;
import static eddyledger.workbook.LedgerColumns.LAST_BAND;
import static eddyledger.workbook.LedgerColumns.LAST_ENERGY;
import static eddyledger.workbook.LedgerColumns.LEVEL_A;
import static eddyledger.workbook.LedgerColumns.LINE;

import eddyledger.quantity.Bands;
import eddyledger.workbook.LedgerLine.Part;

/**
 * The formulas of one row of the ledger sheet. Levels are summed through mean squares over (20
 * µPa)², one hidden cell for each level, so that a word in place of a level adds nothing and is
 * counted as lacking. All of them are plain formulas.
 */
final class LedgerFormulas {
  private final int row;
  private final String bands;
  private final String known;

  LedgerFormulas(int row) {
    this.row = row;
    bands = Columns.across(BAND, LAST_BAND, row);
    known = "COUNT(" + bands + ")+COUNTIF(" + bands + ",\"" + Answer.NO_SOUND + "\")";
  }

  /** A level that is entered on another sheet. */
  static String linked(String cell) {
    return "IF(ISNUMBER(" + cell + ")," + cell + ",IF(" + cell + "=\"none\",\"none\",\"missing\"))";
  }

  /** The mean square of a level that is entered, over (20 µPa)². */
  String energyEntered(int band) {
    String level = Columns.cell(BAND + band, row);
    return "IF(ISNUMBER(" + level + "),10^(" + level + "/10),0)";
  }

  /** The sum of a column over the rows that belong to a line. */
  String sum(LedgerLine line, int column) {
    if (line.plain()) {
      return "SUM(" + Columns.down(column, line.first(), line.last()) + ")";
    }
    return "SUMIF("
        + Columns.fixedDown(into(line), line.first(), line.last())
        + ",$"
        + Columns.cell(LINE, row)
        + ","
        + Columns.down(column, line.first(), line.last())
        + ")";
  }

  /** The level of a band from its mean square, or the word for none of it. */
  String levelSummed(LedgerLine line, int band) {
    String column = Columns.down(BAND + band, line.first(), line.last());
    String silent =
        line.plain()
            ? "COUNTIF(" + column + ",\"none\")"
            : "COUNTIFS("
                + Columns.fixedDown(into(line), line.first(), line.last())
                + ",$"
                + Columns.cell(LINE, row)
                + ","
                + column
                + ",\"none\")";
    return level(band, silent);
  }

  private String level(int band, String silent) {
    String energy = Columns.cell(ENERGY + band, row);
    return "IF("
        + energy
        + ">0,10*LOG10("
        + energy
        + "),IF("
        + silent
        + ">0,\"none\",\"missing\"))";
  }

  private static int into(LedgerLine line) {
    return line.part() == Part.SUM_OF_WAY ? INTO_WAY : INTO;
  }

  /** The sum of a column over the panels and sections right below the total. */
  String flow(Block block, int column) {
    LedgerLine total = block.total();
    return "SUMIFS("
        + Columns.down(column, total.first(), block.last())
        + ","
        + flowCriteria(total, block)
        + ")";
  }

  /** The level of a band of the flow over all panels. */
  String flowLevel(Block block, int band) {
    LedgerLine total = block.total();
    String none =
        "COUNTIFS("
            + flowCriteria(total, block)
            + ","
            + Columns.down(BAND + band, total.first(), block.last())
            + ",\"none\")";
    return level(band, none);
  }

  private static String flowCriteria(LedgerLine total, Block block) {
    return Columns.fixedDown(INTO, total.first(), block.last())
        + ","
        + Columns.fixed(LINE, total.number())
        + ","
        + Columns.fixedDown(KIND, total.first(), block.last())
        + ",\"<>other\"";
  }

  /** The A-weighted overall level; a band that lacks makes it unavailable. */
  String overallA() {
    return overall("SUMPRODUCT(a_weight_ratios," + energies() + ")");
  }

  /** The unweighted overall level; a band that lacks makes it unavailable. */
  String overall() {
    return overall("SUM(" + energies() + ")");
  }

  private String overall(String sum) {
    return "IF("
        + known
        + "="
        + Bands.COUNT
        + ",IF(SUM("
        + energies()
        + ")>0,10*LOG10("
        + sum
        + "),\"none\"),\"n/a\")";
  }

  private String energies() {
    return Columns.across(ENERGY, LAST_ENERGY, row);
  }

  /** The share of the total's energy, A-weighted. */
  String share(int total) {
    String level = Columns.cell(LEVEL_A, row);
    String whole = Columns.fixed(LEVEL_A, total);
    return "IF("
        + level
        + "=\"none\",0,IF(AND(ISNUMBER("
        + level
        + "),ISNUMBER("
        + whole
        + ")),10^(("
        + level
        + "-"
        + whole
        + ")/10),\"n/a\"))";
  }

  /** Whether an entered row lacks a band, 1 or 0. */
  String lacking() {
    return "IF(" + known + "<" + Bands.COUNT + ",1,0)";
  }

  /**
   * Whether a row is whole, in words.
   *
   * @param contributions how many contributions it holds
   * @param nothing the word where no band has a value
   */
  String status(LedgerLine line, int contributions, String nothing) {
    String partial =
        line != null && line.contributes()
            ? "(" + Bands.COUNT + "-" + known + ")&\" of " + Bands.COUNT + " bands missing\""
            : Columns.cell(LACKING, row)
                + "&\" of "
                + contributions
                + " contributions lack bands\"";
    return "IF("
        + Columns.cell(LACKING, row)
        + "=0,\"ok\",IF("
        + known
        + "=0,\""
        + nothing
        + "\",\"partial: \"&"
        + partial
        + "))";
  }
}
