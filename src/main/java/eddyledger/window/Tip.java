package eddyledger.window;

import java.util.List;
import java.util.stream.Collectors;

/** Tooltips of one or several lines. */
final class Tip {
  private static final int WIDE = 90;

  private Tip() {}

  /** Lines under each other; null, which shows nothing, if there is no text. */
  static String of(List<String> lines) {
    List<String> told = lines.stream().filter(line -> !line.isBlank()).toList();
    if (told.isEmpty()) {
      return null;
    }
    if (told.size() == 1 && told.get(0).length() < WIDE) {
      return told.get(0);
    }
    return told.stream().map(Tip::wrapped).collect(Collectors.joining("<br>", "<html>", "</html>"));
  }

  private static String wrapped(String line) {
    StringBuilder text = new StringBuilder();
    int length = 0;
    for (String word : line.split(" ")) {
      if (length > 0 && length + word.length() > WIDE) {
        text.append("<br>&nbsp;&nbsp;");
        length = 0;
      } else if (length > 0) {
        text.append(' ');
      }
      text.append(escaped(word));
      length += word.length() + 1;
    }
    return text.toString();
  }

  private static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;");
  }
}
