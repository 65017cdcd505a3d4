package eddyledger.app;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.FileTime;

/**
 * A file as it was when the program read or wrote it, to notice that somebody else wrote it since.
 *
 * @param file the file
 * @param written when it was last written; null if that could not be told
 * @param size its size in bytes; -1 if that could not be told
 */
public record SavedFile(Path file, FileTime written, long size) {

  /** The file as it is now. */
  public static SavedFile now(Path file) {
    try {
      return new SavedFile(file, Files.getLastModifiedTime(file), Files.size(file));
    } catch (IOException e) {
      return new SavedFile(file, null, -1);
    }
  }

  /** Whether the file is there and is another one than it was. */
  public boolean changedSince() {
    return Files.exists(file) && !now(file).equals(this);
  }
}
