package eddyledger.file;

import java.util.List;

/** The two keys by which a file is known, and the version that this program reads and writes. */
final class FormatVersion {
  /** The version that this program writes, the highest that it reads. */
  static final int CURRENT = 1;

  private static final String FORMAT = "format";
  private static final String VERSION = "format_version";
  private static final String NAME = "eddyledger";

  /** Both keys. */
  static final List<String> KEYS = List.of(FORMAT, VERSION);

  private FormatVersion() {}

  /** Whether the file is one of ours in a version that can be read; if not, that is told. */
  static boolean readable(JsonObject root, String fileName) {
    Faults faults = root.self().faults();
    JsonValue format = root.value(FORMAT);
    if (!format.isText() || !NAME.equals(format.text())) {
      String found = format.absent() ? "has no \"format\"" : "has the format " + format.shown();
      faults.file(
          "other-format",
          fileName,
          FORMAT,
          "The file " + found + ", so it is not an Eddyledger project.",
          "Open a project file, or begin this one with \"format\": \"eddyledger\".");
      return false;
    }
    JsonValue version = root.value(VERSION);
    double number = version.isNumber() ? version.number() : 0.0;
    if (number > CURRENT) {
      faults.file(
          "newer-version",
          fileName,
          VERSION,
          "The file has format version "
              + version.shown()
              + "; this program reads version "
              + CURRENT
              + ".",
          "Open it with a newer Eddyledger, or save it there for version " + CURRENT + ".");
      return false;
    }
    if (number != CURRENT) {
      String found = version.absent() ? "is missing" : "is " + version.shown();
      faults.file(
          "bad-version",
          fileName,
          VERSION,
          "The format version " + found + "; this program reads version " + CURRENT + ".",
          "Write \"format_version\": " + CURRENT + ".");
      return false;
    }
    return true;
  }

  /** An object that begins with both keys. */
  static JsonBuilder begin() {
    return new JsonBuilder().text(FORMAT, NAME).whole(VERSION, CURRENT);
  }
}
