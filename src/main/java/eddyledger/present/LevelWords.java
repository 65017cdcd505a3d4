package eddyledger.present;

import eddyledger.quantity.LevelText;

/** Levels and margins as the window writes them. */
final class LevelWords {
  private LevelWords() {}

  /** A level with one decimal, minus as U+2212. */
  static String level(double level) {
    return NumberText.minus(LevelText.text(level));
  }

  /** A margin with one decimal and its sign; zero has none. */
  static String margin(double margin) {
    String text = LevelText.text(margin);
    if (text.equals("0.0")) {
      return text;
    }
    return text.startsWith("-") ? NumberText.minus(text) : "+" + text;
  }
}
