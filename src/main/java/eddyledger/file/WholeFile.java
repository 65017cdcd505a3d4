package eddyledger.file;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.CopyOption;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.util.UUID;

/** A file that is replaced as a whole or not at all. */
final class WholeFile {
  /** Moves a file into the place of another. */
  interface Move {
    void move(Path from, Path to, CopyOption... options) throws IOException;
  }

  private final Path file;
  private final Move move;

  WholeFile(Path file) {
    this(file, Files::move);
  }

  WholeFile(Path file, Move move) {
    this.file = file;
    this.move = move;
  }

  /**
   * Writes a temporary file beside it, down to the disk, and moves it into place.
   *
   * @throws IOException if that fails; the old file is then untouched and no temporary is left
   */
  void replace(byte[] bytes) throws IOException {
    if (Files.isDirectory(file)) {
      throw new FileSystemException(file.toString(), null, "it is a folder");
    }
    // a link is followed, so that it stays one
    Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
    Path temporary = target.resolveSibling("." + UUID.randomUUID() + ".tmp");
    try {
      write(bytes, temporary);
      keepPermissions(target, temporary);
      moveInto(temporary, target);
    } finally {
      Files.deleteIfExists(temporary);
    }
  }

  private static void write(byte[] bytes, Path temporary) throws IOException {
    try (FileChannel channel =
        FileChannel.open(temporary, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
      ByteBuffer buffer = ByteBuffer.wrap(bytes);
      while (buffer.hasRemaining()) {
        channel.write(buffer);
      }
      channel.force(true);
    }
  }

  private static void keepPermissions(Path from, Path to) throws IOException {
    PosixFileAttributeView old = Files.getFileAttributeView(from, PosixFileAttributeView.class);
    if (old != null && Files.exists(from)) {
      Files.setPosixFilePermissions(to, old.readAttributes().permissions());
    }
  }

  private void moveInto(Path temporary, Path target) throws IOException {
    try {
      move.move(temporary, target, StandardCopyOption.ATOMIC_MOVE);
    } catch (AtomicMoveNotSupportedException plainFileSystem) {
      move.move(temporary, target, StandardCopyOption.REPLACE_EXISTING);
    }
  }
}
