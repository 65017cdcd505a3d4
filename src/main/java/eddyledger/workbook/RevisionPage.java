package eddyledger.workbook;

import eddyledger.model.ChangeEntry;
import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;
import java.time.Instant;
import java.time.LocalDateTime;
import java.time.ZoneOffset;
import java.util.List;
import org.apache.poi.ss.usermodel.DateUtil;

/** Writes the change log, the newest entry first. */
final class RevisionPage {
  static final String SHEET = "revision";
  static final int HEADER_ROW = 3;
  static final int LAST_COLUMN = 6;

  private static final double[] WIDTHS = {18, 22, 38, 26, 26, 44, 24};

  private static final List<String> HEADERS =
      List.of(
          "When, UTC",
          "Who",
          "What was changed",
          "Old value, with its unit",
          "New value, with its unit",
          "Reason",
          "Agreed with");

  private final Page page;

  RevisionPage(Page page) {
    this.page = page;
  }

  void write(String title, List<ChangeEntry> log) {
    page.widths(WIDTHS);
    page.line(1).height(24).text(0, title, Look.of(Format.TEXT, Emphasis.TITLE));
    page.line(2)
        .text(
            0,
            "The project's change log, the newest first. It only grows.",
            Look.of(Format.TEXT, Emphasis.SMALL));
    Line header = page.line(HEADER_ROW).height(24);
    for (int column = 0; column < HEADERS.size(); column++) {
      header.text(column, HEADERS.get(column), Look.of(Format.TEXT, Emphasis.HEADER));
    }
    int row = HEADER_ROW + 1;
    for (int i = log.size() - 1; i >= 0; i--) {
      entry(page.line(row), log.get(i));
      row++;
    }
    if (log.isEmpty()) {
      page.line(row).text(0, "No change is logged.", Look.of(Format.TEXT));
    }
  }

  private static void entry(Line line, ChangeEntry entry) {
    line.value(0, when(entry.when()), Look.of(Format.INSTANT));
    String[] words = {
      entry.who(),
      entry.what(),
      entry.oldValue(),
      entry.newValue(),
      entry.reason(),
      entry.agreedWith()
    };
    double height = Heights.most();
    for (int i = 0; i < words.length; i++) {
      String text = Answer.text(words[i]).words();
      line.text(1 + i, text, Look.of(Format.WRAPPED));
      height = Heights.most(height, Heights.of(text, WIDTHS[1 + i]));
    }
    line.height(height);
  }

  /** The instant as a date of the spreadsheet, in universal time. */
  private static Answer when(Instant when) {
    if (when == null) {
      return Answer.words(Answer.NOT_ASKED);
    }
    LocalDateTime utc = LocalDateTime.ofInstant(when, ZoneOffset.UTC);
    double serial = DateUtil.getExcelDate(utc, false);
    // before 1900 there are no dates in a spreadsheet
    return serial < 1.0 ? Answer.words(when.toString()) : Answer.number(serial);
  }
}
