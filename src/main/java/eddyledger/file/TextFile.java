package eddyledger.file;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;

/** Text files that are replaced as a whole or not at all. */
public final class TextFile {
  private TextFile() {}

  /**
   * Writes a text as UTF-8 into a temporary file and moves it into place.
   *
   * @throws IOException if that fails; an old file is then untouched and no temporary is left
   */
  public static void replace(Path file, String text) throws IOException {
    new WholeFile(file).replace(text.getBytes(StandardCharsets.UTF_8));
  }
}
