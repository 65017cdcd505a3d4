package eddyledger.window;

import java.awt.Paint;

/**
 * What stands in the gutter left of a line: the fill of its part in the picture.
 *
 * @param paint the fill
 * @param edged whether it needs an edge
 * @param joinedAbove whether the line above is of the same part
 * @param joinedBelow whether the line below is of the same part
 */
record GutterMark(Paint paint, boolean edged, boolean joinedAbove, boolean joinedBelow) {}
