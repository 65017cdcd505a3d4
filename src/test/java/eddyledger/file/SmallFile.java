package eddyledger.file;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.check.Finding;
import eddyledger.model.Vehicle;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;

/** A small project file without faults, in which a test changes what it looks at. */
public final class SmallFile {
  /** Numbers are passed on as they are written, however large. */
  private static final JsonMapper MAPPER =
      JsonMapper.builder().enable(DeserializationFeature.USE_BIG_DECIMAL_FOR_FLOATS).build();

  private final ObjectNode root = (ObjectNode) parse(text());

  /** The file as it stands, without faults. */
  public static String text() {
    try (InputStream in = SmallFile.class.getResourceAsStream("/file/small.eddyledger")) {
      return new String(Objects.requireNonNull(in).readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException missing) {
      throw new AssertionError(missing);
    }
  }

  /** Sets the value at a place such as {@code zones[0].volume_m3} to a piece of JSON. */
  public SmallFile with(String place, String json) {
    JsonNode holder = holder(place);
    String last = last(place);
    if (holder instanceof ArrayNode list) {
      int position = Integer.parseInt(last);
      if (position == list.size()) {
        list.add(parse(json));
      } else {
        list.set(position, parse(json));
      }
    } else {
      ((ObjectNode) holder).set(last, parse(json));
    }
    return this;
  }

  /** Takes the property at a place away. */
  public SmallFile without(String place) {
    assertThat(((ObjectNode) holder(place)).remove(last(place))).as(place).isNotNull();
    return this;
  }

  private JsonNode holder(String place) {
    String[] steps = place.replace("]", "").split("[.\\[]");
    JsonNode node = root;
    for (int i = 0; i < steps.length - 1; i++) {
      node = node.isArray() ? node.get(Integer.parseInt(steps[i])) : node.get(steps[i]);
      assertThat(node).as(steps[i] + " of " + place).isNotNull();
    }
    return node;
  }

  private static String last(String place) {
    String[] steps = place.replace("]", "").split("[.\\[]");
    return steps[steps.length - 1];
  }

  /** Reads the changed file. */
  public ReadResult read() {
    return new ProjectReader().read(root.toString(), "small.eddyledger");
  }

  /** The vehicle of the changed file. */
  public Vehicle vehicle() {
    return read().vehicle().orElseThrow();
  }

  /** The one finding of the changed file. */
  public Finding onlyFinding() {
    List<Finding> findings = read().findings();
    assertThat(findings).hasSize(1);
    return findings.get(0);
  }

  /** The changed file as a tree. */
  public ObjectNode root() {
    return root;
  }

  public static JsonNode parse(String json) {
    try {
      return MAPPER.readTree(json);
    } catch (JsonProcessingException broken) {
      throw new AssertionError(json, broken);
    }
  }
}
