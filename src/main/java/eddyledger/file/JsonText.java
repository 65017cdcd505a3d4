package eddyledger.file;

import com.fasterxml.jackson.core.io.JsonStringEncoder;
import com.fasterxml.jackson.core.io.NumberOutput;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Iterator;
import java.util.Map;

/**
 * JSON as text that people can read: two spaces a level, line feeds, and whatever holds only plain
 * values on one line, always if it is a list, and if it is short if it is an object. Numbers have
 * the fewest digits that give the same number back, on every Java.
 */
final class JsonText {
  private static final String INDENT = "  ";
  private static final int SHORT = 72;

  private final StringBuilder out = new StringBuilder();

  private JsonText() {}

  /** The text of an object, with a line feed at the end. */
  static String of(ObjectNode root) {
    JsonText text = new JsonText();
    text.write(root, "\n");
    return text.out.append('\n').toString();
  }

  private void write(JsonNode node, String line) {
    if (!node.isContainerNode()) {
      scalar(node);
      return;
    }
    int begin = out.length();
    boolean plain = plain(node);
    if (plain) {
      members(node, " ");
    }
    if (!plain || node.isObject() && out.length() - begin > SHORT) {
      out.setLength(begin);
      members(node, line + INDENT);
      // the closing bracket stands below the opening line
      out.insert(out.length() - 1, node.isEmpty() ? "" : line);
    }
  }

  private static boolean plain(JsonNode node) {
    for (JsonNode member : node) {
      if (member.isContainerNode()) {
        return false;
      }
    }
    return true;
  }

  private void members(JsonNode node, String separator) {
    String gap = separator.equals(" ") ? "" : separator;
    out.append(node.isObject() ? '{' : '[');
    Iterator<Map.Entry<String, JsonNode>> entries = node.properties().iterator();
    Iterator<JsonNode> items = node.iterator();
    boolean first = true;
    while (items.hasNext()) {
      JsonNode item = items.next();
      out.append(first ? gap : "," + separator);
      first = false;
      if (node.isObject()) {
        text(entries.next().getKey());
        out.append(": ");
      }
      write(item, separator);
    }
    out.append(node.isObject() ? '}' : ']');
  }

  private void scalar(JsonNode node) {
    if (node.isTextual()) {
      text(node.textValue());
    } else if (node.isDouble()) {
      double number = node.doubleValue();
      out.append(Double.isFinite(number) ? NumberOutput.toString(number, true) : "null");
    } else {
      out.append(node.asText());
    }
  }

  private void text(String text) {
    out.append('"');
    StringBuilder quoted = new StringBuilder();
    JsonStringEncoder.getInstance().quoteAsString(text, quoted);
    for (int i = 0; i < quoted.length(); i++) {
      char c = quoted.charAt(i);
      if (loneSurrogate(quoted, i)) {
        // half a character has no form in UTF-8
        out.append(String.format("\\u%04X", (int) c));
      } else {
        out.append(c);
      }
    }
    out.append('"');
  }

  private static boolean loneSurrogate(StringBuilder text, int at) {
    char c = text.charAt(at);
    if (Character.isHighSurrogate(c)) {
      return at + 1 == text.length() || !Character.isLowSurrogate(text.charAt(at + 1));
    }
    return Character.isLowSurrogate(c)
        && (at == 0 || !Character.isHighSurrogate(text.charAt(at - 1)));
  }
}
