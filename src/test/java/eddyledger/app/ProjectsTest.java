package eddyledger.app;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeFalse;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.file.ProjectReader;
import eddyledger.file.SmallFile;
import java.io.IOException;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Opening a project: whatever goes wrong is a finding that names the file and says what to do. */
class ProjectsTest {
  private final Projects projects = new Projects(new ProjectReader());

  @TempDir private Path folder;

  private Path file(String text) throws IOException {
    return Files.writeString(folder.resolve("small.eddyledger"), text);
  }

  private void assertUnreadable(Path file, String what) {
    OpenedProject opened = projects.open(file);
    assertThat(opened.file()).isEqualTo(file);
    assertThat(opened.vehicle()).isEmpty();
    Finding finding = opened.findings().get(0);
    assertThat(opened.findings()).hasSize(1);
    assertThat(finding.severity()).isEqualTo(Severity.FATAL);
    assertThat(finding.code()).isEqualTo("unreadable-file");
    assertThat(finding.where()).isEqualTo(file.toString());
    assertThat(finding.what()).isEqualTo(what);
    assertThat(finding.remedy()).isEqualTo("Check the path and your rights to read it.");
  }

  @Test
  void aSoundFile() throws IOException {
    OpenedProject opened = projects.open(file(SmallFile.text()));
    assertThat(opened.findings()).isEmpty();
    assertThat(opened.vehicle()).hasValue(new SmallFile().vehicle());
  }

  @Test
  void aFileThatIsNotThere() {
    assertUnreadable(folder.resolve("none.eddyledger"), "There is no such file.");
    assertUnreadable(folder.resolve("no").resolve("none.eddyledger"), "There is no such file.");
  }

  @Test
  void aFolder() {
    assertUnreadable(folder, "It is a folder, not a file.");
  }

  @Test
  void aFileBelowAFile() throws IOException {
    assumeTrue(FileSystems.getDefault().supportedFileAttributeViews().contains("posix"));
    Path below = file(SmallFile.text()).resolve("part.eddyledger");
    assertUnreadable(below, "The file cannot be read: " + below + ": Not a directory.");
  }

  @Test
  void aFileThatMayNotBeRead() throws IOException {
    assumeTrue(FileSystems.getDefault().supportedFileAttributeViews().contains("posix"));
    Path file = file(SmallFile.text());
    Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("-wx------"));
    assumeFalse(Files.isReadable(file), "the administrator may read everything");
    assertUnreadable(file, "The file may not be read.");
  }

  @Test
  void aFileOfWhichNothingCanBeComputedIsNotOpened() throws IOException {
    OpenedProject opened =
        projects.open(file(new SmallFile().with("conditions", "[]").root().toString()));
    assertThat(opened.vehicle()).isEmpty();
    assertThat(opened.findings()).extracting(Finding::code).contains("no-condition");
  }

  @Test
  void aVehicleWithoutPanelsIsOpenedAndSaysSo() throws IOException {
    OpenedProject opened =
        projects.open(file(new SmallFile().with("tree", "[]").root().toString()));
    assertThat(opened.vehicle()).isPresent();
    assertThat(opened.findings()).extracting(Finding::code).contains("empty-vehicle");
  }

  @Test
  void aFaultyPanelDoesNotKeepTheProjectFromBeingOpened() throws IOException {
    String length = "tree[0].children[0].length_m";
    SmallFile faulty = new SmallFile().with(length, "900");
    OpenedProject opened = projects.open(file(faulty.root().toString()));
    assertThat(opened.vehicle()).hasValue(faulty.vehicle());
    assertThat(opened.findings()).extracting(Finding::place).containsExactly(length);
  }
}
