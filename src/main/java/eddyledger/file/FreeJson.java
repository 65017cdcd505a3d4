package eddyledger.file;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.BigIntegerNode;
import com.fasterxml.jackson.databind.node.DecimalNode;
import com.fasterxml.jackson.databind.node.DoubleNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** JSON whose meaning is not known, as maps, lists, strings, numbers, truth values and null. */
final class FreeJson {
  private FreeJson() {}

  /** The plain value of a node; no digit of a number is lost. */
  static Object read(JsonNode node) {
    if (node.isObject()) {
      Map<String, Object> map = new LinkedHashMap<>();
      node.properties().forEach(entry -> map.put(entry.getKey(), read(entry.getValue())));
      return Collections.unmodifiableMap(map);
    }
    if (node.isArray()) {
      List<Object> list = new ArrayList<>();
      node.forEach(item -> list.add(read(item)));
      return Collections.unmodifiableList(list);
    }
    if (node.isTextual()) {
      return node.textValue();
    }
    if (node.isBoolean()) {
      return node.booleanValue();
    }
    return node.isNumber() ? number(node) : null;
  }

  private static Number number(JsonNode node) {
    if (!node.isBigDecimal()) {
      return node.numberValue();
    }
    BigDecimal exact = node.decimalValue();
    double nearest = exact.doubleValue();
    boolean same =
        Double.isFinite(nearest) && new BigDecimal(Double.toString(nearest)).compareTo(exact) == 0;
    return same ? (Number) nearest : exact;
  }

  /**
   * The node of a plain value.
   *
   * @throws IllegalArgumentException if it is of none of the kinds that JSON has
   */
  static JsonNode write(Object value) {
    JsonNodeFactory nodes = JsonNodeFactory.instance;
    if (value == null) {
      return nodes.nullNode();
    }
    if (value instanceof Map<?, ?> map) {
      ObjectNode object = nodes.objectNode();
      map.forEach((key, held) -> object.set((String) key, write(held)));
      return object;
    }
    if (value instanceof List<?> list) {
      return nodes.arrayNode().addAll(list.stream().map(FreeJson::write).toList());
    }
    if (value instanceof String text) {
      return nodes.textNode(text);
    }
    if (value instanceof Boolean flag) {
      return nodes.booleanNode(flag);
    }
    if (value instanceof Number number) {
      return number(number);
    }
    throw new IllegalArgumentException("JSON has no form for " + value.getClass().getName());
  }

  private static JsonNode number(Number number) {
    if (number instanceof BigInteger whole) {
      return BigIntegerNode.valueOf(whole);
    }
    if (number instanceof BigDecimal exact) {
      return DecimalNode.valueOf(exact);
    }
    if (number instanceof Double || number instanceof Float) {
      return DoubleNode.valueOf(number.doubleValue());
    }
    return JsonNodeFactory.instance.numberNode(number.longValue());
  }
}
