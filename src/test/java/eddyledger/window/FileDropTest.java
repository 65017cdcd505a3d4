package eddyledger.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Which of the dropped files is opened. */
class FileDropTest {
  @Test
  void theFirstProjectFileIsTaken() {
    assertThat(
            FileDrop.project(
                List.of(new File("a.txt"), new File("b.eddyledger"), new File("c.eddyledger"))))
        .contains(Path.of("b.eddyledger"));
    assertThat(FileDrop.project(List.of(new File("B.EDDYLEDGER")))).isPresent();
  }

  @Test
  void nothingElseIsTaken() {
    assertThat(FileDrop.project(List.of(new File("a.json"), "b.eddyledger"))).isEmpty();
    assertThat(FileDrop.project(List.of())).isEmpty();
  }
}
