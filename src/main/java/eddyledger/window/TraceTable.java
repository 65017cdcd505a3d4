package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.chart.Palette;
import eddyledger.present.TraceNumber;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.util.List;
import javax.accessibility.AccessibleRole;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.event.ChangeEvent;
import javax.swing.event.TableColumnModelEvent;
import javax.swing.table.TableCellRenderer;

/** The table of all numbers of a trace; long texts run over several lines, so that none is cut. */
final class TraceTable extends JTable {
  private static final int LINE = 16;
  private static final int PAD = 8;

  private final transient TraceNumbers numbers;

  TraceTable() {
    super(new TraceNumbers());
    numbers = (TraceNumbers) getModel();
    Theme.named(this, "trace.numbers", "All numbers of the trace");
    setDefaultRenderer(Object.class, new Cell());
    setFillsViewportHeight(true);
    getTableHeader().setReorderingAllowed(false);
    getTableHeader().setDefaultRenderer(new Head());
    for (TraceNumbers.Column column : TraceNumbers.Column.values()) {
      getColumnModel().getColumn(column.ordinal()).setPreferredWidth(column.width());
    }
  }

  void show(List<TraceNumber> shown) {
    int row = getSelectedRow();
    numbers.show(shown);
    fit();
    if (row >= 0 && row < getRowCount()) {
      setRowSelectionInterval(row, row);
    }
  }

  /** In a scroll pane without a frame of its own. */
  JScrollPane scrolled() {
    JScrollPane scroll = new JScrollPane(this);
    scroll.setBorder(javax.swing.BorderFactory.createEmptyBorder(0, 16, 0, 0));
    scroll.setOpaque(false);
    return scroll;
  }

  @Override
  public void doLayout() {
    super.doLayout();
    fit();
  }

  @Override
  public void columnMarginChanged(ChangeEvent event) {
    super.columnMarginChanged(event);
    fit();
  }

  @Override
  public void columnMoved(TableColumnModelEvent event) {
    super.columnMoved(event);
    fit();
  }

  private void fit() {
    if (numbers == null) {
      return;
    }
    for (int row = 0; row < getRowCount(); row++) {
      int lines = 1;
      for (int column = 0; column < getColumnCount(); column++) {
        int width = getColumnModel().getColumn(column).getWidth() - PAD * 2;
        String text = (String) getValueAt(row, column);
        lines = Math.max(lines, MarkupPainter.wrap(Theme.body(), text, width).size());
      }
      int height = lines * LINE + PAD;
      if (getRowHeight(row) != height) {
        setRowHeight(row, height);
      }
    }
  }

  /** One painter for every cell. */
  private final class Cell extends Painted implements TableCellRenderer {
    private String text = "";
    private int column;
    private boolean selected;
    private boolean opens;

    Cell() {
      super(AccessibleRole.LABEL);
    }

    @Override
    public Component getTableCellRendererComponent(
        JTable table, Object value, boolean chosen, boolean focus, int row, int at) {
      text = String.valueOf(value);
      column = at;
      selected = chosen;
      opens = numbers.opensStage(row) && row > 0;
      getAccessibleContext().setAccessibleName(text);
      return this;
    }

    @Override
    protected void paintComponent(Graphics graphics) {
      Graphics2D g = (Graphics2D) graphics.create();
      Digits.smooth(g);
      Palette palette = Theme.palette();
      g.setColor(selected ? palette.selection() : palette.paper());
      g.fillRect(0, 0, getWidth(), getHeight());
      if (opens) {
        g.setColor(palette.hairline());
        g.fillRect(0, 0, getWidth(), 1);
      }
      TraceNumbers.Column kind = TraceNumbers.Column.values()[column];
      boolean stage = kind == TraceNumbers.Column.STAGE;
      g.setFont(stage ? Theme.strong(12f) : Theme.body());
      boolean quiet = kind == TraceNumbers.Column.SOURCE || kind == TraceNumbers.Column.ROLE;
      g.setColor(quiet ? palette.ink2() : palette.ink());
      int baseline = PAD / 2 + 12;
      if (kind == TraceNumbers.Column.VALUE) {
        Digits.drawRight(g, text, getWidth() - PAD, baseline);
      } else {
        for (String line : MarkupPainter.wrap(g.getFont(), text, getWidth() - PAD * 2.0)) {
          g.drawString(line, PAD, baseline);
          baseline += LINE;
        }
      }
      g.dispose();
    }
  }

  /** The header's cells. */
  private static final class Head extends Painted implements TableCellRenderer {
    private static final int HEIGHT = 28;
    private String text = "";
    private boolean right;

    Head() {
      super(AccessibleRole.LABEL);
      setPreferredSize(new Dimension(40, HEIGHT));
    }

    @Override
    public Component getTableCellRendererComponent(
        JTable table, Object value, boolean chosen, boolean focus, int row, int at) {
      text = String.valueOf(value);
      getAccessibleContext().setAccessibleName(text);
      right = at == TraceNumbers.Column.VALUE.ordinal();
      return this;
    }

    @Override
    protected void paintComponent(Graphics graphics) {
      Graphics2D g = (Graphics2D) graphics.create();
      Digits.smooth(g);
      g.setColor(Theme.palette().paper());
      g.fillRect(0, 0, getWidth(), HEIGHT);
      g.setColor(Theme.palette().hairline());
      g.fillRect(0, HEIGHT - 1, getWidth(), 1);
      g.setFont(Theme.small());
      g.setColor(Theme.palette().ink2());
      double width = Digits.width(g.getFont(), text);
      g.drawString(text, (float) (right ? getWidth() - PAD - width : PAD), 18f);
      g.dispose();
    }
  }
}
