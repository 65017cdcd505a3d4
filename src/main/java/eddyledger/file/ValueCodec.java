package eddyledger.file;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Set;

/**
 * How a value stands in the file that may change with the condition and may have a short form.
 *
 * @param <T> the value
 */
interface ValueCodec<T> {
  /** The keys of its object; one of them must be there for the object to hold a base value. */
  Set<String> keys();

  /** Reads it in its short or its full form; never null. */
  T read(JsonValue value);

  /** Writes its full form. */
  ObjectNode write(T value);

  /** The short form of a full one, or the full one where there is none shorter. */
  default JsonNode brief(ObjectNode full) {
    return full;
  }
}
