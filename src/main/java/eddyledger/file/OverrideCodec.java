package eddyledger.file;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.NullNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.ByCondition;
import eddyledger.model.Extras;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/**
 * A value with its overrides per condition: the value's own object with one key more.
 *
 * @param <T> the value
 */
final class OverrideCodec<T> {
  /** The key of the overrides. */
  static final String KEY = "by_condition";

  private final ValueCodec<T> codec;

  OverrideCodec(ValueCodec<T> codec) {
    this.codec = codec;
  }

  /**
   * Reads it. The holder keeps what no value can: overrides that cannot be read, and unknown keys
   * beside overrides without a base.
   */
  ByCondition<T> read(JsonValue value, JsonObject holder, String key) {
    if (!value.isObject()) {
      return ByCondition.always(codec.read(value));
    }
    JsonObject object = value.object();
    Map<String, T> overrides = overrides(object.value(KEY));
    Map<String, Object> kept = new LinkedHashMap<>();
    Extras unread = object.value(KEY).object().extras();
    if (!unread.properties().isEmpty()) {
      kept.put(KEY, unread.properties());
    }
    T base = null;
    if (object.value(KEY).absent() || object.hasAny(codec.keys())) {
      base = codec.read(value);
    } else {
      codec.keys().forEach(object::value);
      kept.putAll(object.extras().properties());
    }
    holder.keep(key, new Extras(kept));
    return new ByCondition<>(base, overrides);
  }

  private Map<String, T> overrides(JsonValue value) {
    Map<String, T> overrides = new LinkedHashMap<>();
    JsonObject object = value.object();
    for (String condition : object.keys()) {
      JsonValue override = object.value(condition);
      if (override.absent()) {
        override.missing();
      }
      overrides.put(condition, codec.read(override));
    }
    return overrides;
  }

  /** Writes it, as short as it can be. */
  JsonNode write(ByCondition<T> value) {
    if (value.overrides().isEmpty() && value.base() != null) {
      return codec.brief(codec.write(value.base()));
    }
    ObjectNode overrides = JsonNodeFactory.instance.objectNode();
    value
        .overrides()
        .forEach(
            (condition, held) -> {
              JsonNode written = codec.brief(codec.write(held));
              boolean nothing = written.isMissingNode();
              overrides.set(condition, nothing ? NullNode.getInstance() : written);
            });
    ObjectNode full = JsonNodeFactory.instance.objectNode();
    if (value.base() == null) {
      return full.set(KEY, overrides);
    }
    // unknown properties come after all that are known
    Map<Boolean, List<Map.Entry<String, JsonNode>>> known =
        codec.write(value.base()).properties().stream()
            .collect(Collectors.partitioningBy(entry -> codec.keys().contains(entry.getKey())));
    known.get(true).forEach(entry -> full.set(entry.getKey(), entry.getValue()));
    full.set(KEY, overrides);
    known.get(false).forEach(entry -> full.set(entry.getKey(), entry.getValue()));
    return full;
  }
}
