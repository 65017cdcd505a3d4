package eddyledger.present;

import java.util.ArrayList;
import java.util.List;

/**
 * One stage of the way from the air outside to the level at the receiver.
 *
 * @param number its number, from 1
 * @param name its name
 * @param sentence what happens, in plain words
 * @param origin where its values come from
 * @param rule the formula, as {@link Markup}
 * @param numbers its numbers with units in the followed band, as {@link Markup}
 * @param notes what was defaulted, filled in or left its range
 * @param picture its small picture
 * @param step what it changes, dB in the followed band; NaN before the wall pressure
 * @param level the running level after it, dB in the followed band; NaN before the wall pressure
 *     and where a band is missing
 * @param kind what the running level is a level of
 */
public record TraceStage(
    int number,
    String name,
    String sentence,
    String origin,
    String rule,
    String numbers,
    List<TraceNote> notes,
    StagePicture picture,
    double step,
    double level,
    LevelKind kind) {
  public TraceStage {
    notes = List.copyOf(notes);
  }

  /** What a running level is a level of. */
  public enum LevelKind {
    /** There is no level yet. */
    NONE("", ""),
    /** Pressure at the wall, dB re 20 µPa. */
    WALL("at the wall", "dB re 20 µPa at the wall"),
    /** Power let in, dB re 1 pW. */
    POWER("power", "dB re 1 pW of power"),
    /** Pressure at the receiver, dB re 20 µPa. */
    PRESSURE("pressure", "dB re 20 µPa at the receiver"),
    /** A-weighted pressure at the receiver, dB re 20 µPa. */
    WEIGHTED("A-weighted", "dB(A) at the receiver");

    private final String word;
    private final String unit;

    LevelKind(String word, String unit) {
      this.word = word;
      this.unit = unit;
    }

    /** A short word for it. */
    public String word() {
      return word;
    }

    /** Its unit and what it is of. */
    public String unit() {
      return unit;
    }
  }

  /** The step with its sign, one decimal; empty before the wall pressure. */
  public String stepText() {
    boolean start = kind == LevelKind.NONE || kind == LevelKind.WALL;
    return start ? "" : Readable.difference(step);
  }

  /** The running level, one decimal; a dash where there is none. */
  public String levelText() {
    return Readable.level(level);
  }

  /** Everything the stage says, line by line, in plain text. */
  public List<String> lines() {
    List<String> lines = new ArrayList<>();
    lines.add(number + ". " + name + ": " + sentence);
    add(lines, origin);
    add(lines, Markup.plain(rule));
    add(lines, Markup.plain(numbers));
    notes.forEach(note -> lines.add(note.line()));
    if (kind != LevelKind.NONE) {
      String step = stepText().isEmpty() ? "" : "Step " + stepText() + " dB, ";
      lines.add(step + (step.isEmpty() ? "Level " : "level ") + levelText() + " " + kind.unit());
    }
    return lines;
  }

  private static void add(List<String> lines, String line) {
    if (!line.isEmpty()) {
      lines.add(line);
    }
  }
}
