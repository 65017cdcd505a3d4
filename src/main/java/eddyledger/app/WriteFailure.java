package eddyledger.app;

/** Thrown when a file cannot be written; the message says which, why and what to do. */
public final class WriteFailure extends RuntimeException {
  private static final long serialVersionUID = 1L;

  WriteFailure(String message, Throwable cause) {
    super(message, cause);
  }
}
