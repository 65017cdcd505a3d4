package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.present.LedgerColumn;
import eddyledger.present.LedgerHeading;
import eddyledger.present.LedgerLine;
import java.awt.Component;
import java.awt.Font;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.event.MouseEvent;
import java.util.List;
import java.util.function.Supplier;
import javax.accessibility.Accessible;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.swing.JComponent;
import javax.swing.JTable;
import javax.swing.table.TableCellRenderer;

/** Renders every cell of the ledger. */
final class LedgerCell extends JComponent implements TableCellRenderer, Accessible {
  private final Lettering lettering = new Lettering();
  private final Supplier<LedgerHeading> heading;
  private List<GutterMark> gutter = List.of();
  private LedgerInk ink;
  private LedgerLine line;
  private LedgerColumn column;
  private GutterMark mark;
  private boolean selected;
  private boolean focused;
  private int row;
  private int width;

  LedgerCell(Supplier<LedgerHeading> heading) {
    this.heading = heading;
    setOpaque(true);
  }

  /** Takes the marks of the gutter, one for each line. */
  void gutter(List<GutterMark> marks) {
    gutter = marks;
  }

  @Override
  public Component getTableCellRendererComponent(
      JTable table, Object value, boolean isSelected, boolean hasFocus, int at, int columnAt) {
    line = (LedgerLine) value;
    column = LedgerColumn.values()[table.convertColumnIndexToModel(columnAt)];
    selected = isSelected;
    focused = table.isFocusOwner();
    row = at;
    // for a tooltip the cell is asked without being laid out
    width = table.getColumnModel().getColumn(columnAt).getWidth();
    mark = column == LedgerColumn.NAME && at < gutter.size() ? gutter.get(at) : null;
    return this;
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics;
    Digits.smooth(g);
    if (ink == null || ink.palette() != Theme.palette()) {
      ink = new LedgerInk(Theme.palette(), lettering);
    }
    g.setColor(selected ? ink.palette().selection() : ink.palette().paper());
    g.fillRect(0, 0, getWidth(), getHeight());
    ink.paint(g, line, column, heading.get(), getWidth(), getHeight());
    if (mark != null) {
      ink.gutter(g, mark, getHeight(), row * getHeight());
    }
    if (selected && focused && column == LedgerColumn.NAME) {
      ink.focus(g, getHeight());
    }
  }

  @Override
  public String getToolTipText(MouseEvent event) {
    return Tip.of(List.of(tip()));
  }

  /** What is cut in the cell, or stands behind it; empty if there is nothing more to say. */
  private String tip() {
    return switch (column) {
      case NAME -> {
        boolean whole = line.name().equals(line.fullName());
        Font font = line.sum() ? Theme.strong(12) : Theme.body();
        boolean cut = lettering.cut(font, line.name(), LedgerCells.nameRoom(line, width));
        yield whole && !cut ? "" : line.fullName();
      }
      case BANDS -> line.strip().drawn() ? line.text(column) : line.reason();
      case LEVEL, MARGIN, SHARE -> line.reason();
      case LAY_UP, SUPPLIER -> {
        String text = line.text(column);
        yield lettering.cut(Theme.body(), text, width - 2.0 * LedgerCells.PAD) ? text : "";
      }
      case ALLOWANCE, MASS -> "";
    };
  }

  @Override
  public AccessibleContext getAccessibleContext() {
    if (accessibleContext == null) {
      accessibleContext = new Spoken();
    }
    return accessibleContext;
  }

  /** A cell is read as its text. */
  private final class Spoken extends AccessibleJComponent {
    @Override
    public String getAccessibleName() {
      return line == null ? "" : line.text(column);
    }

    @Override
    public AccessibleRole getAccessibleRole() {
      return AccessibleRole.LABEL;
    }
  }

  // a renderer is painted by the table and lies in no window: there is nothing to lay out or
  // repaint

  @Override
  public void validate() {}

  @Override
  public void revalidate() {}

  @Override
  public void repaint(long time, int x, int y, int width, int height) {}
}
