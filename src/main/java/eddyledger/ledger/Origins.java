package eddyledger.ledger;

import eddyledger.model.Held;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/** Where each resolved value of a panel comes from. Filled by one thread while resolving. */
final class Origins {
  private final Map<String, String> words = new LinkedHashMap<>();
  private final Set<String> holders = new TreeSet<>();
  private String construction = "";

  /** Notes where a value is set and gives the value on. */
  <T> T note(String key, Held<T> held) {
    String where = held.own() ? "set on the panel" : "from " + held.holder();
    words.put(key, held.override() ? where + ", for this condition" : where);
    holders.add(held.holder());
    return held.value();
  }

  /** Notes a default. */
  void defaulted(String key) {
    words.put(key, "default, nobody set it");
  }

  /** Notes an object that the panel refers to. */
  void uses(String id) {
    holders.add(id);
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

  /** In words where a value is set; empty if it was never asked for. */
  String words(String key) {
    return words.getOrDefault(key, "");
  }

  /** Ids of everything the panel's values come from. */
  Set<String> holders() {
    return holders;
  }
}
