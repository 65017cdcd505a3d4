package eddyledger.physics;

/**
 * Something a formula has to say about its own use: it left its published range, or it had to fill
 * in a quantity. The ledger turns remarks into findings and into notes of the trace.
 *
 * @param kind what sort of remark it is
 * @param topic the same words whatever the numbers, so that remarks of many panels can be gathered
 * @param text what was met, with numbers and units, in a sentence a reader of the trace understands
 */
public record Remark(Kind kind, String topic, String text) {

  /** Sorts of remark. */
  public enum Kind {
    /** The formula is used outside the range its source states. */
    OUT_OF_RANGE,
    /** A quantity was not given and was filled in by a stated rule. */
    FILLED_IN,
    /** Worth knowing, no doubt about the value. */
    NOTE
  }

  /** A remark that a formula is used outside its range. */
  public static Remark outOfRange(String topic, String text) {
    return new Remark(Kind.OUT_OF_RANGE, topic, text);
  }

  /** A remark that a quantity was filled in. */
  public static Remark filledIn(String quantity, String text) {
    return new Remark(Kind.FILLED_IN, quantity, text);
  }

  /** A remark without doubt. */
  public static Remark note(String topic, String text) {
    return new Remark(Kind.NOTE, topic, text);
  }
}
