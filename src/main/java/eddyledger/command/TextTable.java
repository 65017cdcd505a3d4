package eddyledger.command;

import java.util.ArrayList;
import java.util.List;

/** An aligned table of text: first columns left, numbers right. */
final class TextTable {
  private final List<String[]> rows = new ArrayList<>();
  private final boolean[] right;

  /**
   * A table.
   *
   * @param alignment one letter a column: l left, r right
   */
  TextTable(String alignment) {
    right = new boolean[alignment.length()];
    for (int i = 0; i < right.length; i++) {
      right[i] = alignment.charAt(i) == 'r';
    }
  }

  /** Adds a row with a cell for each column. */
  TextTable row(String... cells) {
    if (cells.length != right.length) {
      throw new IllegalArgumentException(
          "a row has " + right.length + " cells, not " + cells.length);
    }
    rows.add(cells.clone());
    return this;
  }

  /** The lines, without blanks at their ends. */
  List<String> lines() {
    int[] widths = new int[right.length];
    for (String[] row : rows) {
      for (int i = 0; i < widths.length; i++) {
        widths[i] = Math.max(widths[i], length(row[i]));
      }
    }
    return rows.stream().map(row -> line(row, widths)).toList();
  }

  private String line(String[] row, int[] widths) {
    StringBuilder line = new StringBuilder();
    for (int i = 0; i < row.length; i++) {
      String blanks = " ".repeat(widths[i] - length(row[i]));
      line.append(i == 0 ? "" : "  ");
      line.append(right[i] ? blanks + row[i] : row[i] + blanks);
    }
    return line.toString().stripTrailing();
  }

  private static int length(String text) {
    return text.codePointCount(0, text.length());
  }
}
