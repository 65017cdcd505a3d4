package eddyledger.chart;

/**
 * What a part of the stack is filled with; the paints are those of {@link FillPaints}.
 *
 * @param kind what the fill says
 * @param number which one of its kind: 0 to 4 for a series, 0 to 2 for an other source, else 0
 */
public record StackFill(Kind kind, int number) {
  /** Number of series colours. */
  public static final int SERIES = 5;

  /** Number of patterns for other sources. */
  public static final int OTHERS = 3;

  /** What a fill says. */
  public enum Kind {
    /** A child of the section looked at, in a colour of its own. */
    SERIES,
    /** The smaller children of the section looked at, together. */
    REMAINDER,
    /** What comes in through seals and gaps. */
    LEAK,
    /** All panels outside the section looked at. */
    ELSEWHERE,
    /** Other sources, told apart by pattern. */
    OTHER
  }

  static StackFill of(Kind kind) {
    return new StackFill(kind, 0);
  }
}
