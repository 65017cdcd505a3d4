package eddyledger.workbook;

import eddyledger.model.Vehicle;
import eddyledger.quantity.Progress;
import org.apache.poi.ss.usermodel.PaperSize;
import org.apache.poi.xssf.streaming.SXSSFWorkbook;

/** Writes all sheets of one workbook. */
final class BookWriter {
  private final SXSSFWorkbook workbook;
  private final WorkbookContent content;
  private final Vehicle vehicle;
  private final BookPlan plan;
  private final Styles styles;

  BookWriter(SXSSFWorkbook workbook, WorkbookContent content) {
    this.workbook = workbook;
    this.content = content;
    vehicle = content.vehicle();
    plan = BookPlan.of(content);
    styles = new Styles(workbook.getXSSFWorkbook());
  }

  void write(Progress progress) {
    Page summary = page(SummaryPlan.SHEET);
    Page ledger = page(LedgerColumns.SHEET);
    Page others = page(OthersPage.SHEET);
    Page assumptions = page(AssumptionsPage.SHEET);
    Page panels = page(PanelTable.SHEET);
    Page flow = page(FlowTable.SHEET);
    Page revision = page(RevisionPage.SHEET);
    names();
    summary(summary);
    ledger(ledger, progress);
    others(others);
    new AssumptionsPage(assumptions, content).write(title("assumptions"));
    frame(assumptions, PaperSize.A3_PAPER, 0, Grid.LAST).freeze(1, 1);
    new PanelTable(panels, vehicle).write(title("panels"));
    table(panels, PanelTable.HEADER_ROW);
    new FlowTable(flow, content).write(title("flow over every panel"), progress);
    table(flow, FlowTable.HEADER_ROW);
    new RevisionPage(revision).write(title("revisions"), vehicle.changeLog());
    frame(revision, PaperSize.A4_PAPER, RevisionPage.HEADER_ROW, RevisionPage.LAST_COLUMN)
        .freeze(1, RevisionPage.HEADER_ROW);
    properties();
    workbook.setActiveSheet(0);
  }

  private void table(Page page, int header) {
    Frame frame = frame(page, PaperSize.A3_PAPER, header, Grid.LAST);
    frame.freeze(1, header);
    frame.filter(header, Grid.LAST, page.sheet().getLastRowNum() + 1);
  }

  private Page page(String name) {
    return new Page(workbook.createSheet(name), styles);
  }

  private String title(String what) {
    return vehicle.name() + ": " + what;
  }

  private void names() {
    var book = workbook.getXSSFWorkbook();
    BudgetWorkbook.name(
        book, "tight_band", TargetTable.outside(SummaryPlan.TIGHT_COLUMN, SummaryPlan.TIGHT_ROW));
    int row = LedgerColumns.WEIGHT_ROW;
    BudgetWorkbook.name(
        book, "a_weights", weights(LedgerColumns.BAND, LedgerColumns.LAST_BAND, row));
    BudgetWorkbook.name(
        book, "a_weight_ratios", weights(LedgerColumns.ENERGY, LedgerColumns.LAST_ENERGY, row));
  }

  private static String weights(int first, int last, int row) {
    return LedgerColumns.outside(first, row) + ":" + Columns.fixed(last, row);
  }

  private void summary(Page page) {
    new SummaryPage(page, plan, content).write();
    Frame frame = frame(page, PaperSize.A4_PAPER, 0, SummaryPlan.LAST_COLUMN);
    // title, cautions and legend are read once; the condition stays beside the numbers
    frame.freeze(2, 1);
    ValueFormats formats = new ValueFormats(page);
    int first = plan.summary().firstPair();
    int last = plan.summary().firstTarget() + plan.targets().rows();
    formats.states(TargetTable.STATE, first, last);
    formats.statuses(9, first, last);
    formats.noMinusZero(TargetTable.TARGET, TargetTable.MARGIN, first, last);
    int largest = plan.summary().firstLargest(plan.targets().rows());
    formats.bars(11, largest, Math.max(largest, LargestTable.lastRow(plan)));
  }

  private void ledger(Page page, Progress progress) {
    new LedgerPage(page, plan).write(title("ledger"), progress);
    Frame frame =
        frame(page, PaperSize.A3_PAPER, LedgerColumns.HEADER_ROW, LedgerColumns.LAST_BAND);
    frame.inTwo(LedgerColumns.BAND, LedgerColumns.LAST_BAND, LedgerColumns.NAME, blockHeight(page));
    frame.filter(LedgerColumns.HEADER_ROW, LedgerColumns.LAST_BAND, plan.lastLedgerRow());
    frame.freeze(LedgerColumns.NAME + 1, LedgerColumns.HEADER_ROW);
    ValueFormats formats = new ValueFormats(page);
    int first = LedgerColumns.FIRST_ROW;
    int last = Math.max(first, plan.lastLedgerRow());
    formats.states(LedgerColumns.STATE, first, last);
    formats.statuses(LedgerColumns.STATUS, first, last);
    formats.bars(LedgerColumns.SHARE, first, last);
    formats.noMinusZero(LedgerColumns.LEVEL_A, LedgerColumns.LEVEL, first, last);
    formats.noMinusZero(LedgerColumns.MARGIN, LedgerColumns.MARGIN, first, last);
    formats.noMinusZero(LedgerColumns.BAND, LedgerColumns.LAST_BAND, first, last);
    frame.levels(LedgerColumns.BAND, LedgerColumns.LAST_BAND, first, last);
  }

  /** Height of the longest block with what stands above it, points. */
  private double blockHeight(Page page) {
    double height = 0.0;
    for (Block block : plan.blocks()) {
      height = Math.max(height, page.height(block.title(), block.end()));
    }
    return page.height(1, LedgerColumns.HEADER_ROW) + height;
  }

  private void others(Page page) {
    new OthersPage(page, plan, vehicle.otherSources()).write(title("other sources"));
    Frame frame = frame(page, PaperSize.A3_PAPER, OthersPage.HEADER_ROW, OthersPage.LAST_BAND);
    frame.freeze(4, OthersPage.HEADER_ROW);
    int last = Math.max(OthersPage.FIRST_ROW, page.sheet().getLastRowNum() + 1);
    new ValueFormats(page)
        .noMinusZero(OthersPage.BAND, OthersPage.LAST_BAND, OthersPage.FIRST_ROW, last);
    frame.levels(OthersPage.BAND, OthersPage.LAST_BAND, OthersPage.FIRST_ROW, last);
  }

  private Frame frame(Page page, PaperSize paper, int header, int lastColumn) {
    Frame frame = new Frame(page);
    int firstHeader = header == 0 ? 0 : Math.max(1, header - (header > 4 ? 1 : 0));
    frame.print(
        vehicle.name(), paper, firstHeader, header, lastColumn, page.sheet().getLastRowNum() + 1);
    frame.protect();
    return frame;
  }

  private void properties() {
    var properties = workbook.getXSSFWorkbook().getProperties().getCoreProperties();
    properties.setTitle(title("interior flow-noise budget"));
    properties.setCreator("Eddyledger");
  }
}
