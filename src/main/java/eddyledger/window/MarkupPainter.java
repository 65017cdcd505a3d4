package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.present.Markup;
import java.awt.Font;
import java.awt.Graphics2D;
import java.util.ArrayList;
import java.util.List;

/** Measures, wraps and draws text and formulas in {@link Markup}. */
final class MarkupPainter {
  private static final float SMALL = 0.78f;
  private static final int BELOW = 3;
  private static final int ABOVE = -4;
  private static final String COMMA = ",  ";

  private MarkupPainter() {}

  /** Width of a line, pixels. */
  static double width(Font font, String line) {
    double width = 0.0;
    for (Markup.Run run : Markup.runs(line)) {
      width += Digits.width(font(font, run.place()), run.text());
    }
    return width;
  }

  /** Draws a line in the colour set, its left end at x. */
  static void draw(Graphics2D g, Font font, String line, double x, double baseline) {
    double at = x;
    for (Markup.Run run : Markup.runs(line)) {
      Font own = font(font, run.place());
      int shift =
          switch (run.place()) {
            case LINE -> 0;
            case BELOW -> BELOW;
            case ABOVE -> ABOVE;
          };
      g.setFont(own);
      g.drawString(run.text(), (float) at, (float) (baseline + shift));
      at += Digits.width(own, run.text());
    }
    g.setFont(font);
  }

  private static Font font(Font font, Markup.Place place) {
    return place == Markup.Place.LINE ? font : font.deriveFont(font.getSize2D() * SMALL);
  }

  /** Breaks a line to a width: after a comma with two spaces if it can be, else at a space. */
  static List<String> wrap(Font font, String line, double width) {
    if (line.isEmpty()) {
      return List.of();
    }
    if (width(font, line) <= width) {
      return List.of(line);
    }
    List<String> parts = new ArrayList<>();
    for (String part : line.split(COMMA)) {
      parts.add(part);
    }
    List<String> lines = new ArrayList<>();
    String now = parts.get(0);
    for (String part : parts.subList(1, parts.size())) {
      if (width(font, now + COMMA + part) <= width) {
        now = now + COMMA + part;
      } else {
        lines.addAll(words(font, now + ",", width));
        now = part;
      }
    }
    lines.addAll(words(font, now, width));
    return lines;
  }

  private static List<String> words(Font font, String line, double width) {
    List<String> lines = new ArrayList<>();
    String now = "";
    for (String word : line.split(" ")) {
      String longer = now.isEmpty() ? word : now + " " + word;
      if (now.isEmpty() || width(font, longer) <= width) {
        now = longer;
      } else {
        lines.add(now);
        now = word;
      }
    }
    lines.add(now);
    return lines;
  }

  /** Cuts a plain text to a width, with an ellipsis at its end. */
  static String cut(Font font, String text, double width) {
    if (Digits.width(font, text) <= width) {
      return text;
    }
    int end = text.length();
    while (end > 0 && Digits.width(font, text.substring(0, end) + "…") > width) {
      end--;
    }
    return text.substring(0, end).stripTrailing() + "…";
  }
}
