package eddyledger.present;

import java.util.List;
import java.util.Locale;

/** Names made shorter where what is left still tells them apart. */
final class ShortName {
  private ShortName() {}

  /**
   * A name up to its first comma, "Row 2, window seat" as "Row 2", unless another name among those
   * given begins the same.
   */
  static String among(String name, List<String> names) {
    String start = start(name);
    long same = names.stream().filter(other -> start(other).equals(start)).count();
    return same > 1 ? name : start;
  }

  private static String start(String name) {
    int comma = name.indexOf(',');
    return comma <= 0 ? name : name.substring(0, comma).strip();
  }

  /** A name without the section it ends in: "Crown, station E" within "Station E" is "Crown". */
  static String within(String name, String section) {
    String end = ", " + section.toLowerCase(Locale.ROOT);
    boolean ends = name.toLowerCase(Locale.ROOT).endsWith(end) && name.length() > end.length();
    return ends ? name.substring(0, name.length() - end.length()) : name;
  }
}
