package eddyledger.workbook;

import eddyledger.ledger.Status;
import eddyledger.ledger.TargetResult;
import eddyledger.model.PassRule;
import eddyledger.model.Target;
import eddyledger.workbook.Look.Format;
import eddyledger.workbook.TargetPlan.TargetLine;

/** Writes what counts of a target that names several receivers: the worst one, or their mean. */
final class TargetOverSeats {
  private final Page page;
  private final TargetTable table;
  private final TargetLine planned;
  private final int first;
  private final int last;

  TargetOverSeats(Page page, TargetTable table, TargetLine planned) {
    this.page = page;
    this.table = table;
    this.planned = planned;
    first = planned.first();
    last = first + planned.blocks().size() - 1;
  }

  void write(int row) {
    Target target = planned.target();
    TargetResult result = planned.result();
    Line line = page.line(row);
    boolean mean = target.rule().across() == PassRule.Across.ENERGY_MEAN;
    if (mean) {
      TargetWords.write(line, target, Answer.words("energy mean of them counts"), null);
    } else {
      String which =
          "\"worst of them counts: \"&INDEX("
              + range(TargetWords.RECEIVER)
              + ",MATCH("
              + Columns.cell(TargetTable.LEVEL, row)
              + ","
              + range(TargetTable.LEVEL)
              + ",0))";
      Answer words = Answer.words("worst of them counts: " + result.receiver());
      TargetWords.write(line, target, words, which);
    }
    table.asked(line, target, first);
    line.formula(
        TargetTable.LEVEL,
        mean ? mean() : worst(),
        Answer.level(result.level()),
        Look.of(Format.LEVEL));
    table.judged(line, target, result.level(), result.status() == Status.OK);
    String over = "COUNTIF(" + range(TargetTable.STATE) + ",\"over\")";
    String unknown = "COUNTIF(" + range(TargetTable.STATE) + ",\"not known\")";
    line.formula(
        TargetTable.LACKING,
        mean ? "SUM(" + range(TargetTable.LACKING) + ")" : "IF(" + over + ">0,0," + unknown + ")",
        Answer.number((double) lacking(mean)),
        Look.of(Format.WHOLE));
  }

  private int lacking(boolean mean) {
    if (mean) {
      return planned.blocks().stream().mapToInt(block -> block.total().lacking()).sum();
    }
    return planned.result().missed() ? 0 : table.unknown(planned);
  }

  private String range(int column) {
    return Columns.down(column, first, last);
  }

  private String mean() {
    return "IF("
        + known()
        + ",IF(SUM("
        + range(TargetTable.ENERGY)
        + ")>0,10*LOG10(SUM("
        + range(TargetTable.ENERGY)
        + ")/"
        + (last - first + 1)
        + "),\"none\"),\"n/a\")";
  }

  /** Over is certain whatever is unknown elsewhere; the unknown is worse news than what holds. */
  private String worst() {
    String levels = range(TargetTable.LEVEL);
    String most = "IF(COUNT(" + levels + ")>0,MAX(" + levels + "),\"none\")";
    String unknown = range(TargetTable.UNKNOWN);
    return "IF(COUNTIF("
        + range(TargetTable.STATE)
        + ",\"over\")>0,"
        + most
        + ",IF(COUNTIF("
        + range(TargetTable.STATE)
        + ",\"not known\")>0,IF("
        + known()
        + ",IF(COUNT("
        + unknown
        + ")>0,MAX("
        + unknown
        + "),\"none\"),\"n/a\"),"
        + most
        + "))";
  }

  private String known() {
    String levels = range(TargetTable.LEVEL);
    return "COUNT(" + levels + ")+COUNTIF(" + levels + ",\"none\")=" + (last - first + 1);
  }
}
