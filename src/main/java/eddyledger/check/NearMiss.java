package eddyledger.check;

import java.util.Collection;
import java.util.Locale;

/**
 * The word somebody may have meant: the known one with the least edit distance, if it is near.
 *
 * <p>Distance: V. I. Levenshtein, "Binary codes capable of correcting deletions, insertions, and
 * reversals", Sov. Phys. Dokl. 10 (1966) 707.
 */
public final class NearMiss {
  private NearMiss() {}

  /**
   * A sentence that suggests the nearest known word, with a leading space; empty if none is near.
   */
  public static String of(String word, Collection<String> known) {
    String best = nearest(word, known);
    return best == null ? "" : " Did you mean \"" + best + "\"?";
  }

  /** The nearest known word; null if none is near. */
  public static String nearest(String word, Collection<String> known) {
    int allowed = Math.max(1, word.length() / 3);
    String best = null;
    int least = Integer.MAX_VALUE;
    for (String candidate : known.stream().sorted().toList()) {
      if (Math.abs(candidate.length() - word.length()) > allowed) {
        // cannot be near, and the distance of very long words takes long
        continue;
      }
      int distance = distance(word.toLowerCase(Locale.ROOT), candidate.toLowerCase(Locale.ROOT));
      if (distance < least) {
        least = distance;
        best = candidate;
      }
    }
    return least <= allowed ? best : null;
  }

  private static int distance(String a, String b) {
    int[] previous = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      previous[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int[] current = new int[b.length() + 1];
      current[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int change = previous[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        current[j] = Math.min(change, Math.min(previous[j], current[j - 1]) + 1);
      }
      previous = current;
    }
    return previous[b.length()];
  }
}
