package eddyledger.app;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.file.ProjectReader;
import eddyledger.file.ProjectWriter;
import eddyledger.file.ReadResult;
import eddyledger.model.Vehicle;
import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** Opens project files. */
public final class Projects {
  private final ProjectReader reader;

  /** With a reader of project files. */
  public Projects(ProjectReader reader) {
    this.reader = reader;
  }

  /** Opens a file; whatever goes wrong is among the findings. */
  public OpenedProject open(Path file) {
    try {
      ReadResult result = reader.read(file);
      boolean unusable = result.findings().stream().anyMatch(Projects::closes);
      Optional<Vehicle> usable = unusable ? Optional.empty() : result.vehicle();
      return new OpenedProject(file, usable, result.findings());
    } catch (IOException e) {
      return new OpenedProject(file, Optional.empty(), List.of(unreadable(file, e)));
    }
  }

  /**
   * A vehicle without panels can be saved, so it can be opened too: panels are added at the desk.
   */
  private static boolean closes(Finding finding) {
    return finding.severity() == Severity.FATAL && !finding.code().equals("empty-vehicle");
  }

  /**
   * Saves a vehicle; the file is whole before and after, whatever happens.
   *
   * @throws WriteFailure if the file cannot be written; an old one is then as it was
   */
  public void save(Vehicle vehicle, Path file) {
    try {
      ProjectWriter.save(vehicle, file);
    } catch (IOException e) {
      throw WriteFailure.of(file, e);
    }
  }

  /** What there is to say of a vehicle's description, with places as its file would have them. */
  public List<Finding> findings(Vehicle vehicle) {
    return reader.read(ProjectWriter.toText(vehicle), vehicle.id()).findings();
  }

  private static Finding unreadable(Path file, IOException e) {
    String why;
    if (e instanceof NoSuchFileException) {
      why = "There is no such file.";
    } else if (e instanceof AccessDeniedException) {
      why = "The file may not be read.";
    } else if (Files.isDirectory(file)) {
      why = "It is a folder, not a file.";
    } else {
      why = "The file cannot be read: " + e.getMessage() + ".";
    }
    return new Finding(
        Severity.FATAL,
        "unreadable-file",
        "",
        file.toString(),
        why,
        "Check the path and your rights to read it.");
  }
}
