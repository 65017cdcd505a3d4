package eddyledger.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.junit.jupiter.api.Assumptions.assumeFalse;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import eddyledger.model.VehicleBuilder;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.CopyOption;
import java.nio.file.FileSystemException;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A file is replaced as a whole or not at all, and no temporary file stays behind. */
class WholeFileTest {
  private static final byte[] OLD = "old".getBytes(StandardCharsets.UTF_8);
  private static final byte[] NEW = "new and longer".getBytes(StandardCharsets.UTF_8);

  @TempDir private Path folder;
  private Path file;

  @BeforeEach
  void anOldFile() throws IOException {
    file = Files.write(folder.resolve("plan.eddyledger"), OLD);
  }

  private List<String> names() throws IOException {
    try (Stream<Path> files = Files.list(folder)) {
      return files.map(path -> path.getFileName().toString()).toList();
    }
  }

  @Test
  void theOldFileIsReplaced() throws IOException {
    new WholeFile(file).replace(NEW);
    assertThat(file).hasBinaryContent(NEW);
    assertThat(names()).containsExactly("plan.eddyledger");
  }

  @Test
  void aNewFileIsMade() throws IOException {
    Path other = folder.resolve("other.eddyledger");
    new WholeFile(other).replace(NEW);
    assertThat(other).hasBinaryContent(NEW);
    assertThat(names()).hasSize(2);
  }

  @Test
  void theMoveIsAtomicAndTheTemporaryLiesBesideTheFile() throws IOException {
    List<CopyOption> used = new ArrayList<>();
    new WholeFile(
            file,
            (from, to, options) -> {
              assertThat(from).hasBinaryContent(NEW).hasParent(to.getParent());
              used.addAll(List.of(options));
              Files.move(from, to, options);
            })
        .replace(NEW);
    assertThat(used).containsExactly(StandardCopyOption.ATOMIC_MOVE);
    assertThat(file).hasBinaryContent(NEW);
  }

  @Test
  void aFileSystemWithoutAtomicMovesGetsAPlainOne() throws IOException {
    new WholeFile(
            file,
            (from, to, options) -> {
              if (List.of(options).contains(StandardCopyOption.ATOMIC_MOVE)) {
                throw new AtomicMoveNotSupportedException(from.toString(), to.toString(), "");
              }
              Files.move(from, to, options);
            })
        .replace(NEW);
    assertThat(file).hasBinaryContent(NEW);
    assertThat(names()).containsExactly("plan.eddyledger");
  }

  @Test
  void aFailedMoveLeavesTheOldFile() throws IOException {
    WholeFile whole =
        new WholeFile(
            file,
            (from, to, options) -> {
              throw new FileSystemException(to.toString(), null, "no space");
            });
    assertThatThrownBy(() -> whole.replace(NEW)).isInstanceOf(FileSystemException.class);
    assertThat(file).hasBinaryContent(OLD);
    assertThat(names()).containsExactly("plan.eddyledger");
  }

  @Test
  void aFolderIsNotReplaced() throws IOException {
    Path target = Files.createDirectory(folder.resolve("folder"));
    assertThatThrownBy(() -> ProjectWriter.save(VehicleBuilder.named("v", "v").build(), target))
        .isInstanceOf(FileSystemException.class)
        .hasMessageContaining("it is a folder");
    assertThat(target).isEmptyDirectory();
    assertThat(names()).hasSize(2);
  }

  @Test
  void aFolderThatIsNotThere() throws IOException {
    Path target = folder.resolve("none").resolve("plan.eddyledger");
    assertThatThrownBy(() -> new WholeFile(target).replace(NEW)).isInstanceOf(IOException.class);
    assertThat(names()).containsExactly("plan.eddyledger");
  }

  @Test
  void aFolderThatTakesNoFiles() throws IOException {
    assumeTrue(FileSystems.getDefault().supportedFileAttributeViews().contains("posix"));
    Files.setPosixFilePermissions(folder, PosixFilePermissions.fromString("r-xr-xr-x"));
    try {
      assumeFalse(Files.isWritable(folder), "this user may write everywhere");
      assertThatThrownBy(() -> new WholeFile(file).replace(NEW)).isInstanceOf(IOException.class);
      assertThat(file).hasBinaryContent(OLD);
      assertThat(names()).containsExactly("plan.eddyledger");
    } finally {
      Files.setPosixFilePermissions(folder, PosixFilePermissions.fromString("rwxr-xr-x"));
    }
  }

  @Test
  void permissionsAndLinksStay() throws IOException {
    assumeTrue(FileSystems.getDefault().supportedFileAttributeViews().contains("posix"));
    Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-r--r--"));
    Path link = Files.createSymbolicLink(folder.resolve("link"), file);
    new WholeFile(link).replace(NEW);
    assertThat(link).isSymbolicLink();
    assertThat(file).hasBinaryContent(NEW);
    assertThat(Files.getPosixFilePermissions(file))
        .isEqualTo(PosixFilePermissions.fromString("rw-r--r--"));
  }

  @Test
  void aRelativeNameWithoutFolder() throws IOException {
    Path relative = Path.of("whole-file-test-" + ProcessHandle.current().pid() + ".tmp");
    try {
      new WholeFile(relative).replace(NEW);
      assertThat(relative).hasBinaryContent(NEW);
    } finally {
      Files.deleteIfExists(relative);
    }
  }
}
