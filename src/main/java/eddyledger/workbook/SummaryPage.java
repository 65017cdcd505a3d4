package eddyledger.workbook;

import eddyledger.check.Cautions;
import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;
import eddyledger.workbook.TargetPlan.TargetLine;
import java.util.List;

/** Writes the first sheet: cautions, levels and margins, targets, largest contributions. */
final class SummaryPage {
  private static final double[] WIDTHS = {27, 25, 9, 9, 9, 9, 9, 9, 11, 31, 10, 10, 46};

  private static final String CONVENTIONS =
      "Levels re 20 \u00b5Pa. Margin = allowed minus level; positive is good. Allowed = target minus"
          + " reserve. A total that says partial is a lower bound: something below it has no value.";

  private static final String RANGE =
      "Before you trust a number look at its model range: the level under the other published"
          + " models. Alternatives are the program's and do not follow what is changed here.";

  private final Page page;
  private final BookPlan plan;
  private final WorkbookContent content;

  SummaryPage(Page page, BookPlan plan, WorkbookContent content) {
    this.page = page;
    this.plan = plan;
    this.content = content;
  }

  void write() {
    page.widths(WIDTHS);
    heading();
    legend();
    new PairTable(page, plan).write();
    targets();
    new LargestTable(page, plan).write();
    page.hide(TargetTable.LACKING, TargetTable.KEY);
  }

  private void heading() {
    String name = content.vehicle().name() + ": interior flow-noise budget";
    page.line(1).height(26).text(0, name, Look.of(Format.TEXT, Emphasis.TITLE));
    String description = content.vehicle().description();
    paragraph(2, description == null ? "" : description, Emphasis.PLAIN);
    paragraph(3, "Caution. " + Cautions.text() + " " + RANGE, Emphasis.CAUTION);
    paragraph(4, findings(content.findings()), Emphasis.CAUTION);
    paragraph(5, CONVENTIONS, Emphasis.SMALL);
  }

  private void paragraph(int row, String text, Emphasis emphasis) {
    Look look = new Look(Format.WRAPPED, emphasis, Role.RESULT, 0);
    Look unruled = emphasis == Emphasis.PLAIN ? Look.of(Format.WRAPPED, Emphasis.SMALL) : look;
    page.line(row)
        .height(Heights.of(text, 205))
        .blanks(0, SummaryPlan.LAST_COLUMN, unruled)
        .text(0, text, unruled);
    page.merge(row, 0, SummaryPlan.LAST_COLUMN);
  }

  private static String findings(List<Finding> findings) {
    long errors = count(findings, Severity.ERROR) + count(findings, Severity.FATAL);
    return "Findings when this was computed: "
        + plural(errors, "error")
        + ", "
        + plural(count(findings, Severity.WARNING), "warning")
        + ", "
        + plural(count(findings, Severity.NOTE), "note")
        + "; each with its remedy on the sheet assumptions.";
  }

  private static long count(List<Finding> findings, Severity severity) {
    return findings.stream().filter(finding -> finding.severity() == severity).count();
  }

  private static String plural(long number, String word) {
    return number + " " + word + (number == 1 ? "" : "s");
  }

  private void legend() {
    Look words = Look.of(Format.TEXT, Emphasis.SMALL);
    page.line(6).height(6);
    page.line(7)
        .text(0, "Input: every sum follows", Look.of(Format.TEXT, Role.INPUT))
        .text(1, "Only the program follows", Look.of(Format.TEXT, Role.PROGRAM))
        .text(
            2,
            "On a grey field a change would have no effect here (a thickness, say): change the"
                + " project and write the workbook again. Such fields are locked, as formulas are;"
                + " there is no password.",
            words);
    page.line(SummaryPlan.TIGHT_ROW)
        .text(0, "Tight band, dB", Look.of(Format.TEXT))
        .blank(1, Look.of(Format.TEXT))
        .number(
            SummaryPlan.TIGHT_COLUMN,
            content.vehicle().tightBandOrDefault(),
            Look.of(Format.LEVEL, Role.INPUT))
        .text(3, "A margin from zero to this is tight; below zero it is over.", words.indented(1));
  }

  /** Writes heading, note and header of a table of this sheet that begins at a row. */
  static void table(Page page, int first, String heading, String note, List<String> headers) {
    page.line(first - 3).height(20).text(0, heading, Look.of(Format.TEXT, Emphasis.HEADING));
    page.line(first - 2).text(0, note, Look.of(Format.TEXT, Emphasis.SMALL));
    Line line = page.line(first - 1).height(36);
    for (int column = 0; column < headers.size(); column++) {
      boolean merged = column + 1 < headers.size() && headers.get(column + 1).isEmpty();
      boolean words = merged || column < 2 || column == 9 || column == SummaryPlan.LAST_COLUMN;
      Format format = words ? Format.TEXT : Format.WORD;
      Look look = Look.of(format, Emphasis.HEADER);
      line.text(column, headers.get(column), words && column > 1 ? look.indented(1) : look);
    }
  }

  private void targets() {
    int first = plan.summary().firstTarget();
    table(
        page,
        first,
        "Targets and how they are judged",
        "The level is rounded to its step first and may pass what is allowed by the tolerance; the"
            + " margin is not rounded.",
        List.of(
            "Target",
            "Receiver",
            "Target, dB or dB(A)",
            "Reserve, dB",
            "Allowed, dB or dB(A)",
            "Level, dB or dB(A)",
            "Judged, dB or dB(A)",
            "Margin, dB",
            "State",
            "Rating, unit",
            "Rounding step, dB",
            "Tolerance, dB",
            "Condition, evidence and source"));
    TargetTable table = new TargetTable(page, content.vehicle().tightBandOrDefault());
    for (TargetLine line : plan.targets().lines()) {
      table.write(line);
    }
    if (plan.targets().lines().isEmpty()) {
      page.line(first).text(0, "No target is entered.", Look.of(Format.TEXT));
    }
  }
}
