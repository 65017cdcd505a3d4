package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;

/**
 * How a record stands in the file as an object.
 *
 * @param <T> the record
 */
interface RecordCodec<T> {
  /** Reads it; what is wrong is told, and the record is made all the same. */
  T read(JsonObject object);

  /** Writes it. */
  ObjectNode write(T record);
}
