package eddyledger.workbook;

import eddyledger.ledger.LedgerRow;
import eddyledger.ledger.ReceiverSheet;
import eddyledger.ledger.RowKind;
import eddyledger.model.OtherSource;
import eddyledger.workbook.Block.Pair;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Where everything will stand, known before the first cell is written. */
final class BookPlan {
  private final List<Block> blocks;
  private final Map<String, Integer> others;
  private final Map<String, LedgerLine> otherLines;
  private final TargetPlan targets;
  private final SummaryPlan summary;

  private BookPlan(
      List<Block> blocks,
      Map<String, Integer> others,
      Map<String, LedgerLine> otherLines,
      WorkbookContent content) {
    this.blocks = List.copyOf(blocks);
    this.others = others;
    this.otherLines = otherLines;
    summary = SummaryPlan.of(blocks.size());
    targets = TargetPlan.of(content, blocks, summary.firstTarget());
  }

  /** Plans the workbook of some content. */
  static BookPlan of(WorkbookContent content) {
    List<Block> blocks = new ArrayList<>();
    Map<String, LedgerLine> otherLines = new HashMap<>();
    int row = LedgerColumns.FIRST_ROW;
    for (ReceiverSheet sheet : content.sheets()) {
      Block block = BlockPlan.of(sheet, row);
      blocks.add(block);
      row = block.end() + 1;
      for (LedgerLine line : block.lines()) {
        if (line.row().kind() == RowKind.OTHER) {
          otherLines.put(line.row().id(), line);
        }
      }
    }
    Map<String, Integer> others = new LinkedHashMap<>();
    int at = OthersPage.FIRST_ROW;
    for (OtherSource source : content.vehicle().otherSources()) {
      others.put(source.id(), at);
      at += OthersPage.rows(source);
    }
    return new BookPlan(blocks, others, otherLines, content);
  }

  List<Block> blocks() {
    return blocks;
  }

  TargetPlan targets() {
    return targets;
  }

  SummaryPlan summary() {
    return summary;
  }

  /** Last row of the ledger sheet. */
  int lastLedgerRow() {
    return blocks.isEmpty() ? LedgerColumns.HEADER_ROW : blocks.get(blocks.size() - 1).end();
  }

  /** Row of an other source on its sheet. */
  int othersRow(String id) {
    return others.get(id);
  }

  /** The cell where the level of an other source is entered. */
  String source(String id, int band) {
    return OthersPage.QUOTED + Columns.fixed(OthersPage.BAND + band, othersRow(id));
  }

  /** The ledger's line of an other source; null if no sheet has it. */
  LedgerLine otherLine(String id) {
    return otherLines.get(id);
  }

  /** The ledger's total of a pair; null if there is none. */
  LedgerRow total(Pair pair) {
    return block(pair) == null ? null : block(pair).total().row();
  }

  /** The block of a pair; null if there is none. */
  Block block(Pair pair) {
    return blocks.stream().filter(block -> block.pair().equals(pair)).findFirst().orElse(null);
  }
}
