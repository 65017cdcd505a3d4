package eddyledger.physics;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.stream.StreamSupport;

/** Reads the reference data under {@code src/test/resources/reference}. */
public final class ReferenceFile {
  private ReferenceFile() {}

  /** A JSON file, for instance {@code flow/completion.json}. */
  public static JsonNode json(String name) {
    try (InputStream stream = open(name)) {
      return new ObjectMapper().readTree(stream);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The rows of numbers of a CSV file with one line of source and one of column names. */
  public static List<double[]> csv(String name) {
    try (InputStream stream = open(name)) {
      String text = new String(stream.readAllBytes(), StandardCharsets.UTF_8);
      return text.lines()
          .skip(2)
          .map(line -> Arrays.stream(line.split(",")).mapToDouble(Double::parseDouble).toArray())
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** The elements of a JSON array as a list. */
  public static List<JsonNode> list(JsonNode array) {
    return StreamSupport.stream(array.spliterator(), false).toList();
  }

  private static InputStream open(String name) {
    InputStream stream = ReferenceFile.class.getResourceAsStream("/reference/" + name);
    if (stream == null) {
      throw new IllegalArgumentException("no reference file " + name);
    }
    return stream;
  }
}
