package eddyledger.file;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.cfg.JsonNodeFeature;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/** Turns the bytes of a file into its root object, or tells in plain sentences why it has none. */
final class JsonParsing {
  private static final String BYTE_ORDER_MARK = "\uFEFF";

  private final JsonMapper mapper;
  private final String name;
  private final Faults faults;

  JsonParsing(Limits limits, String name, Faults faults) {
    JsonFactory factory =
        JsonFactory.builder()
            .streamReadConstraints(limits.constraints())
            .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
            .disable(JsonFactory.Feature.CANONICALIZE_FIELD_NAMES)
            .disable(JsonFactory.Feature.INTERN_FIELD_NAMES)
            .build();
    mapper =
        JsonMapper.builder(factory)
            .enable(DeserializationFeature.USE_BIG_DECIMAL_FOR_FLOATS)
            .disable(JsonNodeFeature.STRIP_TRAILING_BIGDECIMAL_ZEROES)
            .build();
    this.name = name;
    this.faults = faults;
  }

  Optional<ObjectNode> parse(byte[] bytes) {
    return decode(bytes).flatMap(this::root);
  }

  private Optional<String> decode(byte[] bytes) {
    try {
      String text = StandardCharsets.UTF_8.newDecoder().decode(ByteBuffer.wrap(bytes)).toString();
      if (text.indexOf('\0') < 0) {
        // some editors put a byte order mark before the text
        return Optional.of(text.startsWith(BYTE_ORDER_MARK) ? text.substring(1) : text);
      }
    } catch (CharacterCodingException notUtf8) {
      // told below, together with text that no text file holds
    }
    return refuse(
        "not-text",
        "The file is no text in UTF-8.",
        "Check whether it is the right file; if it is text, save it as UTF-8.");
  }

  private Optional<ObjectNode> root(String text) {
    if (text.isBlank()) {
      return refuse("empty-file", "The file is empty.", "Take it from a copy.");
    }
    try (JsonParser parser = mapper.createParser(text)) {
      return root(parser, new SyntaxFault(text, name, faults));
    } catch (IOException fromText) {
      throw new UncheckedIOException("a text in memory cannot fail to be read", fromText);
    }
  }

  private Optional<ObjectNode> root(JsonParser parser, SyntaxFault fault) throws IOException {
    try {
      JsonNode node = mapper.readTree(parser);
      if (!(node instanceof ObjectNode root)) {
        return refuse(
            "no-object",
            "The file holds no JSON object, so it is not an Eddyledger project.",
            "Check whether it is the right file.");
      }
      fault.rootRead(parser.currentLocation());
      if (parser.nextToken() == null) {
        return Optional.of(root);
      }
      fault.trailing();
    } catch (JsonProcessingException broken) {
      fault.tell(broken, parser.currentLocation());
    }
    return Optional.empty();
  }

  private <T> Optional<T> refuse(String code, String what, String remedy) {
    faults.file(code, name, "", what, remedy);
    return Optional.empty();
  }
}
