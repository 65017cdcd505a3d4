package eddyledger.window;

import eddyledger.present.TraceNumber;
import java.util.List;
import javax.swing.table.AbstractTableModel;

/** Every number of a trace as a table. */
final class TraceNumbers extends AbstractTableModel {
  /** The columns, in order. */
  enum Column {
    STAGE("Step", 110),
    SYMBOL("Symbol", 84),
    VALUE("Value", 84),
    UNIT("Unit", 56),
    ROLE("Role", 52),
    MEANING("Meaning", 250),
    SOURCE("Rule, or where it is from", 300),
    NOTE("Defaulted, filled in or out of range", 300);

    private final String title;
    private final int width;

    Column(String title, int width) {
      this.title = title;
      this.width = width;
    }

    /** Width it would like, pixels. */
    int width() {
      return width;
    }
  }

  private transient List<TraceNumber> numbers = List.of();

  void show(List<TraceNumber> shown) {
    numbers = List.copyOf(shown);
    fireTableDataChanged();
  }

  @Override
  public int getRowCount() {
    return numbers.size();
  }

  @Override
  public int getColumnCount() {
    return Column.values().length;
  }

  @Override
  public String getColumnName(int column) {
    return Column.values()[column].title;
  }

  /** Whether a row is the first of its stage. */
  boolean opensStage(int row) {
    return row == 0 || !numbers.get(row).stage().equals(numbers.get(row - 1).stage());
  }

  @Override
  public Object getValueAt(int row, int column) {
    TraceNumber number = numbers.get(row);
    return switch (Column.values()[column]) {
      case STAGE -> opensStage(row) ? number.stage() : "";
      case SYMBOL -> number.symbol();
      case VALUE -> number.value();
      case UNIT -> number.unit();
      case ROLE -> number.role();
      case MEANING -> number.meaning();
      case SOURCE -> number.source();
      case NOTE -> number.note();
    };
  }
}
