package eddyledger.workbook;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.Status;
import eddyledger.model.BandTable;
import eddyledger.model.JudgedBands;
import eddyledger.model.OtherSource;
import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;
import java.util.Arrays;
import java.util.List;

/** Writes the sheet of other sources, whose levels are entered there and followed by the ledger. */
final class OthersPage {
  static final String SHEET = "other sources";

  /** Its name as formulas begin with it. */
  static final String QUOTED = "'" + SHEET + "'!";

  static final int HEADER_ROW = 4;
  static final int FIRST_ROW = 5;
  static final int BAND = 11;
  static final int LAST_BAND = BAND + Bands.COUNT - 1;

  private static final int VALUE = 4;
  private static final int LEVEL_A = 5;
  private static final int REASON = 10;

  private static final List<String> HEADERS =
      List.of(
          "Condition",
          "Receiver",
          "Other source",
          "Id",
          "Value",
          "Level, dB(A)",
          "Level, dB",
          "Evidence grade",
          "Kind of value",
          "Source",
          "Why there is no value");

  private static final double[] WIDTHS = {12, 13, 30, 30, 7, 8, 8, 13, 10, 46, 30};

  private final Page page;
  private final BookPlan plan;
  private final List<OtherSource> sources;

  OthersPage(Page page, BookPlan plan, List<OtherSource> sources) {
    this.page = page;
    this.plan = plan;
    this.sources = sources;
  }

  /** How many rows a source takes: its best estimate, and the low and high that were judged. */
  static int rows(OtherSource source) {
    return 1 + (source.levels().low() == null ? 0 : 1) + (source.levels().high() == null ? 0 : 1);
  }

  void write(String title) {
    page.widths(WIDTHS);
    for (int band = 0; band < Bands.COUNT; band++) {
      page.width(BAND + band, 6.7);
    }
    Look small = Look.of(Format.TEXT, Emphasis.SMALL);
    page.line(1).height(24).text(0, title, Look.of(Format.TEXT, Emphasis.TITLE));
    page.line(2)
        .text(
            0,
            "Contributions that are not flow over a panel, measured or agreed: unweighted band"
                + " levels at the receiver, dB re 20 \u00b5Pa. The ledger follows what is entered here;"
                + " a band without a number is missing, unless it says none (no sound at all).",
            small);
    page.line(3)
        .text(0, "Low and high are what was judged; no level of the ledger uses them.", small);
    Line header = page.line(HEADER_ROW).height(36);
    for (int column = 0; column < HEADERS.size(); column++) {
      header.text(column, HEADERS.get(column), Look.of(Format.TEXT, Emphasis.HEADER));
    }
    for (int band = 0; band < Bands.COUNT; band++) {
      Look centre = Look.of(Format.WORD, Emphasis.HEADER);
      header.text(BAND + band, Bands.label(band) + " Hz, dB", centre);
    }
    sources.forEach(this::source);
    if (sources.isEmpty()) {
      page.line(FIRST_ROW).text(0, "No other source is entered.", Look.of(Format.TEXT));
    }
  }

  private void source(OtherSource source) {
    int row = plan.othersRow(source.id());
    best(source, row);
    JudgedBands levels = source.levels();
    int next = row + 1;
    if (levels.low() != null) {
      judged(source, "low", levels.low(), next);
      next++;
    }
    if (levels.high() != null) {
      judged(source, "high", levels.high(), next);
    }
  }

  private Line begin(OtherSource source, String value, int row) {
    Look text = Look.of(Format.TEXT);
    return page.line(row)
        .text(0, source.condition(), text)
        .text(1, source.receiver(), text)
        .text(2, source.name(), text)
        .text(3, source.id(), text)
        .text(VALUE, value, text);
  }

  private void best(OtherSource source, int row) {
    Line line = begin(source, "best", row);
    LedgerLine planned = plan.otherLine(source.id());
    LedgerRow ledger = planned == null ? null : planned.row();
    Look level = Look.of(Format.LEVEL);
    if (ledger == null) {
      line.text(LEVEL_A, Answer.UNAVAILABLE, level).text(LEVEL_A + 1, Answer.UNAVAILABLE, level);
    } else {
      line.formula(
          LEVEL_A,
          LedgerColumns.outside(LedgerColumns.LEVEL_A, planned.number()),
          Answer.level(ledger.levelA()),
          level);
      line.formula(
          LEVEL_A + 1,
          LedgerColumns.outside(LedgerColumns.LEVEL, planned.number()),
          Answer.level(ledger.level()),
          level);
    }
    String from = evidence(line, source);
    String reason = reason(ledger);
    line.text(REASON, reason, Look.of(Format.WRAPPED));
    line.height(Heights.most(Heights.of(from, 46), Heights.of(reason, 30)));
    BandSpectrum meanSquares = ledger == null ? nothing() : ledger.meanSquares();
    String word = ledger == null ? Answer.MISSING : Results.nothing(ledger.status());
    for (int band = 0; band < Bands.COUNT; band++) {
      line.value(
          BAND + band,
          Results.band(meanSquares, band, word),
          Look.of(Format.BAND, ledger == null ? Role.PROGRAM : Role.INPUT));
    }
  }

  private static BandSpectrum nothing() {
    double[] missing = new double[Bands.COUNT];
    Arrays.fill(missing, Double.NaN);
    return BandSpectrum.of(missing);
  }

  private static String reason(LedgerRow ledger) {
    if (ledger == null) {
      return "in no ledger: its receiver or condition is not known";
    }
    return ledger.status() == Status.OK ? "" : "when this was computed: " + ledger.reason();
  }

  private static String evidence(Line line, OtherSource source) {
    Look text = Look.of(Format.TEXT);
    String from = Words.source(source.levels().evidence());
    line.text(7, Words.grade(source.levels().evidence()), text);
    line.text(8, Words.kind(source.levels().evidence()), text);
    line.text(9, from, Look.of(Format.WRAPPED));
    return from;
  }

  private void judged(OtherSource source, String value, BandTable table, int row) {
    Line line = begin(source, value, row);
    Look program = Look.of(Format.BAND, Role.PROGRAM);
    line.blanks(LEVEL_A, REASON, Look.of(Format.TEXT));
    BandSpectrum levels = Words.spectrum(table);
    for (int band = 0; band < Bands.COUNT; band++) {
      Answer answer =
          levels.has(band) ? Answer.number(levels.value(band)) : Answer.words(Answer.MISSING);
      line.value(BAND + band, answer, program);
    }
  }
}
