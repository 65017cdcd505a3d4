package eddyledger.model;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.function.UnaryOperator;

/**
 * A value that may be another one in some operating conditions.
 *
 * @param <T> what the value is
 * @param base the value where no override holds; null if there are overrides only
 * @param overrides condition id to value, in the order of the file
 */
public record ByCondition<T>(T base, Map<String, T> overrides) {
  public ByCondition {
    overrides = Collections.unmodifiableMap(new LinkedHashMap<>(overrides));
  }

  /** The same value in every condition. */
  public static <T> ByCondition<T> always(T value) {
    return new ByCondition<>(value, Map.of());
  }

  /** The value in a condition; null if neither an override nor a base holds there. */
  public T in(String conditionId) {
    T override = overrides.get(conditionId);
    return override == null ? base : override;
  }

  /** Whether the condition has a value of its own. */
  public boolean overriddenIn(String conditionId) {
    return overrides.containsKey(conditionId);
  }

  /** The same conditions with every value changed by the function. */
  public ByCondition<T> map(UnaryOperator<T> function) {
    Map<String, T> mapped = new LinkedHashMap<>();
    overrides.forEach((condition, value) -> mapped.put(condition, function.apply(value)));
    return new ByCondition<>(base == null ? null : function.apply(base), mapped);
  }
}
