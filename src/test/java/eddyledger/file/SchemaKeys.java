package eddyledger.file;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Set;

/** Goes through a file beside its schema and notes which keys the schema describes. */
final class SchemaKeys {
  private static final List<String> TOGETHER =
      List.of("allOf", "anyOf", "oneOf", "if", "then", "else");

  private final JsonNode root;
  private final Set<JsonNode> met = Collections.newSetFromMap(new IdentityHashMap<>());
  private final List<String> undescribed = new ArrayList<>();

  SchemaKeys(JsonNode root) {
    this.root = root;
  }

  /**
   * Places of the file whose key the schema does not describe; keys that begin with x- excepted.
   */
  List<String> undescribedIn(JsonNode file) {
    undescribed.clear();
    follow(file, List.of(root), "");
    return undescribed;
  }

  private void follow(JsonNode node, List<JsonNode> schemas, String place) {
    List<JsonNode> all = new ArrayList<>();
    schemas.forEach(schema -> expand(schema, all));
    if (node.isArray()) {
      List<JsonNode> items = children(all, "items");
      for (int i = 0; i < node.size(); i++) {
        follow(node.get(i), items, place + "[" + i + "]");
      }
    }
    node.properties().stream()
        .filter(entry -> !entry.getKey().startsWith("x-"))
        .forEach(
            entry -> {
              String at = place + "." + entry.getKey();
              List<JsonNode> described = described(all, entry.getKey());
              if (described.isEmpty()) {
                undescribed.add(at);
              }
              follow(entry.getValue(), described, at);
            });
  }

  private List<JsonNode> described(List<JsonNode> schemas, String key) {
    List<JsonNode> described = new ArrayList<>();
    for (JsonNode schema : schemas) {
      JsonNode property = schema.path("properties").get(key);
      if (property != null) {
        described.add(property);
        met.add(property);
      }
    }
    if (described.isEmpty()) {
      described.addAll(children(schemas, "additionalProperties"));
    }
    return described;
  }

  private static List<JsonNode> children(List<JsonNode> schemas, String keyword) {
    return schemas.stream().map(it -> it.get(keyword)).filter(it -> it != null).toList();
  }

  private void expand(JsonNode schema, List<JsonNode> into) {
    into.add(schema);
    if (schema.has("$ref")) {
      expand(root.at(schema.get("$ref").textValue().substring(1)), into);
    }
    for (String keyword : TOGETHER) {
      JsonNode parts = schema.get(keyword);
      if (parts != null && parts.isArray()) {
        parts.forEach(part -> expand(part, into));
      } else if (parts != null) {
        expand(parts, into);
      }
    }
  }

  /** Keys that the schema describes with words, and no file gone through so far has. */
  List<String> neverMet() {
    List<String> never = new ArrayList<>();
    collect(root, "", never);
    return never;
  }

  private void collect(JsonNode schema, String place, List<String> never) {
    schema
        .path("properties")
        .properties()
        .forEach(
            entry -> {
              if (!met.contains(entry.getValue()) && entry.getValue().isObject()) {
                never.add(place + "." + entry.getKey());
              }
            });
    schema
        .properties()
        .forEach(entry -> collect(entry.getValue(), place + "/" + entry.getKey(), never));
    if (schema.isArray()) {
      schema.forEach(part -> collect(part, place, never));
    }
  }
}
