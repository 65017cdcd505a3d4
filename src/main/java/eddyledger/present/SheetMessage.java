package eddyledger.present;

import eddyledger.check.Severity;

/**
 * What is said under a field.
 *
 * @param severity how much it matters
 * @param text one or two sentences
 */
public record SheetMessage(Severity severity, String text) {
  /** An error. */
  static SheetMessage error(String text) {
    return new SheetMessage(Severity.ERROR, text);
  }

  /** A warning. */
  static SheetMessage warning(String text) {
    return new SheetMessage(Severity.WARNING, text);
  }

  /** The graver of two, either of which may be null. */
  static SheetMessage graver(SheetMessage one, SheetMessage other) {
    if (one == null || other == null) {
      return one == null ? other : one;
    }
    return other.severity().compareTo(one.severity()) > 0 ? other : one;
  }
}
