package eddyledger.file;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.check.NearMiss;
import eddyledger.check.Severity;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Stream;

/**
 * A value of the file with its place in it. A getter of the wrong kind tells the fault, marks the
 * value as unread, and gives null or NaN, so that reading goes on.
 */
final class JsonValue {
  private static final int SHOWN = 40;

  private final JsonNode node;
  private final String place;
  private final String subject;
  private final Faults faults;
  private boolean unread;
  private JsonObject object;
  private List<JsonValue> items;

  JsonValue(JsonNode node, String place, String subject, Faults faults) {
    this.node = node == null || node.isNull() ? MissingNode.getInstance() : node;
    this.place = place;
    this.subject = subject;
    this.faults = faults;
  }

  String place() {
    return place;
  }

  String subject() {
    return subject;
  }

  Faults faults() {
    return faults;
  }

  /** Whether nothing is given: left out, or null. */
  boolean absent() {
    return node.isMissingNode();
  }

  boolean isObject() {
    return node.isObject();
  }

  boolean isText() {
    return node.isTextual();
  }

  boolean isNumber() {
    return node.isNumber();
  }

  /** Whether it, or a member of the list it is, could not be read and has to be kept. */
  boolean unread() {
    return unread || items != null && items.stream().anyMatch(item -> item.unread);
  }

  /** What has to be kept: the whole, or a list of as many members with null for what was read. */
  Object kept() {
    if (unread) {
      return FreeJson.read(node);
    }
    List<Object> members = new ArrayList<>();
    items.forEach(item -> members.add(item.unread ? FreeJson.read(item.node) : null));
    return Collections.unmodifiableList(members);
  }

  /** Keeps the value as it stands, without a word. */
  void keep() {
    unread = true;
  }

  /** The text; null if it is absent or no text. */
  String text() {
    if (node.isTextual() || absent()) {
      return absent() ? null : node.textValue();
    }
    wrong("A text is wanted here, not " + shown() + ".", "Put it in quotes.");
    return null;
  }

  /** The number; null if it is absent, NaN if it is none. */
  Double number() {
    if (absent()) {
      return null;
    }
    if (!node.isNumber()) {
      fault("not-a-number", "A number is wanted here, not " + shown() + ".", numberRemedy());
      return Double.NaN;
    }
    double number = node.doubleValue();
    if (Double.isInfinite(number)) {
      fault(
          "not-a-number", "The number " + clipped(node.asText()) + " is too large.", "Correct it.");
      return Double.NaN;
    }
    return number;
  }

  private String numberRemedy() {
    boolean quoted = node.isTextual() && node.textValue().matches("-?\\d+(\\.\\d+)?");
    return quoted
        ? "Take the quotes away."
        : "Enter a number without its unit, with a point before the decimals.";
  }

  /** The whole number; null if it is absent, 0 if it is none. */
  Integer whole() {
    Double number = number();
    if (number == null || number.isNaN()) {
      return number == null ? null : 0;
    }
    if (number != Math.rint(number) || Math.abs(number) > Integer.MAX_VALUE) {
      String what = "A whole number is wanted here, not " + clipped(node.asText()) + ".";
      fault("not-a-number", what, "Enter a whole number.");
      return 0;
    }
    return number.intValue();
  }

  /** The truth value; null if it is absent or none. */
  Boolean flag() {
    if (node.isBoolean() || absent()) {
      return absent() ? null : node.booleanValue();
    }
    wrong("True or false is wanted here, not " + shown() + ".", "Write true or false, no quotes.");
    return null;
  }

  /** The one of the values that goes by the text; null if it is absent or there is none. */
  <E> E choice(E[] values, Function<E, String> word) {
    String text = text();
    for (E value : values) {
      if (word.apply(value).equals(text)) {
        return value;
      }
    }
    if (text != null) {
      List<String> words = Stream.of(values).map(word).toList();
      fault(
          "unknown-word",
          shownText(text) + " is none of the words known here." + NearMiss.of(text, words),
          "Write one of " + String.join(", ", words) + ".");
    }
    return null;
  }

  /** The object, always the same one; an empty one if it is none. */
  JsonObject object() {
    if (object == null) {
      object = new JsonObject(node instanceof ObjectNode own ? own : null, this);
      if (!node.isObject() && !absent()) {
        keep();
        String what = "An object in braces is wanted here, not " + shown() + ".";
        wholeFault("wrong-type", what, "Write it as { ... }.");
      }
    }
    return object;
  }

  /** The members of the list, always the same, absent ones too; empty if it is absent or none. */
  List<JsonValue> items() {
    if (items == null) {
      items = new ArrayList<>();
      if (node.isArray()) {
        for (int i = 0; i < node.size(); i++) {
          items.add(new JsonValue(node.get(i), place + "[" + i + "]", subject, faults));
        }
      } else if (!absent()) {
        keep();
        String what = "A list in brackets is wanted here, not " + shown() + ".";
        wholeFault("wrong-type", what, "Write it as [ ... ].");
      }
    }
    return items;
  }

  /** Tells that a value is missing. */
  void missing() {
    faults.value(Severity.ERROR, this, "missing-value", "It is missing.", "Enter it.");
  }

  /** Tells what is wrong with the value and keeps it as it stands. */
  void fault(String code, String what, String remedy) {
    keep();
    faults.value(Severity.ERROR, this, code, what, remedy);
  }

  /** Tells that the value is of no use as a whole; what its parts say is kept by their keys. */
  void wholeFault(String code, String what, String remedy) {
    faults.whole(this, code, what, remedy);
  }

  private void wrong(String what, String remedy) {
    fault("wrong-type", what, remedy);
  }

  /** The value in words. */
  String shown() {
    if (node.isTextual()) {
      return "the text " + shownText(node.textValue());
    }
    if (node.isContainerNode()) {
      return node.isArray() ? "a list" : "an object";
    }
    return node.isMissingNode() ? "nothing" : clipped(node.asText());
  }

  static String shownText(String text) {
    return "\"" + clipped(text) + "\"";
  }

  private static String clipped(String text) {
    return text.length() <= SHOWN ? text : text.substring(0, SHOWN) + "...";
  }
}
