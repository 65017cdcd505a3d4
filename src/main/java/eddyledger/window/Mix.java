package eddyledger.window;

import java.awt.Color;

/** Colours between two of the palette. */
final class Mix {
  private Mix() {}

  /** The colour in the middle between two. */
  static Color half(Color one, Color other) {
    return new Color(
        (one.getRed() + other.getRed()) / 2,
        (one.getGreen() + other.getGreen()) / 2,
        (one.getBlue() + other.getBlue()) / 2);
  }
}
