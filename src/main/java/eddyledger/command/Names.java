package eddyledger.command;

import eddyledger.check.NearMiss;
import java.util.List;
import java.util.function.Function;

/** Finds things by id, or by name where the name is unique. */
final class Names {
  private Names() {}

  /**
   * The id of the thing meant.
   *
   * @param what what is looked for, in words
   * @param word id or name as typed
   * @throws UnknownName if nothing or more than one thing answers to it
   */
  static <T> String find(
      String what, String word, List<T> things, Function<T, String> id, Function<T, String> name) {
    List<String> ids = things.stream().map(id).toList();
    if (ids.contains(word)) {
      return word;
    }
    List<String> named =
        things.stream().filter(thing -> word.equals(name.apply(thing))).map(id).toList();
    if (named.size() == 1) {
      return named.get(0);
    }
    if (named.size() > 1) {
      throw new UnknownName(
          "The name \"" + word + "\" is borne by " + String.join(", ", named) + "; give the id.");
    }
    String nearest = NearMiss.of(word, ids);
    String known = nearest.isEmpty() ? " Known are: " + shortened(ids) + "." : nearest;
    throw new UnknownName("There is no " + what + " \"" + word + "\"." + known);
  }

  private static String shortened(List<String> ids) {
    int shown = Math.min(12, ids.size());
    String text = String.join(", ", ids.subList(0, shown));
    return ids.size() > shown ? text + " and " + (ids.size() - shown) + " more" : text;
  }
}
