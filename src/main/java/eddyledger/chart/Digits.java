package eddyledger.chart;

import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.font.FontRenderContext;

/**
 * Draws text smoothly, and numbers with digits of one width, so that columns of numbers stand in
 * line and do not shake while they change: the fonts' own digits differ in width, and Java 17
 * cannot ask a font for its tabular ones.
 */
public final class Digits {
  private static final FontRenderContext PRECISE = new FontRenderContext(null, true, true);

  private Digits() {}

  /** Sets what makes text and lines smooth. */
  public static void smooth(Graphics2D g) {
    g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
    g.setRenderingHint(
        RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
    g.setRenderingHint(
        RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
    g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
  }

  /** Width of plain text, pixels. */
  public static double width(Font font, String text) {
    return text.isEmpty() ? 0.0 : font.getStringBounds(text, PRECISE).getWidth();
  }

  /** The text, or its beginning with an ellipsis, so that it is no wider than the room given. */
  public static String fitted(Font font, String text, double room) {
    if (width(font, text) <= room) {
      return text;
    }
    int end = text.length();
    while (end > 0 && width(font, text.substring(0, end).stripTrailing() + "\u2026") > room) {
      end--;
    }
    return text.substring(0, end).stripTrailing() + "\u2026";
  }

  /** Width of a number with digits of one width, pixels. */
  public static double numberWidth(Font font, String number) {
    double cell = cell(font);
    double width = 0.0;
    for (int i = 0; i < number.length(); i++) {
      width += advance(font, number.charAt(i), cell);
    }
    return width;
  }

  /** Draws a number in the colour and font set, its right end at x. */
  public static void drawRight(Graphics2D g, String number, double x, double baseline) {
    Font font = g.getFont();
    double cell = cell(font);
    double right = x;
    for (int i = number.length() - 1; i >= 0; i--) {
      char sign = number.charAt(i);
      String text = String.valueOf(sign);
      double advance = advance(font, sign, cell);
      double own = width(font, text);
      g.drawString(text, (float) (right - advance + (advance - own) / 2.0), (float) baseline);
      right -= advance;
    }
  }

  /** Draws a number in the colour and font set, its left end at x. */
  public static void drawLeft(Graphics2D g, String number, double x, double baseline) {
    drawRight(g, number, x + numberWidth(g.getFont(), number), baseline);
  }

  private static double advance(Font font, char sign, double cell) {
    return Character.isDigit(sign) ? cell : width(font, String.valueOf(sign));
  }

  private static double cell(Font font) {
    double widest = 0.0;
    for (char digit = '0'; digit <= '9'; digit++) {
      widest = Math.max(widest, width(font, String.valueOf(digit)));
    }
    return widest;
  }
}
