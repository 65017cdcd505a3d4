package eddyledger.present;

import java.util.ArrayList;
import java.util.List;

/**
 * Formulas in a line of text: {@code _{...}} stands lower, {@code ^{...}} higher, both smaller.
 * Marks do not nest.
 */
public final class Markup {
  private Markup() {}

  /** Where a run of text stands. */
  public enum Place {
    /** On the line. */
    LINE,
    /** Below it, smaller. */
    BELOW,
    /** Above it, smaller. */
    ABOVE
  }

  /**
   * Text of one place.
   *
   * @param text the text, without marks
   * @param place where it stands
   */
  public record Run(String text, Place place) {}

  /** The runs of a line, in order. A mark that is not closed is text like any other. */
  public static List<Run> runs(String line) {
    List<Run> runs = new ArrayList<>();
    int from = 0;
    int at = next(line, 0);
    while (at >= 0) {
      int end = line.indexOf('}', at + 2);
      if (end < 0) {
        break;
      }
      add(runs, line.substring(from, at), Place.LINE);
      add(runs, line.substring(at + 2, end), line.charAt(at) == '_' ? Place.BELOW : Place.ABOVE);
      from = end + 1;
      at = next(line, from);
    }
    add(runs, line.substring(from), Place.LINE);
    return List.copyOf(runs);
  }

  private static void add(List<Run> runs, String text, Place place) {
    if (!text.isEmpty()) {
      runs.add(new Run(text, place));
    }
  }

  private static int next(String line, int from) {
    int below = line.indexOf("_{", from);
    int above = line.indexOf("^{", from);
    return below < 0 || above < 0 ? Math.max(below, above) : Math.min(below, above);
  }

  /** The line as plain text: {@code U_e}, {@code 10^(-IL/10)}. */
  public static String plain(String line) {
    StringBuilder plain = new StringBuilder();
    for (Run run : runs(line)) {
      switch (run.place()) {
        case LINE -> plain.append(run.text());
        case BELOW -> plain.append('_').append(run.text());
        case ABOVE -> plain.append(power(run.text()));
      }
    }
    return plain.toString();
  }

  private static String power(String text) {
    return switch (text) {
      case "2" -> "²";
      case "3" -> "³";
      default -> text.length() == 1 ? "^" + text : "^(" + text + ")";
    };
  }
}
