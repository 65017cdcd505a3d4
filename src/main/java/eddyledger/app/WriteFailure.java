package eddyledger.app;

import java.io.IOException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;

/** Thrown when a file cannot be written; the message says which, why and what to do. */
public final class WriteFailure extends RuntimeException {
  private static final long serialVersionUID = 1L;

  WriteFailure(String message, Throwable cause) {
    super(message, cause);
  }

  /** Tells of a file that the file system did not take. */
  static WriteFailure of(Path file, IOException cause) {
    if (cause instanceof NoSuchFileException) {
      return new WriteFailure(
          file + " cannot be written: there is no such folder. Make it, or name another.", cause);
    }
    return new WriteFailure(
        file
            + " cannot be written: "
            + cause.getMessage()
            + ". Close it elsewhere, check your rights, or name another file.",
        cause);
  }
}
