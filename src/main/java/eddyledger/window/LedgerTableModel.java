package eddyledger.window;

import eddyledger.present.LedgerColumn;
import eddyledger.present.LedgerLine;
import java.util.List;
import javax.swing.table.AbstractTableModel;

/** The visible lines as a table; every cell of a row is its line. */
final class LedgerTableModel extends AbstractTableModel {
  private List<LedgerLine> lines = List.of();

  /** Takes other lines; tells of a new shape only if there is one. Whether there is. */
  boolean show(List<LedgerLine> others) {
    boolean same = others.size() == lines.size();
    for (int i = 0; same && i < lines.size(); i++) {
      same = lines.get(i).sameAs(others.get(i));
    }
    lines = others;
    if (same) {
      if (!lines.isEmpty()) {
        fireTableRowsUpdated(0, lines.size() - 1);
      }
    } else {
      fireTableDataChanged();
    }
    return !same;
  }

  LedgerLine line(int row) {
    return lines.get(row);
  }

  @Override
  public int getRowCount() {
    return lines.size();
  }

  @Override
  public int getColumnCount() {
    return LedgerColumn.values().length;
  }

  @Override
  public String getColumnName(int column) {
    return LedgerColumn.values()[column].title();
  }

  @Override
  public Class<?> getColumnClass(int column) {
    return LedgerLine.class;
  }

  @Override
  public LedgerLine getValueAt(int row, int column) {
    return lines.get(row);
  }
}
