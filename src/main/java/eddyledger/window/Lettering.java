package eddyledger.window;

import eddyledger.chart.Digits;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.util.HashMap;
import java.util.Map;

/**
 * Writes text and numbers into painted components, and keeps what was measured: a table repaints
 * the same few words over and over.
 */
final class Lettering {
  private static final int MOST_KEPT = 4000;

  private record Word(Font font, String text) {}

  private record Fit(Font font, String text, long room) {}

  private final Map<Word, Double> widths = new HashMap<>();
  private final Map<Fit, String> fits = new HashMap<>();

  /** Width of text, pixels. */
  double width(Font font, String text) {
    return text.isEmpty()
        ? 0.0
        : kept(widths, new Word(font, text), () -> Digits.width(font, text));
  }

  /** Writes text from x on. */
  void left(Graphics2D g, Font font, Color ink, String text, double x, double baseline) {
    g.setFont(font);
    g.setColor(ink);
    g.drawString(text, (float) x, (float) baseline);
  }

  /** Writes text up to x. */
  void right(Graphics2D g, Font font, Color ink, String text, double x, double baseline) {
    left(g, font, ink, text, x - width(font, text), baseline);
  }

  /** Writes text from x on, shortened with an ellipsis to the room there is; its width then. */
  double fitted(
      Graphics2D g, Font font, Color ink, String text, double x, double baseline, double room) {
    String shown = fit(font, text, room);
    left(g, font, ink, shown, x, baseline);
    return width(font, shown);
  }

  /** Whether text has to be shortened for the room there is. */
  boolean cut(Font font, String text, double room) {
    return width(font, text) > room;
  }

  private String fit(Font font, String text, double room) {
    if (!cut(font, text, room)) {
      return text;
    }
    Fit key = new Fit(font, text, Math.round(room));
    return kept(fits, key, () -> Digits.fitted(font, text, Math.max(0.0, room)));
  }

  /** Writes a number with digits of one width up to x. */
  void number(Graphics2D g, Font font, Color ink, String number, double x, double baseline) {
    g.setFont(font);
    g.setColor(ink);
    Digits.drawRight(g, number, x, baseline);
  }

  private static <K, V> V kept(Map<K, V> map, K key, java.util.function.Supplier<V> made) {
    V value = map.get(key);
    if (value == null) {
      if (map.size() > MOST_KEPT) {
        map.clear();
      }
      value = made.get();
      map.put(key, value);
    }
    return value;
  }
}
