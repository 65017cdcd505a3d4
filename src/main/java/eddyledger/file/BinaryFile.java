package eddyledger.file;

import java.io.IOException;
import java.nio.file.Path;

/** Files of bytes that are replaced as a whole or not at all. */
public final class BinaryFile {
  private BinaryFile() {}

  /**
   * Writes bytes into a temporary file and moves it into place.
   *
   * @throws IOException if that fails; an old file is then untouched and no temporary is left
   */
  public static void replace(Path file, byte[] bytes) throws IOException {
    new WholeFile(file).replace(bytes);
  }
}
