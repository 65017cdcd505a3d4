package eddyledger.present;

import eddyledger.ledger.Way;
import eddyledger.quantity.Bands;

/** Words for parts of a line. */
final class LineWords {
  private static final int KILO_FROM = 4;

  private LineWords() {}

  /** A way in, as a kind of contribution. */
  static String way(Way way) {
    return switch (way) {
      case ALL -> "all ways";
      case BOUNDARY_LAYER -> "boundary layer";
      case ACOUSTIC -> "acoustic share";
      case LEAK -> "leak";
    };
  }

  /** The same as a name, with a capital. */
  static String wayName(Way way) {
    String word = way(way);
    return Character.toUpperCase(word.charAt(0)) + word.substring(1);
  }

  /** The highest band in words, "highest at 250 Hz, 61.2 dB(A)". */
  static String bands(LedgerLine line) {
    int peak = line.strip().peak();
    String level = DeskNumbers.level(line.strip().levels().value(peak));
    return "highest at " + frequency(peak) + ", " + level + " dB(A)";
  }

  /** A band's middle: "31.5 Hz", "1.25 kHz". */
  static String frequency(int band) {
    String label = Bands.label(band);
    if (label.length() < KILO_FROM || label.contains(".")) {
      return label + " Hz";
    }
    String thousands = label.substring(0, label.length() - 3);
    String rest = label.substring(label.length() - 3).replaceAll("0+$", "");
    return (rest.isEmpty() ? thousands : thousands + "." + rest) + " kHz";
  }
}
