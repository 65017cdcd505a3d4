package eddyledger.window;

import eddyledger.chart.StackPart;
import eddyledger.chart.StackParts;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.present.LedgerLine;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** The marks in the gutter: the ledger is the legend of the picture. */
final class Gutter {
  private ReceiverSheet sheet;
  private String selected;
  private List<LedgerLine> lines;
  private List<GutterMark> marks = List.of();

  /**
   * One mark for each line; null where a line is in no part, or in several. Marks are kept while
   * sheet and lines stay the same objects.
   */
  List<GutterMark> marks(Optional<ReceiverSheet> of, String selectedId, List<LedgerLine> visible) {
    boolean same = of.orElse(null) == sheet && selectedId.equals(selected) && visible == lines;
    if (!same) {
      sheet = of.orElse(null);
      selected = selectedId;
      lines = visible;
      marks = made(of, selectedId, visible);
    }
    return marks;
  }

  private static List<GutterMark> made(
      Optional<ReceiverSheet> sheet, String selectedId, List<LedgerLine> lines) {
    Map<String, StackPart> parts = new HashMap<>();
    sheet.ifPresent(
        it -> {
          for (StackPart part : StackParts.of(it, selectedId).parts()) {
            part.rowIds().forEach(id -> parts.put(id, part));
          }
        });
    List<GutterMark> marks = new ArrayList<>();
    StackPart above = null;
    for (int i = 0; i < lines.size(); i++) {
      StackPart part = parts.get(lines.get(i).id());
      StackPart below = i + 1 < lines.size() ? parts.get(lines.get(i + 1).id()) : null;
      marks.add(part == null ? null : new GutterMark(part.fill(), part == above, part == below));
      above = part;
    }
    return marks;
  }
}
