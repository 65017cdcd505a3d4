package eddyledger.file;

import eddyledger.check.Finding;
import eddyledger.check.Severity;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * Gathers what is wrong with a file while it is read, and keeps one fault from being told twice.
 * Used by one thread.
 */
final class Faults {
  private final List<Finding> all = new ArrayList<>();
  private final Set<String> told = new HashSet<>();
  private final Set<String> toldWithParts = new HashSet<>();

  /** A file that cannot be used at all. */
  void file(String code, String fileName, String place, String what, String remedy) {
    all.add(new Finding(Severity.FATAL, code, fileName, place, what, remedy));
  }

  /** A value that cannot be read; nothing else is told of this place. */
  void value(Severity severity, JsonValue value, String code, String what, String remedy) {
    if (!covered(value.place())) {
      all.add(new Finding(severity, code, value.subject(), value.place(), what, remedy));
      told.add(value.place());
    }
  }

  /** A value that cannot be read as a whole; nothing else is told of it or of its parts. */
  void whole(JsonValue value, String code, String what, String remedy) {
    value(Severity.ERROR, value, code, what, remedy);
    enoughOf(value);
  }

  /** Nothing more is told of a value and its parts. */
  void enoughOf(JsonValue value) {
    toldWithParts.add(value.place());
  }

  /** Something that may be a slip. */
  void warning(JsonValue value, String code, String what, String remedy) {
    all.add(new Finding(Severity.WARNING, code, value.subject(), value.place(), what, remedy));
  }

  /** All that was gathered, then those of the others that do not repeat it. */
  List<Finding> with(List<Finding> others) {
    List<Finding> together = new ArrayList<>(all);
    others.stream().filter(finding -> !covered(finding.place())).forEach(together::add);
    return List.copyOf(together);
  }

  private boolean covered(String place) {
    if (told.contains(place) || toldWithParts.contains(place)) {
      return true;
    }
    for (int i = place.length() - 1; i > 0; i--) {
      boolean partBegins = place.charAt(i) == '.' || place.charAt(i) == '[';
      if (partBegins && toldWithParts.contains(place.substring(0, i))) {
        return true;
      }
    }
    return false;
  }
}
