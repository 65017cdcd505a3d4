package eddyledger.workbook;

import eddyledger.ledger.State;

/**
 * What a cell shows: a number, or words where there is none.
 *
 * @param number the number; NaN where there are words
 * @param words the words; null where there is a number
 */
record Answer(double number, String words) {
  /** Stands for a level that cannot be said. */
  static final String UNAVAILABLE = "n/a";

  /** Stands for the level of no sound at all, which is known and adds nothing. */
  static final String NO_SOUND = "none";

  /** Stands for a level that was not entered. */
  static final String MISSING = "missing";

  /** Stands where nothing is asked for. */
  static final String NOT_ASKED = "\u2013";

  /** Stands for a state that cannot be said. */
  static final String NOT_KNOWN = "not known";

  /** Words. */
  static Answer words(String words) {
    return new Answer(Double.NaN, words);
  }

  /** A number; {@link #UNAVAILABLE} for NaN. */
  static Answer number(double number) {
    return Double.isNaN(number) ? words(UNAVAILABLE) : new Answer(number, null);
  }

  /** A number that may be null. */
  static Answer number(Double number) {
    return number == null ? words(NOT_ASKED) : number(number.doubleValue());
  }

  /** An overall level in dB; NaN and minus infinity have their words. */
  static Answer level(double level) {
    return level == Double.NEGATIVE_INFINITY ? words(NO_SOUND) : number(level);
  }

  /** A state; null cannot be said. */
  static Answer state(State state) {
    return words(state == null ? NOT_KNOWN : state.text());
  }

  /** Words that may be null or empty. */
  static Answer text(String words) {
    return words(words == null || words.isEmpty() ? NOT_ASKED : words);
  }

  /** Whether it is a number. */
  boolean isNumber() {
    return words == null;
  }

  /** Whether it is just these words. */
  boolean is(String other) {
    return other.equals(words);
  }
}
