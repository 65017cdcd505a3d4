package eddyledger.present;

/** Small changes to words. */
final class Words {
  private Words() {}

  /** With a capital at its start. */
  static String sentence(String words) {
    return words.isEmpty() ? words : Character.toUpperCase(words.charAt(0)) + words.substring(1);
  }
}
