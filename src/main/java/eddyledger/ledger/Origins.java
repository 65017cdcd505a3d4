package eddyledger.ledger;

import eddyledger.check.Finding;
import eddyledger.model.Held;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * Where each value comes from that a panel is computed with in a condition, and whether one of them
 * is faulty. Filled by one thread while resolving.
 */
final class Origins {
  private final LevelErrors errors;
  private final String panel;
  private final String condition;
  private final Map<String, String> words = new LinkedHashMap<>();
  private final Set<String> defaults = new HashSet<>();
  private final List<Optional<Finding>> found = new ArrayList<>();
  private String construction = "";

  /** Of a panel in a condition, by their ids. */
  Origins(LevelErrors errors, String panel, String condition) {
    this.errors = errors;
    this.panel = panel;
    this.condition = condition;
  }

  /** Notes where a setting is set and gives its value on; null where nobody set it. */
  <T> T note(String key, Optional<Held<T>> setting) {
    if (setting.isEmpty()) {
      found.add(errors.at(panel, key, condition, false));
      return null;
    }
    Held<T> held = setting.get();
    String where = held.own() ? "set on the panel" : "from " + held.holder();
    words.put(key, held.override() ? where + ", for this condition" : where);
    found.add(errors.at(held.holder(), key, condition, held.override()));
    return held.value();
  }

  /** Notes a default. */
  void defaulted(String key) {
    defaults.add(key);
  }

  /** Notes a property of the panel itself. */
  void usesOwn(String key) {
    found.add(errors.at(panel, key));
  }

  /** Notes an object that the panel refers to and uses as a whole. */
  void uses(String id) {
    found.add(errors.about(id));
  }

  /** Notes the construction the panel refers to. */
  void usesConstruction(String id) {
    construction = id;
    uses(id);
  }

  /** Id of the construction the panel refers to; empty if none. */
  String construction() {
    return construction;
  }

  /** In words where a value is set; empty if nobody set it or it was never asked for. */
  String words(String key) {
    return words.getOrDefault(key, "");
  }

  /** Where a value is set, then the publication it stands for; of a default the latter only. */
  String source(String key, String publication) {
    return joined(words(key), publication);
  }

  /** That a value is a default, if it is one, then what else there is to note. */
  String note(String key, String more) {
    return joined(defaults.contains(key) ? "default, nobody set it" : "", more);
  }

  private static String joined(String first, String second) {
    return first.isEmpty() || second.isEmpty() ? first + second : first + "; " + second;
  }

  /** The first error about a value that is used; empty if there is none. */
  Optional<Finding> error() {
    return found.stream().flatMap(Optional::stream).findFirst();
  }
}
