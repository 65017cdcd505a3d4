package eddyledger.file;

import eddyledger.model.Vehicle;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;

/** Writes a project file. The same vehicle gives the same bytes. */
public final class ProjectWriter {
  private ProjectWriter() {}

  /**
   * The text of a vehicle's project file.
   *
   * @throws IllegalArgumentException if unknown properties hold something that JSON has no form for
   */
  public static String toText(Vehicle vehicle) {
    return JsonText.of(VehicleCodec.VEHICLE.write(vehicle));
  }

  /**
   * Saves a vehicle in a file, a new one or in place of an older one. Either the whole new file is
   * there afterwards, or the old one untouched.
   *
   * @throws IOException if the file system does not take it
   */
  public static void save(Vehicle vehicle, Path file) throws IOException {
    new WholeFile(file).replace(toText(vehicle).getBytes(StandardCharsets.UTF_8));
  }
}
