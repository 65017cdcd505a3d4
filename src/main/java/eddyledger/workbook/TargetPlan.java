package eddyledger.workbook;

import eddyledger.ledger.TargetResult;
import eddyledger.model.Rating;
import eddyledger.model.Target;
import eddyledger.workbook.Block.Pair;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * Where the targets stand: a row for each receiver, and one for what counts where there are several
 * receivers.
 *
 * @param lines the targets in the order of the file
 * @param overalls the rows of the overall targets of a receiver in a condition
 */
record TargetPlan(List<TargetLine> lines, Map<Pair, List<Integer>> overalls) {

  /**
   * One target.
   *
   * @param target the target
   * @param result how the levels stand; null if it is not judged because it has an error
   * @param blocks the ledgers of its receivers; empty if it is not judged
   * @param first its first row
   */
  record TargetLine(Target target, TargetResult result, List<Block> blocks, int first) {
    /** How many rows it takes. */
    int rows() {
      return blocks.size() > 1 ? blocks.size() + 1 : 1;
    }
  }

  static TargetPlan of(WorkbookContent content, List<Block> blocks, int firstRow) {
    Map<Pair, Block> byPair = new HashMap<>();
    blocks.forEach(block -> byPair.put(block.pair(), block));
    List<TargetLine> lines = new ArrayList<>();
    Map<Pair, List<Integer>> overalls = new HashMap<>();
    int row = firstRow;
    for (Target target : content.vehicle().targets()) {
      TargetResult result = result(content, target);
      List<Block> at = new ArrayList<>();
      if (result != null) {
        for (String receiver : target.receivers()) {
          Pair pair = new Pair(target.condition(), receiver);
          if (target.rating() == Rating.OVERALL_A) {
            overalls.computeIfAbsent(pair, key -> new ArrayList<>()).add(row + at.size());
          }
          at.add(byPair.get(pair));
        }
      }
      TargetLine line = new TargetLine(target, result, at, row);
      lines.add(line);
      row += line.rows();
    }
    return new TargetPlan(lines, overalls);
  }

  private static TargetResult result(WorkbookContent content, Target target) {
    return content.targets().stream()
        .filter(result -> result.target().equals(target))
        .findFirst()
        .orElse(null);
  }

  /**
   * The cell of the overall target that a total is held against, as a formula. Of several it is the
   * one with the least margin, whatever their values are changed to.
   *
   * @return empty if there is none
   */
  Optional<String> overall(Pair pair, int column) {
    List<Integer> rows = overalls.getOrDefault(pair, List.of());
    if (rows.size() < 2) {
      return rows.stream().findFirst().map(row -> TargetTable.outside(column, row));
    }
    String keys =
        rows.stream()
            .map(row -> TargetTable.outside(TargetTable.KEY, row))
            .collect(Collectors.joining(",", "MIN(", ")"));
    return Optional.of(
        "INDEX(" + all(column) + ",MATCH(" + keys + "," + all(TargetTable.KEY) + ",0))");
  }

  private String all(int column) {
    int first = lines.get(0).first();
    return TargetTable.outside(column, first) + ":" + Columns.fixed(column, first + rows() - 1);
  }

  /** How many rows they take. */
  int rows() {
    return lines.stream().mapToInt(TargetLine::rows).sum();
  }
}
