package eddyledger.window;

import eddyledger.present.LedgerColumn;
import eddyledger.present.LedgerLine;
import eddyledger.present.LedgerPresenter;
import java.awt.BorderLayout;
import java.awt.Color;
import java.awt.Dimension;
import java.awt.dnd.DropTarget;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import javax.swing.BorderFactory;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.ListSelectionModel;
import javax.swing.ScrollPaneConstants;
import javax.swing.SwingUtilities;
import javax.swing.event.ListSelectionEvent;
import javax.swing.table.TableColumn;

/** The ledger: a table whose lines open and close. */
public final class LedgerView extends JPanel {
  private final LedgerPresenter presenter;
  private final LedgerTableModel model = new LedgerTableModel();
  private final JTable table = new Table(model);
  private final JScrollPane scroll = new JScrollPane(table);
  private final LedgerCell cell;
  private final LedgerWidths columns;
  private final Gutter gutter = new Gutter();
  private boolean following;
  private String shown = "";

  /** Shows what the presenter says. */
  public LedgerView(LedgerPresenter presenter) {
    super(new BorderLayout());
    this.presenter = presenter;
    this.cell = new LedgerCell(presenter::heading);
    Theme.named(table, "ledger", "Ledger");
    table.setRowHeight(LedgerCells.ROW);
    table.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
    table.setAutoResizeMode(JTable.AUTO_RESIZE_SUBSEQUENT_COLUMNS);
    columns = new LedgerWidths(table);
    table.getTableHeader().setReorderingAllowed(false);
    table.getTableHeader().setDefaultRenderer(new LedgerHeaderCell(presenter::heading));
    table.getTableHeader().setPreferredSize(new Dimension(1, LedgerCells.HEADER));
    for (LedgerColumn column : LedgerColumn.values()) {
      TableColumn of = table.getColumnModel().getColumn(column.ordinal());
      of.setCellRenderer(cell);
      of.setMinWidth(LedgerCells.least(column));
      of.setPreferredWidth(LedgerCells.width(column));
    }
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.setHorizontalScrollBarPolicy(ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
    add(scroll);
    LedgerKeys.install(table, presenter);
    DeskView.release(table, "F2", "F8", "shift F8", "ctrl P");
    table.getSelectionModel().addListSelectionListener(this::selected);
    table.addMouseListener(new Clicks());
    table.addFocusListener(new Focus());
    presenter.onChange(this::refresh);
    refresh();
  }

  /** The largest height up to this one in which no row is cut, pixels. */
  static int wholeRows(int height) {
    int rows = Math.max(0, height - LedgerCells.HEADER) / LedgerCells.ROW;
    return LedgerCells.HEADER + rows * LedgerCells.ROW;
  }

  @Override
  public void doLayout() {
    // what is left below the last whole row stays blank, so that no line of text is cut
    int height = getHeight();
    scroll.setBounds(0, 0, getWidth(), Math.min(height, wholeRows(height)));
    columns.fit(getWidth() - scroll.getVerticalScrollBar().getPreferredSize().width);
  }

  /** Moves the keyboard's focus into the table. */
  public void focusTable() {
    table.requestFocusInWindow();
  }

  @Override
  public void updateUI() {
    super.updateUI();
    if (scroll != null) {
      SwingUtilities.invokeLater(this::refresh);
    }
  }

  private void selected(ListSelectionEvent event) {
    int row = table.getSelectedRow();
    if (!following && !event.getValueIsAdjusting() && row >= 0) {
      presenter.select(row);
    }
  }

  private void refresh() {
    Color paper = Theme.palette().paper();
    setBackground(paper);
    scroll.getViewport().setBackground(paper);
    cell.gutter(gutter.marks(presenter.sheet(), presenter.selectedId(), presenter.lines()));
    following = true;
    boolean reshaped = model.show(presenter.lines());
    columns.show(presenter.heading(), presenter.lines());
    int row = presenter.selectedIndex();
    if (row < 0) {
      table.clearSelection();
    } else {
      table.getSelectionModel().setSelectionInterval(row, row);
      table.getColumnModel().getSelectionModel().setSelectionInterval(0, 0);
    }
    following = false;
    table.getTableHeader().repaint();
    String now = row < 0 ? "" : model.line(row).id() + " " + model.line(row).way().text();
    if (row >= 0 && !now.equals(shown)) {
      bringIntoView(row, reshaped);
    }
    shown = now;
  }

  private void bringIntoView(int row, boolean reshaped) {
    Runnable scrolling = () -> table.scrollRectToVisible(table.getCellRect(row, 0, true));
    if (reshaped || !table.isValid()) {
      // the table has not been laid out for its new lines yet
      SwingUtilities.invokeLater(scrolling);
    } else {
      scrolling.run();
    }
  }

  /** A click on the chevron opens and closes, a double click anywhere. */
  private final class Clicks extends MouseAdapter {
    @Override
    public void mousePressed(MouseEvent event) {
      int row = table.rowAtPoint(event.getPoint());
      if (row < 0 || !SwingUtilities.isLeftMouseButton(event)) {
        return;
      }
      LedgerLine line = model.line(row);
      boolean name = table.columnAtPoint(event.getPoint()) == LedgerColumn.NAME.ordinal();
      boolean chevron = name && LedgerCells.onChevron(line, event.getX());
      boolean twice = event.getClickCount() == 2 && line.twig() != LedgerLine.Twig.LEAF;
      if (chevron || twice) {
        presenter.toggle(row);
      }
    }
  }

  /** A table that leaves a dropped file to the window. */
  private static final class Table extends JTable {
    private Table(LedgerTableModel model) {
      super(model);
    }

    @Override
    public synchronized void setDropTarget(DropTarget target) {
      super.setDropTarget(null);
    }
  }

  /** The selected line shows whether keys reach it. */
  private final class Focus extends FocusAdapter {
    @Override
    public void focusGained(FocusEvent event) {
      table.repaint();
    }

    @Override
    public void focusLost(FocusEvent event) {
      table.repaint();
    }
  }
}
