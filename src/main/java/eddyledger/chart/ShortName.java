package eddyledger.chart;

import java.util.Locale;

/** Names of rows where the section they are in is known. */
final class ShortName {
  private ShortName() {}

  /** A name without the section it ends in: "Crown, station E" within "Station E" is "Crown". */
  static String within(String name, String section) {
    String end = ", " + section.toLowerCase(Locale.ROOT);
    boolean ends = name.toLowerCase(Locale.ROOT).endsWith(end) && name.length() > end.length();
    return ends ? name.substring(0, name.length() - end.length()) : name;
  }
}
