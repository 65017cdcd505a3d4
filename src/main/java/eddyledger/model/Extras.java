package eddyledger.model;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/**
 * Properties of a file object that this version of the program does not know, kept to be written
 * back unchanged.
 *
 * @param properties name to value, in the order of the file; values are maps, lists, strings,
 *     numbers, truth values or null
 */
public record Extras(Map<String, Object> properties) {
  /** No unknown properties. */
  public static final Extras NONE = new Extras(Map.of());

  public Extras {
    properties = Collections.unmodifiableMap(new LinkedHashMap<>(properties));
  }
}
