package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.chart.Palette;
import eddyledger.ledger.State;
import eddyledger.present.TraceNote;
import eddyledger.present.TraceStage;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.util.ArrayList;
import java.util.List;

/**
 * Lays out and paints the words of a stage: left what happens, right rule and numbers, below notes.
 */
final class TraceWords {
  private static final double LEAST = 70.0;
  private static final double AIR = 7.0;
  private static final double LINE = 17.0;
  private static final double SMALL_LINE = 15.0;
  private static final double ASCENT = 12.0;

  private record Note(TraceNote.Kind kind, List<String> lines) {}

  private final TraceStage stage;
  private final TraceColumns columns;
  private final List<String> sentence;
  private final List<String> origin;
  private final List<String> rule;
  private final List<String> numbers;
  private final List<Note> notes = new ArrayList<>();

  TraceWords(TraceStage stage, TraceColumns columns) {
    this.stage = stage;
    this.columns = columns;
    sentence = MarkupPainter.wrap(Theme.body(), stage.sentence(), columns.stepWidth());
    origin = MarkupPainter.wrap(Theme.small(), stage.origin(), columns.stepWidth());
    rule = MarkupPainter.wrap(Theme.body(), stage.rule(), columns.ruleWidth());
    numbers = MarkupPainter.wrap(Theme.body(), stage.numbers(), columns.ruleWidth());
    for (TraceNote note : stage.notes()) {
      double width = columns.noteWidth();
      double word = Digits.width(word(), note.kind().word() + "  ");
      // the first line begins after the word: keep its place free by leading spaces of that width
      List<String> lines = MarkupPainter.wrap(Theme.small(), note.text(), width - word);
      notes.add(new Note(note.kind(), lines));
    }
  }

  private static Font word() {
    return Theme.strong(11f);
  }

  /** Height of all of it, pixels. */
  double height() {
    double notesHeight = notes.stream().mapToDouble(note -> note.lines().size()).sum() * SMALL_LINE;
    double words = Math.max(left(), right());
    double gap = notes.isEmpty() ? 0.0 : 3.0;
    return Math.max(LEAST, AIR + words + gap + notesHeight + AIR);
  }

  private double left() {
    return LINE + sentence.size() * LINE + origin.size() * SMALL_LINE;
  }

  private double right() {
    return (rule.size() + numbers.size()) * (LINE + 1);
  }

  /** Paints it into a row of a height. */
  void paint(Graphics2D g, Palette palette, double rowHeight) {
    double top = AIR + Math.max(0.0, (rowHeight - height()) / 2.0);
    double spare = notes.isEmpty() ? Math.max(0.0, rowHeight - 2 * AIR - left()) / 2.0 : 0.0;
    leftWords(g, palette, top + spare);
    double words = Math.max(left(), right());
    double room = notes.isEmpty() ? rowHeight - 2 * AIR : words;
    rightWords(g, palette, AIR + (room - right()) / 2.0);
    double y = top + words + 3.0;
    for (Note note : notes) {
      y = note(g, palette, note, y);
    }
  }

  private void leftWords(Graphics2D g, Palette palette, double top) {
    double y = top + ASCENT;
    Font name = Theme.strong(13f);
    g.setFont(name);
    g.setColor(palette.ink2());
    Digits.drawRight(g, Integer.toString(stage.number()), columns.step() - 12, y);
    g.setColor(palette.ink());
    g.drawString(stage.name(), (float) columns.step(), (float) y);
    y += LINE;
    y = lines(g, Theme.body(), palette.ink(), sentence, columns.step(), y, LINE);
    lines(g, Theme.small(), palette.ink2(), origin, columns.step(), y, SMALL_LINE);
  }

  private void rightWords(Graphics2D g, Palette palette, double top) {
    double y = top + ASCENT;
    y = lines(g, Theme.body(), palette.ink2(), rule, columns.rule(), y, LINE + 1);
    lines(g, Theme.body(), palette.ink(), numbers, columns.rule(), y, LINE + 1);
  }

  private double note(Graphics2D g, Palette palette, Note note, double top) {
    double baseline = top + SMALL_LINE - 4;
    boolean doubt = note.kind() == TraceNote.Kind.DOUBT || note.kind() == TraceNote.Kind.MISSING;
    g.setFont(word());
    g.setColor(doubt ? palette.stateText(State.TIGHT) : palette.ink2());
    String kind = note.kind().word() + "  ";
    g.drawString(kind, (float) columns.step(), (float) baseline);
    double x = columns.step() + Digits.width(word(), kind);
    Color ink = doubt ? palette.ink() : palette.ink2();
    return lines(g, Theme.small(), ink, note.lines(), x, baseline, SMALL_LINE) - SMALL_LINE + 4;
  }

  private static double lines(
      Graphics2D g, Font font, Color colour, List<String> lines, double x, double y, double step) {
    double baseline = y;
    g.setColor(colour);
    for (String line : lines) {
      MarkupPainter.draw(g, font, line, x, baseline);
      baseline += step;
    }
    return baseline;
  }
}
