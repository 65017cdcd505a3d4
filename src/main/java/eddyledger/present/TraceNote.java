package eddyledger.present;

/**
 * What the reader of a stage must see: nobody set a value, or a formula left its range.
 *
 * @param kind what sort of note it is
 * @param text in words
 */
public record TraceNote(Kind kind, String text) {

  /** Sorts of note; the word stands before the text. */
  public enum Kind {
    /** A formula is used where its source does not vouch for it, or something is at odds. */
    DOUBT("Out of range"),
    /** A value that nobody set. */
    DEFAULT("Default"),
    /** A value worked out from others. */
    FILLED_IN("Filled in"),
    /** A choice that another reader may make otherwise. */
    CHOICE("Choice"),
    /** Octave values read at one-third octaves. */
    INTERPOLATED("Interpolated"),
    /** Bands without a value. */
    MISSING("Missing"),
    /** Worth knowing. */
    NOTE("Note");

    private final String word;

    Kind(String word) {
      this.word = word;
    }

    /** The word before the text. */
    public String word() {
      return word;
    }
  }

  /** Word and text in one line. */
  public String line() {
    return kind.word() + ": " + text;
  }
}
