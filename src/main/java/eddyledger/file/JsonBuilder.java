package eddyledger.file;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.BooleanNode;
import com.fasterxml.jackson.databind.node.DoubleNode;
import com.fasterxml.jackson.databind.node.IntNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.LongNode;
import com.fasterxml.jackson.databind.node.NullNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.fasterxml.jackson.databind.node.TextNode;
import eddyledger.model.BandTable;
import eddyledger.model.ByCondition;
import eddyledger.model.Extras;
import java.util.List;
import java.util.Map;

/** Writes an object of the file key by key; whatever is null or not a number is left out. */
final class JsonBuilder {
  /** Whole numbers below this are written without point and exponent. */
  private static final double PLAIN = 1.0e7;

  private final ObjectNode node = JsonNodeFactory.instance.objectNode();

  JsonBuilder text(String key, String value) {
    return put(key, value == null ? null : TextNode.valueOf(value));
  }

  /** A text that may not be empty in the file. */
  JsonBuilder name(String key, String value) {
    return text(key, value == null || value.isBlank() ? null : value);
  }

  JsonBuilder number(String key, Double value) {
    return put(key, value == null || value.isNaN() ? null : number(value));
  }

  /** A whole number above 0; 0 is one that could not be read and gives way to what was kept. */
  JsonBuilder whole(String key, int value) {
    return put(key, IntNode.valueOf(value));
  }

  JsonBuilder flag(String key, Boolean value) {
    return put(key, value == null ? null : BooleanNode.valueOf(value));
  }

  /** Texts in a row, null for those that are null or empty. */
  JsonBuilder texts(String key, List<String> values) {
    ArrayNode list = JsonNodeFactory.instance.arrayNode();
    values.forEach(value -> list.add(value == null || value.isEmpty() ? null : value));
    return put(key, list);
  }

  /** Something of any of the kinds that JSON has. */
  JsonBuilder free(String key, Object value) {
    return put(key, FreeJson.write(value));
  }

  /** Numbers in a row, null for those that are null or not a number. */
  JsonBuilder numbers(String key, List<Double> values) {
    if (values == null) {
      return this;
    }
    ArrayNode list = JsonNodeFactory.instance.arrayNode();
    values.forEach(
        value -> list.add(value == null || value.isNaN() ? NullNode.getInstance() : number(value)));
    return put(key, list);
  }

  /** Records in a row; left out if there is none. */
  <T> JsonBuilder records(String key, List<T> values, RecordCodec<T> codec) {
    return values.isEmpty() ? this : allRecords(key, values, codec);
  }

  /** Records in a row, an empty row too. */
  <T> JsonBuilder allRecords(String key, List<T> values, RecordCodec<T> codec) {
    ArrayNode list = JsonNodeFactory.instance.arrayNode();
    values.forEach(value -> list.add(codec.write(value)));
    return put(key, list);
  }

  JsonBuilder object(String key, JsonBuilder value) {
    return put(key, value.node);
  }

  <T> JsonBuilder record(String key, T value, RecordCodec<T> codec) {
    return put(key, value == null ? null : codec.write(value));
  }

  /** A value in its short form if it has one. */
  <T> JsonBuilder value(String key, T value, ValueCodec<T> codec) {
    return put(key, value == null ? null : codec.brief(codec.write(value)));
  }

  /** Values per band without judgement, in their short form if they have one. */
  JsonBuilder table(String key, BandTable value) {
    return put(key, value == null ? null : TableCodec.brief(TableCodec.TABLE.write(value)));
  }

  <T> JsonBuilder byCondition(String key, ByCondition<T> value, ValueCodec<T> codec) {
    return put(key, value == null ? null : new OverrideCodec<>(codec).write(value));
  }

  private JsonBuilder put(String key, JsonNode value) {
    if (value != null && !value.isMissingNode()) {
      node.set(key, value);
    }
    return this;
  }

  /** The object with what was kept; a key that stands already keeps its value. */
  ObjectNode with(Extras extras) {
    merge(node, extras.properties());
    return node;
  }

  private static void merge(ObjectNode into, Map<?, ?> kept) {
    kept.forEach(
        (name, value) -> {
          String key = (String) name;
          JsonNode written = into.get(key);
          if (written instanceof ObjectNode nested && value instanceof Map<?, ?> parts) {
            merge(nested, parts);
          } else if (written instanceof ArrayNode list && value instanceof List<?> members) {
            fill(list, members);
          } else if (nothing(written)) {
            into.set(key, FreeJson.write(value));
          }
        });
  }

  /** Puts members that could not be read back in their positions, unless the list has changed. */
  private static void fill(ArrayNode list, List<?> members) {
    if (list.size() != members.size()) {
      return;
    }
    for (int i = 0; i < list.size(); i++) {
      if (members.get(i) != null && nothing(list.get(i))) {
        list.set(i, FreeJson.write(members.get(i)));
      }
    }
  }

  private static boolean nothing(JsonNode written) {
    return written == null
        || written.isNull()
        || written.isObject() && written.isEmpty()
        || written.isInt() && written.intValue() == 0;
  }

  private static JsonNode number(double value) {
    boolean plain = value == Math.rint(value) && Math.abs(value) < PLAIN;
    return plain ? LongNode.valueOf((long) value) : DoubleNode.valueOf(value);
  }
}
