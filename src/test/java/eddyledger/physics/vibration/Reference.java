package eddyledger.physics.vibration;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** Reads reference values from the test resources. */
final class Reference {
  private Reference() {}

  static JsonNode read(String name) {
    try (InputStream in = Reference.class.getResourceAsStream("/reference/" + name)) {
      return new ObjectMapper().readTree(in);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  static double[] numbers(JsonNode array) {
    double[] numbers = new double[array.size()];
    for (int i = 0; i < numbers.length; i++) {
      numbers[i] = array.get(i).asDouble();
    }
    return numbers;
  }
}
