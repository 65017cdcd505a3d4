package eddyledger.window;

import eddyledger.chart.StackFill;

/**
 * What stands in the gutter left of a line: the fill of its part in the picture.
 *
 * @param fill the fill
 * @param joinedAbove whether the line above is of the same part
 * @param joinedBelow whether the line below is of the same part
 */
record GutterMark(StackFill fill, boolean joinedAbove, boolean joinedBelow) {}
