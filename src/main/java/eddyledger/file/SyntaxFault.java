package eddyledger.file;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.io.JsonEOFException;
import java.util.Locale;

/**
 * Says in plain sentences, with line and column, why a text is no JSON. The parser's own words are
 * looked at only where it has no other way to tell two causes apart, and never shown.
 */
final class SyntaxFault {
  private static final int SHOWN = 30;

  private final String text;
  private final String name;
  private final Faults faults;
  private JsonLocation end;

  SyntaxFault(String text, String name, Faults faults) {
    this.text = text;
    this.name = name;
    this.faults = faults;
  }

  /** Notes that the root object was read to its end. */
  void rootRead(JsonLocation location) {
    end = location;
  }

  /** Something follows the root object. */
  void trailing() {
    tell(
        "trailing-text",
        end,
        "Something follows after the end of the project" + shown(end) + ".",
        "Take away what follows the last brace.");
  }

  /** The text breaks the rules of JSON or passes a limit. */
  void tell(JsonProcessingException broken, JsonLocation reached) {
    String words = String.valueOf(broken.getOriginalMessage()).toLowerCase(Locale.ROOT);
    JsonLocation location = broken.getLocation() == null ? reached : broken.getLocation();
    if (end != null) {
      trailing();
    } else if (broken instanceof StreamConstraintsException) {
      limit(words, location);
    } else if (broken instanceof JsonEOFException) {
      tell(
          "cut-off",
          location,
          "The file ends before its last brace; it was cut off.",
          "Take it from a copy, or complete it.");
    } else if (words.startsWith("duplicate")) {
      tell(
          "duplicate-property",
          location,
          "The same property stands twice in one object, the second time just before"
              + " this place.",
          "Take one of the two away.");
    } else {
      tell(
          "not-json",
          location,
          "The text breaks the rules of JSON here" + shown(location) + ".",
          "Correct it: commas between entries, texts and keys in quotes, numbers with a point.");
    }
  }

  private void limit(String words, JsonLocation location) {
    if (words.contains("nesting")) {
      tell(
          "nested-too-deep",
          location,
          "Objects or lists stand too deep within one another.",
          "Take away levels: no vehicle needs so many sections within one another.");
    } else if (words.contains("token count")) {
      tell("too-large", location, "The file holds too many values.", "Check whether it is right.");
    } else {
      tell(
          "too-long",
          location,
          "A text, key or number here is too long" + shown(location) + ".",
          "Shorten it.");
    }
  }

  private void tell(String code, JsonLocation location, String what, String remedy) {
    String place = "line " + location.getLineNr() + ", column " + location.getColumnNr();
    faults.file(code, name, place, what, remedy);
  }

  private String shown(JsonLocation location) {
    int from = (int) Math.max(0, Math.min(location.getCharOffset(), text.length()));
    String rest = text.substring(from, Math.min(text.length(), from + SHOWN)).strip();
    int lineEnd = rest.indexOf('\n');
    String line = lineEnd < 0 ? rest : rest.substring(0, lineEnd).strip();
    return line.isEmpty() ? "" : ": " + line;
  }
}
