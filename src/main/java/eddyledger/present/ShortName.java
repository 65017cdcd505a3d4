package eddyledger.present;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

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

  /**
   * A name without the section it names: within "Station E", "Crown, station E aft" is "Crown" and
   * "Station E, aft cabin" is "Aft cabin", unless a sibling becomes the same.
   *
   * @param sections names of the sections it is within
   * @param counts how often each short name stands among its siblings
   */
  static String within(String name, List<String> sections, Map<String, Integer> counts) {
    String cut = cut(name, sections);
    return counts.getOrDefault(cut, 0) > 1 ? name : cut;
  }

  /** How often each short name stands among siblings. */
  static Map<String, Integer> counts(List<String> siblings, List<String> sections) {
    Map<String, Integer> counts = new HashMap<>();
    siblings.forEach(name -> counts.merge(cut(name, sections), 1, Integer::sum));
    return counts;
  }

  private static String cut(String name, List<String> sections) {
    String lower = name.toLowerCase(Locale.ROOT);
    for (String section : sections) {
      int at = lower.indexOf(", " + section.toLowerCase(Locale.ROOT));
      if (at > 0) {
        return name.substring(0, at);
      }
      String start = section.toLowerCase(Locale.ROOT) + ", ";
      if (lower.startsWith(start) && lower.length() > start.length()) {
        String rest = name.substring(start.length());
        return Character.toUpperCase(rest.charAt(0)) + rest.substring(1);
      }
    }
    return name;
  }
}
