package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.check.VehicleCheck;
import eddyledger.model.Vehicle;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/**
 * Reads a project file. Whatever is wrong with the content becomes a finding, all of them at once;
 * only the file system's own failures are thrown. Immutable.
 */
public final class ProjectReader {
  /** The size that no project file passes, bytes: 64 MiB. */
  public static final long GREATEST_SIZE = 64L * 1024 * 1024;

  private final Limits limits;

  /** A reader for files up to {@link #GREATEST_SIZE}. */
  public ProjectReader() {
    this(GREATEST_SIZE);
  }

  /** A reader for files up to a size in bytes, at most {@link #GREATEST_SIZE}. */
  public ProjectReader(long greatestSize) {
    limits = Limits.ofBytes(Math.min(greatestSize, GREATEST_SIZE));
  }

  /**
   * Reads a file.
   *
   * @throws IOException if the file is not there or the file system does not give it
   */
  public ReadResult read(Path file) throws IOException {
    String name = String.valueOf(file.getFileName());
    if (Files.size(file) > limits.bytes()) {
      return tooLarge(name);
    }
    try (InputStream in = Files.newInputStream(file)) {
      // one byte more than allowed, for files that grow or do not know their size
      return read(in.readNBytes((int) limits.bytes() + 1), name);
    }
  }

  /** Reads the bytes of a file that goes by a name in the findings. */
  public ReadResult read(byte[] bytes, String name) {
    if (bytes.length > limits.bytes()) {
      return tooLarge(name);
    }
    Faults faults = new Faults();
    Optional<Vehicle> vehicle =
        new JsonParsing(limits, name, faults)
            .parse(bytes)
            .flatMap(node -> vehicle(node, name, faults));
    return new ReadResult(vehicle, faults.with(vehicle.map(VehicleCheck::of).orElse(List.of())));
  }

  /** Reads a text that goes by a name in the findings. */
  public ReadResult read(String text, String name) {
    return read(text.getBytes(StandardCharsets.UTF_8), name);
  }

  private static Optional<Vehicle> vehicle(ObjectNode node, String name, Faults faults) {
    JsonObject root = new JsonValue(node, "", "", faults).object();
    return FormatVersion.readable(root, name)
        ? Optional.of(VehicleCodec.VEHICLE.read(root))
        : Optional.empty();
  }

  private ReadResult tooLarge(String name) {
    Faults faults = new Faults();
    faults.file(
        "too-large",
        name,
        "",
        "The file has more than " + limits.bytes() + " bytes, which no project needs.",
        "Check whether it is the right file.");
    return new ReadResult(Optional.empty(), faults.with(List.of()));
  }
}
