package eddyledger.present;

import java.util.Arrays;
import java.util.List;

/**
 * What the small picture of a stage shows, without saying how it is drawn. Arrays are not to be
 * changed.
 *
 * @param kind how it is shown
 * @param x positions along the picture; shape [points] for curves and profile, empty for bars
 * @param rows values: one row of bars, or one row per curve; NaN where missing
 * @param names a name per bar or per curve; empty where they need none
 * @param marked which bar or point of the first curve is marked; -1 for none
 * @param bottom value at the foot of the picture
 * @param top value at its head
 * @param left text below, at its left end
 * @param middle text below, in the middle
 * @param right text below, at its right end
 */
public record StagePicture(
    Kind kind,
    double[] x,
    List<double[]> rows,
    List<String> names,
    int marked,
    double bottom,
    double top,
    String left,
    String middle,
    String right) {

  /** From here on captions need no decimals. */
  private static final double WHOLE = 10.0;

  /** How it is shown. */
  public enum Kind {
    /** Nothing to show. */
    NONE,
    /** One bar for each of the 28 bands. */
    BANDS,
    /** Some bars with names and numbers. */
    BARS,
    /** Curves over a common axis. */
    CURVES,
    /** Speed over the wall: speed along, height up, with thicknesses as lines. */
    PROFILE
  }

  public StagePicture {
    rows = List.copyOf(rows);
    names = List.copyOf(names);
  }

  /** No picture, with words in its place. */
  static StagePicture none(String words) {
    return new StagePicture(
        Kind.NONE, new double[0], List.of(), List.of(), -1, 0.0, 1.0, "", words, "");
  }

  /**
   * Bars of the 28 bands.
   *
   * @param values shape [28], NaN where missing
   * @param fromZero whether the bars start at zero; if not, a little below the least
   */
  static StagePicture bands(double[] values, int followed, boolean fromZero, String caption) {
    double least = Arrays.stream(values).filter(Double::isFinite).min().orElse(0.0);
    double most = Arrays.stream(values).filter(Double::isFinite).max().orElse(1.0);
    double bottom = fromZero ? Math.min(0.0, least) : least - 0.15 * Math.max(most - least, 1.0);
    double top = most > bottom ? most : bottom + 1.0;
    return new StagePicture(
        Kind.BANDS,
        new double[0],
        List.<double[]>of(values.clone()),
        List.of(),
        followed,
        bottom,
        top,
        "25 Hz",
        caption,
        "12.5 kHz");
  }

  /** Least and most of some values in words: {@code −51 to −30 dB}. */
  static String range(double[] values, String unit) {
    double least = Arrays.stream(values).filter(Double::isFinite).min().orElse(Double.NaN);
    double most = Arrays.stream(values).filter(Double::isFinite).max().orElse(Double.NaN);
    if (Double.isNaN(least)) {
      return "no value";
    }
    boolean whole = Math.max(Math.abs(least), Math.abs(most)) >= WHOLE;
    String low = whole ? whole(least) : Readable.level(least);
    String high = whole ? whole(most) : Readable.level(most);
    return low.equals(high) ? low + " " + unit + ", all bands" : low + " to " + high + " " + unit;
  }

  private static String whole(double value) {
    long rounded = Math.round(value);
    return (rounded < 0 ? "−" : "") + Math.abs(rounded);
  }
}
