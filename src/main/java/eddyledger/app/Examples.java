package eddyledger.app;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.file.ProjectReader;
import eddyledger.file.ReadResult;
import eddyledger.model.Vehicle;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** The examples that come with the program, packed into it or in the folder {@code examples}. */
public final class Examples {
  private static final String ENDING = ".eddyledger";
  private static final List<Example> ALL =
      List.of(
          new Example(
              "quillon-82",
              "Quillon 82",
              "Regional aircraft, Mach 0.74 at 10.7 km",
              "59 panels, 3 seats, 2 conditions, 7 targets",
              Example.Drawing.AIRCRAFT));

  private final ProjectReader reader;
  private final Path folder;

  /** With a reader of project files. */
  public Examples(ProjectReader reader) {
    this(reader, Path.of("examples"));
  }

  Examples(ProjectReader reader, Path folder) {
    this.reader = reader;
    this.folder = folder;
  }

  /** Every example, in the order of the start page. */
  public List<Example> list() {
    return ALL;
  }

  /**
   * Opens an example. It has no file of its own to be saved to: the file of the answer is only its
   * name.
   *
   * @param id id of one of {@link #list()}
   * @throws IllegalArgumentException if there is no such example
   */
  public OpenedProject open(String id) {
    Path name = Path.of(id + ENDING);
    try {
      ReadResult result = reader.read(text(id), name.toString());
      Optional<Vehicle> usable = result.fatal() ? Optional.empty() : result.vehicle();
      return new OpenedProject(name, usable, result.findings());
    } catch (IOException e) {
      Finding missing =
          new Finding(
              Severity.FATAL,
              "unreadable-file",
              "",
              name.toString(),
              "The example is not packed into the program, and the folder "
                  + folder.toAbsolutePath()
                  + " does not hold it.",
              "Install the program anew, or open a project file.");
      return new OpenedProject(name, Optional.empty(), List.of(missing));
    }
  }

  /**
   * The text of an example's project file.
   *
   * @throws IOException if it is neither packed into the program nor in the folder
   * @throws IllegalArgumentException if there is no such example
   */
  public String text(String id) throws IOException {
    if (ALL.stream().noneMatch(example -> example.id().equals(id))) {
      throw new IllegalArgumentException("there is no example " + id);
    }
    String name = id + ENDING;
    try (InputStream packed = Examples.class.getResourceAsStream("/examples/" + name)) {
      return packed == null
          ? Files.readString(folder.resolve(name))
          : new String(packed.readAllBytes(), StandardCharsets.UTF_8);
    }
  }
}
