package eddyledger.command;

/**
 * Thrown when an id or name on the command line leads to nothing; the message says what is known.
 */
final class UnknownName extends RuntimeException {
  private static final long serialVersionUID = 1L;

  UnknownName(String message) {
    super(message);
  }
}
