package eddyledger.file;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.check.NearMiss;
import eddyledger.model.ByCondition;
import eddyledger.model.Extras;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;

/**
 * An object of the file that is read key by key. It notes which keys were asked for; at the end
 * {@link #extras()} tells of the others and keeps them.
 */
final class JsonObject {
  private final ObjectNode node;
  private final JsonValue self;
  private final String subject;
  private final Map<String, JsonValue> asked = new LinkedHashMap<>();
  private final Map<String, Object> kept = new LinkedHashMap<>();

  JsonObject(ObjectNode node, JsonValue self) {
    this.node = node == null ? JsonNodeFactory.instance.objectNode() : node;
    this.self = self;
    boolean named = this.node.path("id").isTextual();
    subject = named ? this.node.path("id").textValue() : self.subject();
  }

  /** The object as a value, to tell faults of the whole. */
  JsonValue self() {
    return self;
  }

  /** Whether any of the keys is there. */
  boolean hasAny(Set<String> keys) {
    return keys.stream().anyMatch(node::hasNonNull);
  }

  /** Whether the key is there, without asking for its value. */
  boolean has(String key) {
    return node.hasNonNull(key);
  }

  /** Its keys, in the order of the file. */
  List<String> keys() {
    return node.properties().stream().map(Map.Entry::getKey).toList();
  }

  /** The value of a key, absent or not. */
  JsonValue value(String key) {
    return value(key, placeOf(key));
  }

  /** The value of a key, absent or not, that makes up the whole object: its faults are told so. */
  JsonValue essence(String key) {
    return value(key, self.place());
  }

  private JsonValue value(String key, String place) {
    return asked.computeIfAbsent(
        key, name -> new JsonValue(node.get(name), place, subject, self.faults()));
  }

  private String placeOf(String key) {
    return self.place().isEmpty() ? key : self.place() + "." + key;
  }

  /** The text of a key; null if it is absent or none. */
  String text(String key) {
    return value(key).text();
  }

  /** The text of a key that must be there; empty if it is absent or none. */
  String requiredText(String key) {
    JsonValue value = value(key);
    String text = value.text();
    if (text == null || text.isBlank()) {
      value.missing();
      return "";
    }
    return text;
  }

  /** The number of a key; null if it is absent, NaN if it is none. */
  Double number(String key) {
    return value(key).number();
  }

  /** The number of a key that must be there; NaN if it is absent or none. */
  double requiredNumber(String key) {
    Double number = number(key);
    if (number == null) {
      value(key).missing();
      return Double.NaN;
    }
    return number;
  }

  /** The number of a key, or another one if it is absent; NaN if it is none. */
  double numberOr(String key, double otherwise) {
    Double number = number(key);
    return number == null ? otherwise : number;
  }

  /** The whole number of a key, or another one if it is absent; 0 if it is none. */
  int wholeOr(String key, int otherwise) {
    Integer whole = value(key).whole();
    return whole == null ? otherwise : whole;
  }

  /** The truth value of a key; null if it is absent or none. */
  Boolean flag(String key) {
    return value(key).flag();
  }

  /** The one of the values that goes by the text of a key; null if it is absent or unknown. */
  <E> E choice(String key, E[] values, Function<E, String> word) {
    return value(key).choice(values, word);
  }

  /** Tells if a key's text is absent or none of the words. */
  void requiredChoice(String key, String... words) {
    if (choice(key, words, word -> word) == null) {
      value(key).missing();
    }
  }

  /** The object of a key; null if it is absent, an empty one if it is none. */
  JsonObject object(String key) {
    JsonValue value = value(key);
    return value.absent() ? null : value.object();
  }

  /** The records of a list, in order; one for every member, so that positions stay as they are. */
  <T> List<T> records(String key, RecordCodec<T> codec) {
    List<T> records = new ArrayList<>();
    for (JsonValue item : value(key).items()) {
      if (item.absent()) {
        item.faults().whole(item, "missing-value", "There is nothing here.", "Take it away.");
      }
      records.add(codec.read(item.object()));
    }
    return records;
  }

  /** The texts of a list, in order; empty where a member is none. */
  List<String> texts(String key) {
    List<String> texts = new ArrayList<>();
    for (JsonValue item : value(key).items()) {
      String text = item.text();
      if (item.absent()) {
        item.missing();
      }
      texts.add(text == null ? "" : text);
    }
    return texts;
  }

  /** A record of its own kind; null if it is absent. */
  <T> T record(String key, RecordCodec<T> codec) {
    JsonObject object = object(key);
    return object == null ? null : codec.read(object);
  }

  /** A value that has a short form; null if it is absent. */
  <T> T read(String key, ValueCodec<T> codec) {
    JsonValue value = value(key);
    return value.absent() ? null : codec.read(value);
  }

  /** A value with its overrides; null if it is absent. */
  <T> ByCondition<T> byCondition(String key, ValueCodec<T> codec) {
    JsonValue value = value(key);
    return value.absent() ? null : new OverrideCodec<>(codec).read(value, this, key);
  }

  /** Keeps the unknown properties of an object that has no record of its own. */
  void keep(String key, Extras extras) {
    if (!extras.properties().isEmpty()) {
      kept.put(key, extras.properties());
    }
  }

  /** What is left over, told and kept; to be asked for last. */
  Extras extras() {
    node.properties()
        .forEach(
            property -> {
              String key = property.getKey();
              JsonValue value = asked.get(key);
              if (value == null) {
                unknown(key);
                kept.put(key, FreeJson.read(property.getValue()));
              } else if (value.unread()) {
                kept.put(key, value.kept());
              }
            });
    return kept.isEmpty() ? Extras.NONE : new Extras(kept);
  }

  private void unknown(String key) {
    self.faults()
        .warning(
            new JsonValue(null, placeOf(key), subject, self.faults()),
            "unknown-property",
            "The property "
                + JsonValue.shownText(key)
                + " is not known here and not used."
                + NearMiss.of(key, asked.keySet()),
            "Correct its name; left as it is, it is kept in the file.");
  }
}
