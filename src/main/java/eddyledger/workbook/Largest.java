package eddyledger.workbook;

import eddyledger.ledger.RowKind;
import eddyledger.ledger.Way;
import java.util.Comparator;
import java.util.List;

/** The largest contributions of a block, A-weighted; equal ones in the order of the tree. */
final class Largest {
  /** How many are shown. */
  static final int SHOWN = 5;

  /** So much less counts each further line, so that no two tie, dB. */
  private static final double TIE = 1.0e-9;

  private Largest() {}

  /** Whether a line is a contribution of its own: a panel with all its ways, or another source. */
  static boolean ranked(LedgerLine line) {
    RowKind kind = line.row().kind();
    return line.row().way() == Way.ALL && (kind == RowKind.PANEL || kind == RowKind.OTHER);
  }

  /** The level by which a line is put in order, dB(A). */
  static double key(LedgerLine line) {
    return line.row().levelA() - line.number() * TIE;
  }

  /** The largest first; fewer than {@link #SHOWN} if there are no more with a level. */
  static List<LedgerLine> of(Block block) {
    return block.lines().stream()
        .filter(Largest::ranked)
        .filter(line -> Answer.level(line.row().levelA()).isNumber())
        .sorted(Comparator.comparingDouble(Largest::key).reversed())
        .limit(SHOWN)
        .toList();
  }
}
