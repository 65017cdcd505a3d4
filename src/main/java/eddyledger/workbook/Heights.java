package eddyledger.workbook;

/** Heights of rows whose text is broken into lines. */
final class Heights {
  /** Height of a line of body text, points. */
  static final double LINE = 12.0;

  private static final double PADDING = 1.5;
  private static final double MOST = 400.0;

  private Heights() {}

  /** Height in points for a text in a column of so many characters. */
  static double of(String text, double characters) {
    long lines = 0;
    for (String part : text.split("\n", -1)) {
      // a column is measured in digits, which are wider than letters; words do not fill their lines
      lines += (long) Math.max(1.0, Math.ceil(part.length() / (1.15 * characters)));
    }
    return Math.min(MOST, lines * LINE + PADDING);
  }

  /** The greater of heights. */
  static double most(double... heights) {
    double most = LINE + PADDING;
    for (double height : heights) {
      most = Math.max(most, height);
    }
    return most;
  }
}
