package eddyledger.app;

import eddyledger.quantity.BandSpectrum;
import eddyledger.quantity.Bands;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.Instant;
import java.time.format.DateTimeParseException;
import java.util.Arrays;
import java.util.Locale;
import java.util.Optional;
import java.util.prefs.Preferences;
import java.util.stream.Collectors;

/** One entry of the recent files as a node of preferences. */
final class RecentFileStore {
  private static final String FILE = "file";
  private static final String OPENED = "opened";
  private static final String DESCRIPTION = "description";
  private static final String LEVELS = "levels_dBA";

  private RecentFileStore() {}

  static void write(RecentFile file, Preferences node) {
    node.put(FILE, file.file().toString());
    node.put(OPENED, file.opened().toString());
    node.put(DESCRIPTION, file.description());
    node.putInt("contributions", file.contributions());
    node.putInt("over", file.over());
    node.putInt("tight", file.tight());
    node.putInt("inside", file.inside());
    node.putInt("unknown", file.unknown());
    node.put(
        LEVELS,
        Arrays.stream(file.levels().toArray())
            .mapToObj(level -> Double.isNaN(level) ? "" : String.format(Locale.ROOT, "%.1f", level))
            .collect(Collectors.joining(",")));
  }

  /** The entry; empty if file or time cannot be read. Counts and levels that cannot be are none. */
  static Optional<RecentFile> read(Preferences node) {
    String file = node.get(FILE, "");
    if (file.isBlank()) {
      return Optional.empty();
    }
    try {
      return Optional.of(
          new RecentFile(
              Path.of(file),
              Instant.parse(node.get(OPENED, "")),
              node.get(DESCRIPTION, ""),
              count(node, "contributions"),
              count(node, "over"),
              count(node, "tight"),
              count(node, "inside"),
              count(node, "unknown"),
              levels(node.get(LEVELS, ""))));
    } catch (InvalidPathException | DateTimeParseException e) {
      return Optional.empty();
    }
  }

  private static int count(Preferences node, String key) {
    return Math.max(0, node.getInt(key, 0));
  }

  private static BandSpectrum levels(String text) {
    double[] levels = new double[Bands.COUNT];
    Arrays.fill(levels, Double.NaN);
    String[] parts = text.split(",", -1);
    for (int band = 0; band < Bands.COUNT && parts.length == Bands.COUNT; band++) {
      levels[band] = level(parts[band]);
    }
    return BandSpectrum.of(levels);
  }

  private static double level(String text) {
    try {
      double level = Double.parseDouble(text);
      return Double.isInfinite(level) ? Double.NaN : level;
    } catch (NumberFormatException e) {
      return Double.NaN;
    }
  }
}
