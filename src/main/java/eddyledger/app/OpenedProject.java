package eddyledger.app;

import eddyledger.check.Finding;
import eddyledger.model.Vehicle;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/**
 * A project file that was opened, or the reasons why it could not be.
 *
 * @param file the file
 * @param vehicle what it describes; empty if it cannot be used
 * @param findings what reading it found, descriptions included
 */
public record OpenedProject(Path file, Optional<Vehicle> vehicle, List<Finding> findings) {
  public OpenedProject {
    findings = List.copyOf(findings);
  }
}
