package eddyledger.workbook;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.ledger.Status;
import eddyledger.ledger.Way;
import eddyledger.workbook.LedgerLine.Part;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Plans the rows of one receiver and condition: which row is summed into which. A panel whose sound
 * comes in one way stands in one row; one with several ways in a row for each and their sum.
 */
final class BlockPlan {
  private final ReceiverSheet sheet;
  private final int first;
  private final List<Draft> drafts = new ArrayList<>();
  private final Map<String, Draft> wholes = new HashMap<>();
  private final Set<String> silent = new HashSet<>();

  /** A row while it is being planned. */
  private static final class Draft {
    private final LedgerRow row;
    private final Part part;
    private final Way way;
    private final int depth;
    private int last;
    private int into;
    private int intoWay;
    private int contributions;
    private int lacking;
    private int below;

    private Draft(LedgerRow row, Part part, Way way, int depth) {
      this.row = row;
      this.part = part;
      this.way = way;
      this.depth = depth;
    }
  }

  private BlockPlan(ReceiverSheet sheet, int first) {
    this.sheet = sheet;
    this.first = first;
  }

  /** The rows from a row of the sheet on. */
  static Block of(ReceiverSheet sheet, int title) {
    BlockPlan plan = new BlockPlan(sheet, title + Block.HEADING_ROWS);
    plan.findSilent();
    plan.draft();
    plan.link();
    plan.count();
    List<LedgerLine> lines = new ArrayList<>();
    for (int i = 0; i < plan.drafts.size(); i++) {
      lines.add(plan.line(i));
    }
    return new Block(sheet, title, lines);
  }

  /** Sections below which there is no panel, however deep. */
  private void findSilent() {
    Set<String> filled = new HashSet<>();
    List<LedgerRow> rows = sheet.rows();
    for (int i = rows.size() - 1; i >= 0; i--) {
      LedgerRow row = rows.get(i);
      boolean section = row.kind() == RowKind.SECTION || row.kind() == RowKind.TOTAL;
      if (!section || filled.contains(row.id())) {
        filled.add(row.parent());
      } else {
        silent.add(row.id());
      }
    }
  }

  private void draft() {
    List<LedgerRow> rows = sheet.rows();
    int i = 0;
    while (i < rows.size()) {
      LedgerRow whole = rows.get(i);
      int end = i + 1;
      while (end < rows.size() && rows.get(end).way() != Way.ALL) {
        end++;
      }
      node(whole, rows.subList(i + 1, end));
      i = end;
    }
  }

  private void node(LedgerRow whole, List<LedgerRow> ways) {
    boolean several = ways.size() > 1;
    Way way = ways.size() == 1 ? ways.get(0).way() : Way.ALL;
    wholes.put(whole.id(), add(whole, part(whole, several), way, whole.depth()));
    if (several && !silent.contains(whole.id())) {
      Part part = whole.kind() == RowKind.PANEL ? Part.ENTERED : Part.SUM_OF_WAY;
      ways.forEach(row -> add(row, part, row.way(), whole.depth() + 1));
    }
  }

  private Part part(LedgerRow whole, boolean several) {
    return switch (whole.kind()) {
      case OTHER -> Part.LINKED;
      case PANEL -> several ? Part.SUM : Part.ENTERED;
      case SECTION, TOTAL -> silent.contains(whole.id()) ? Part.SILENT : Part.SUM;
    };
  }

  private Draft add(LedgerRow row, Part part, Way way, int depth) {
    Draft draft = new Draft(row, part, way, depth);
    drafts.add(draft);
    return draft;
  }

  private int number(int index) {
    return first + index;
  }

  private void link() {
    Map<String, Integer> sums = new HashMap<>();
    Map<String, Map<Way, Integer>> sumsOfWays = new HashMap<>();
    for (int i = 0; i < drafts.size(); i++) {
      Draft draft = drafts.get(i);
      boolean ofPanel = draft.row.kind() == RowKind.PANEL && draft.row.way() != Way.ALL;
      String parent = draft.row.parent();
      if (draft.part == Part.SUM) {
        sums.put(draft.row.id(), number(i));
      } else if (draft.part == Part.SUM_OF_WAY) {
        sumsOfWays.computeIfAbsent(draft.row.id(), id -> new HashMap<>()).put(draft.way, number(i));
      }
      if (draft.part != Part.SUM_OF_WAY && draft.part != Part.SILENT) {
        draft.into = sums.getOrDefault(ofPanel ? draft.row.id() : parent, 0);
      }
      draft.intoWay = sumsOfWays.getOrDefault(parent, Map.of()).getOrDefault(draft.way, 0);
      draft.last = number(lastBelow(i));
    }
  }

  private int lastBelow(int index) {
    Draft draft = drafts.get(index);
    if (draft.part == Part.SUM_OF_WAY) {
      // what it sums stands below its whole
      return lastBelow(drafts.indexOf(wholes.get(draft.row.id())));
    }
    int last = index;
    while (last + 1 < drafts.size() && drafts.get(last + 1).depth > draft.depth) {
      last++;
    }
    return last;
  }

  private void count() {
    for (int i = drafts.size() - 1; i >= 0; i--) {
      Draft draft = drafts.get(i);
      if (draft.part == Part.ENTERED || draft.part == Part.LINKED) {
        draft.contributions = 1;
        draft.lacking = draft.row.status() == Status.OK ? 0 : 1;
      }
      for (int sum : new int[] {draft.into, draft.intoWay}) {
        if (sum > 0) {
          Draft above = drafts.get(sum - first);
          above.contributions += draft.contributions;
          above.lacking += draft.lacking;
          above.below++;
        }
      }
    }
  }

  private LedgerLine line(int index) {
    Draft draft = drafts.get(index);
    int number = number(index);
    return new LedgerLine(
        number,
        draft.row,
        draft.part,
        draft.way,
        draft.depth,
        draft.last,
        draft.into,
        draft.intoWay,
        draft.contributions,
        draft.lacking,
        draft.below == draft.last - number && draft.part == Part.SUM);
  }
}
