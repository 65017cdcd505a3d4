package eddyledger.chart;

import eddyledger.quantity.Bands;
import eddyledger.quantity.LevelText;

/** Numbers and bands as the pictures write them. */
final class LevelWords {
  /** Before a number that is a lower bound. */
  static final String AT_LEAST = "\u2265\u2009";

  private static final String MINUS = "\u2212";

  private LevelWords() {}

  /** A level with one decimal and a true minus sign; "not known" if there is none. */
  static String level(double level) {
    return Double.isFinite(level) ? LevelText.text(level).replace("-", MINUS) : "not known";
  }

  /** A share as "17 %"; a trace of something is never 0. */
  static String share(double share) {
    double percent = 100.0 * share;
    return percent > 0.0 && percent < 0.5 ? "<1 %" : Math.round(percent) + " %";
  }

  /** A band on the axis: "31.5", "1k", "1.25k". */
  static String band(int position) {
    String label = Bands.label(position);
    return label.length() > 3 && !label.contains(".") ? kilo(label) + "k" : label;
  }

  /** A band in a sentence: "31.5 Hz", "1.25 kHz". */
  static String bandWithUnit(int position) {
    String label = Bands.label(position);
    return label.length() > 3 && !label.contains(".") ? kilo(label) + " kHz" : label + " Hz";
  }

  private static String kilo(String hertz) {
    String thousands = hertz.substring(0, hertz.length() - 3);
    String rest = hertz.substring(hertz.length() - 3).replaceAll("0+$", "");
    return rest.isEmpty() ? thousands : thousands + "." + rest;
  }
}
