package eddyledger.window;

import eddyledger.present.LevelAxis;

/**
 * Where the columns of a trace stand for a width of its page, pixels from its left edge.
 *
 * @param step left end of the step's words
 * @param rule left end of rule and numbers
 * @param picture left end of the picture
 * @param pictureWidth width of the picture
 * @param axis left end of the axis of the running level
 * @param axisWidth its width
 * @param change right end of the step in dB
 * @param level right end of the level
 */
record TraceColumns(
    double step,
    double rule,
    double picture,
    double pictureWidth,
    double axis,
    double axisWidth,
    double change,
    double level) {
  /** Margin left and right. */
  static final int MARGIN = 24;

  /** Width below which the page scrolls sideways. */
  static final int LEAST_WIDTH = 1000;

  private static final double GAP = 24.0;
  private static final double NUMBER = 28.0;
  private static final double CHANGE = 82.0;
  private static final double LEVEL = 76.0;
  private static final double STEP_SHARE = 0.47;

  static TraceColumns of(double width) {
    boolean wide = width > 1400;
    double pictureWidth = wide ? 212 : 188;
    double axisWidth = wide ? 234 : 190;
    double level = width - MARGIN;
    double change = level - LEVEL;
    double axis = change - CHANGE - axisWidth;
    double picture = axis - GAP - pictureWidth;
    double step = MARGIN + NUMBER;
    double words = picture - GAP - step;
    double rule = step + STEP_SHARE * words + GAP / 2;
    return new TraceColumns(step, rule, picture, pictureWidth, axis, axisWidth, change, level);
  }

  /** Width of the step's words. */
  double stepWidth() {
    return rule - step - GAP;
  }

  /** Width of rule and numbers. */
  double ruleWidth() {
    return picture - rule - GAP;
  }

  /** Width of notes, which run under words and rule. */
  double noteWidth() {
    return picture - step - GAP;
  }

  /** Where a level stands on the axis. */
  double at(LevelAxis levels, double level) {
    return axis + axisWidth * (level - levels.low()) / (levels.high() - levels.low());
  }
}
