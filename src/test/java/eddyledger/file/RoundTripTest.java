package eddyledger.file;

import static org.assertj.core.api.Assertions.assertThat;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import eddyledger.model.Vehicle;
import eddyledger.model.VehicleBuilder;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is written is read again as it was. */
class RoundTripTest {
  private final ProjectReader reader = new ProjectReader();

  @Test
  void aVehicleWithEveryPropertyComesBackEqual() {
    Vehicle vehicle = RichVehicle.vehicle();
    ReadResult result = reader.read(ProjectWriter.toText(vehicle), "rich.eddyledger");
    assertThat(result.findings())
        .extracting(Finding::code)
        .containsOnlyOnce("absorption-assumed")
        .allMatch(code -> List.of("unknown-property", "absorption-assumed").contains(code));
    assertThat(result.findings()).allMatch(finding -> finding.severity() == Severity.WARNING);
    assertThat(result.vehicle()).hasValue(vehicle);
  }

  @Test
  void aVehicleComesBackFromDisk(@TempDir Path folder) throws IOException {
    Path file = folder.resolve("車両 =1.eddyledger");
    ProjectWriter.save(RichVehicle.vehicle(), file);
    assertThat(reader.read(file).vehicle()).hasValue(RichVehicle.vehicle());
  }

  @Test
  void anEmptyVehicleComesBackEqual() {
    Vehicle vehicle = VehicleBuilder.named("v", "v").build();
    assertThat(reader.read(ProjectWriter.toText(vehicle), "v").vehicle()).hasValue(vehicle);
  }

  @Test
  void theSameVehicleGivesTheSameBytes() {
    String once = ProjectWriter.toText(RichVehicle.vehicle());
    assertThat(ProjectWriter.toText(RichVehicle.vehicle())).isEqualTo(once);
    Vehicle back = reader.read(once, "rich").vehicle().orElseThrow();
    assertThat(ProjectWriter.toText(back)).isEqualTo(once);
  }

  @Test
  void everyUnknownPropertyIsToldOnceAndKept() {
    String text = ProjectWriter.toText(RichVehicle.vehicle());
    long notes = text.lines().filter(line -> line.contains("\"x-note\"")).count();
    long told =
        reader.read(text, "rich").findings().stream()
            .map(Finding::place)
            .filter(place -> place.endsWith(".x-note"))
            .distinct()
            .count();
    assertThat(told).isEqualTo(notes).isGreaterThan(30);
  }
}
