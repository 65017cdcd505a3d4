package eddyledger.present;

import java.util.regex.Pattern;

/** Small changes to words. */
final class Words {
  /** A hyphen that stands for a minus before a number. */
  private static final Pattern MINUS = Pattern.compile("(?<![\\w-])-(?=\\d)");

  private Words() {}

  /** With a capital at its start, and every minus as U+2212. */
  static String sentence(String words) {
    String signed = MINUS.matcher(words).replaceAll("−");
    return signed.isEmpty()
        ? signed
        : Character.toUpperCase(signed.charAt(0)) + signed.substring(1);
  }
}
