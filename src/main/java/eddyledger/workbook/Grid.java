package eddyledger.workbook;

import eddyledger.workbook.Look.Emphasis;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.Look.Role;
import java.util.List;

/** Tables one below the other on the sheet of assumptions; they share its columns. */
final class Grid {
  /** The last column. */
  static final int LAST = 13;

  private static final double[] WIDTHS = {30, 36, 24, 12, 12, 12, 12, 12, 12, 12, 12, 12, 14, 86};

  private final Page page;
  private int row = 1;

  /**
   * A column of a table.
   *
   * @param header its header, with the unit
   * @param format how its values are written
   * @param program whether a change of it here would have no effect
   * @param span over how many columns of the sheet it goes
   */
  record Field(String header, Format format, boolean program, int span) {
    static Field text(String header) {
      return wide(header, 1);
    }

    /** A text over several columns of the sheet. */
    static Field wide(String header, int span) {
      return new Field(header, Format.WRAPPED, false, span);
    }

    static Field entered(String header, Format format) {
      return new Field(header, format, true, 1);
    }

    static Field derived(String header, Format format) {
      return new Field(header, format, false, 1);
    }

    /** The same, but as entered. */
    Field given() {
      return new Field(header, format, true, span);
    }
  }

  Grid(Page page) {
    this.page = page;
    page.widths(WIDTHS);
  }

  /** Title of the sheet. */
  void title(String title, String note) {
    page.line(next()).height(24).text(0, title, Look.of(Format.TEXT, Emphasis.TITLE));
    page.line(next()).text(0, note, Look.of(Format.TEXT, Emphasis.SMALL));
  }

  /** Heading and note; notes may be empty. */
  void heading(String heading, String note) {
    row++;
    page.line(next()).height(20).text(0, heading, Look.of(Format.TEXT, Emphasis.HEADING));
    if (!note.isEmpty()) {
      page.line(next()).text(0, note, Look.of(Format.TEXT, Emphasis.SMALL));
    }
  }

  /** Heading, note and header of a table. */
  void table(String heading, String note, List<Field> fields) {
    heading(heading, note);
    header(fields);
  }

  /** Header of a table. */
  void header(List<Field> fields) {
    int at = next();
    Line line = page.line(at).height(36);
    int column = 0;
    int after = 0;
    for (Field field : fields) {
      boolean words = field.format() == Format.WRAPPED;
      Look look = Look.of(words ? Format.TEXT : Format.WORD, Emphasis.HEADER);
      look = look.indented(words ? after : 0);
      after = words ? 0 : 1;
      line.blanks(column + 1, column + field.span() - 1, look);
      line.text(column, field.header(), look);
      if (field.span() > 1) {
        page.merge(at, column, column + field.span() - 1);
      }
      column += field.span();
    }
  }

  /** A row of a table, one answer for each of its fields. */
  void row(List<Field> fields, List<Answer> answers) {
    int at = next();
    Line line = page.line(at);
    double height = Heights.most();
    int column = 0;
    int after = 0;
    for (int i = 0; i < fields.size(); i++) {
      Field field = fields.get(i);
      Answer answer = answers.get(i);
      int last = column + field.span() - 1;
      boolean words = field.format() == Format.WRAPPED;
      Look look = look(field, answer).indented(words ? after : 0);
      after = words ? 0 : 1;
      line.blanks(column + 1, last, look);
      line.value(column, answer, look);
      if (last > column) {
        page.merge(at, column, last);
      }
      if (!answer.isNumber()) {
        height = Heights.most(height, Heights.of(answer.words(), width(column, last)));
      }
      column = last + 1;
    }
    line.height(height);
  }

  private static Look look(Field field, Answer answer) {
    boolean filled = field.program() && !answer.is(Answer.NOT_ASKED);
    Role role = filled ? Role.PROGRAM : Role.RESULT;
    boolean word = !answer.isNumber() && field.format() != Format.WRAPPED;
    return Look.of(word ? Format.WORD : field.format(), role);
  }

  private static double width(int first, int last) {
    double width = 0.0;
    for (int column = first; column <= last; column++) {
      width += WIDTHS[column];
    }
    return width;
  }

  /** A paragraph over all columns. */
  void paragraph(String text, Emphasis emphasis) {
    int at = next();
    Look look = Look.of(Format.WRAPPED, emphasis);
    page.line(at)
        .height(Heights.of(text, width(0, LAST)))
        .blanks(1, LAST, look)
        .text(0, text, look);
    page.merge(at, 0, LAST);
  }

  private int next() {
    return row++;
  }
}
