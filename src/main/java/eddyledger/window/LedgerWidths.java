package eddyledger.window;

import eddyledger.present.LedgerColumn;
import eddyledger.present.LedgerHeading;
import eddyledger.present.LedgerLine;
import eddyledger.quantity.Bands;
import java.awt.Font;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import javax.swing.JTable;
import javax.swing.table.TableColumn;
import javax.swing.table.TableColumnModel;

/**
 * Shares the ledger's width among its columns: first what each needs least, then what the texts of
 * names, lay-ups and suppliers ask for, then the usual widths, then longer bars. A column dragged
 * by its edge ends this. Texts asked for room once keep it, so that columns do not move when
 * sections are closed.
 */
final class LedgerWidths {
  private static final int MOST_SUPPLIER = 150;
  private static final double FIRST_PART = 0.63;
  private static final int MOST_TEXT = 340;
  private static final int MOST_NAME = 380;

  private final JTable table;
  private final Lettering lettering = new Lettering();
  private final Map<LedgerColumn, Double> asked = new EnumMap<>(LedgerColumn.class);
  private double withKind;
  private String vehicle = "";
  private boolean dragged;
  private int width;

  LedgerWidths(JTable table) {
    this.table = table;
    // a column dragged by its edge keeps its width from then on
    for (int i = 0; i < table.getColumnCount(); i++) {
      table
          .getColumnModel()
          .getColumn(i)
          .addPropertyChangeListener(
              event -> dragged |= table.getTableHeader().getResizingColumn() != null);
    }
  }

  /** Takes the heading and the lines whose texts are to fit. */
  void show(LedgerHeading heading, List<LedgerLine> lines) {
    if (!lines.isEmpty() && !lines.get(0).id().equals(vehicle)) {
      vehicle = lines.get(0).id();
      asked.clear();
      withKind = 0.0;
    }
    double title = lettering.width(Theme.strong(12), heading.title());
    double note = lettering.width(Theme.small(), heading.note());
    ask(LedgerColumn.NAME, LedgerCells.NAME_START + title + LedgerCells.PAD + note);
    for (LedgerLine line : lines) {
      Font font = line.sum() ? Theme.strong(12) : Theme.body();
      double name = LedgerCells.textLeft(line) + lettering.width(font, line.name());
      ask(LedgerColumn.NAME, name);
      if (!line.kind().isEmpty()) {
        name += LedgerCells.PAD + lettering.width(Theme.small(), line.kind());
      }
      withKind = Math.max(withKind, Math.min(MOST_TEXT, name + LedgerCells.PAD + 1.0));
      ask(LedgerColumn.LAY_UP, LedgerCells.PAD + lettering.width(Theme.body(), line.layUp()));
      ask(LedgerColumn.SUPPLIER, LedgerCells.PAD + lettering.width(Theme.body(), line.supplier()));
    }
    share();
  }

  private void ask(LedgerColumn column, double text) {
    asked.merge(column, Math.min(MOST_TEXT, text + LedgerCells.PAD + 1.0), Math::max);
  }

  /** Fits the columns into a width, pixels. */
  void fit(int newWidth) {
    if (newWidth != width) {
      width = newWidth;
      share();
    }
  }

  private void share() {
    TableColumnModel model = table.getColumnModel();
    if (dragged || width <= 0) {
      return;
    }
    int[] widths = new int[LedgerColumn.values().length];
    int left = width;
    for (LedgerColumn column : LedgerColumn.values()) {
      widths[column.ordinal()] = LedgerCells.least(column);
      left -= LedgerCells.least(column);
    }
    for (double part : new double[] {FIRST_PART, 1.0}) {
      for (LedgerColumn column :
          List.of(LedgerColumn.NAME, LedgerColumn.SUPPLIER, LedgerColumn.LAY_UP)) {
        double most = part * (column == LedgerColumn.SUPPLIER ? MOST_SUPPLIER : MOST_TEXT);
        double wanted = Math.min(most, asked.getOrDefault(column, 0.0));
        left -= grow(widths, column, (int) Math.ceil(wanted), left);
      }
    }
    for (LedgerColumn column : LedgerColumn.values()) {
      left -= grow(widths, column, LedgerCells.width(column), left);
    }
    left -= grow(widths, LedgerColumn.NAME, (int) Math.ceil(withKind), left);
    left -= grow(widths, LedgerColumn.SHARE, LedgerCells.most(LedgerColumn.SHARE), left);
    int bands = LedgerCells.most(LedgerColumn.BANDS) - widths[LedgerColumn.BANDS.ordinal()];
    // bars are whole pixels wide, so less than one more for each of them would be lost
    int each = Math.max(0, Math.min(bands, left)) / Bands.COUNT;
    widths[LedgerColumn.BANDS.ordinal()] += each * Bands.COUNT;
    left -= each * Bands.COUNT;
    left -= grow(widths, LedgerColumn.LAY_UP, MOST_TEXT, left);
    left -= grow(widths, LedgerColumn.NAME, MOST_NAME, left);
    // what is left stands at the end, so that a name is not far from its numbers
    widths[LedgerColumn.SUPPLIER.ordinal()] += Math.max(0, left);
    for (int i = 0; i < widths.length; i++) {
      TableColumn column = model.getColumn(table.convertColumnIndexToView(i));
      if (column.getPreferredWidth() != widths[i]) {
        column.setPreferredWidth(widths[i]);
      }
    }
  }

  private static int grow(int[] widths, LedgerColumn column, int wanted, int left) {
    int more = Math.max(0, Math.min(wanted - widths[column.ordinal()], left));
    widths[column.ordinal()] += more;
    return more;
  }
}
