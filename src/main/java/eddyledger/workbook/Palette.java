package eddyledger.workbook;

/** Colours, as red, green, blue in hexadecimal; marks are of the Okabe-Ito set. */
final class Palette {
  static final String INK = "222222";
  static final String SOFT_INK = "595959";
  static final String RULE = "D9D9D9";
  static final String STRONG_RULE = "7F7F7F";
  static final String HEADER = "E7EAED";
  static final String TOTAL = "EFF1F3";
  static final String INPUT = "FFF9E3";
  static final String PROGRAM = "F2F2F2";
  static final String CAUTION = "FBF1E6";

  /** Sky blue, paled: sound that comes in as sound. */
  static final String ACOUSTIC = "9BCFEF";

  /** Orange, paled: sound that comes in through gaps. */
  static final String LEAK = "F2CC80";

  /** Bluish green, darkened for text. */
  static final String INSIDE = "00694D";

  /** Orange, darkened for text. */
  static final String TIGHT = "8A5B00";

  /** Vermilion, darkened for text. */
  static final String OVER = "B34700";

  static final String OVER_FILL = "FBE9DF";
  static final String TIGHT_FILL = "FBF1DC";

  /** Blue, paled: bars behind numbers. */
  static final String BAR = "A9C7DF";

  private Palette() {}
}
