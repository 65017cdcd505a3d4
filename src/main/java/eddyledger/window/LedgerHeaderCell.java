package eddyledger.window;

import eddyledger.chart.Digits;
import eddyledger.chart.Palette;
import eddyledger.present.LedgerColumn;
import eddyledger.present.LedgerHeading;
import eddyledger.quantity.Bands;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.Font;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.event.MouseEvent;
import java.util.List;
import java.util.function.Supplier;
import javax.accessibility.Accessible;
import javax.accessibility.AccessibleContext;
import javax.swing.JComponent;
import javax.swing.JTable;
import javax.swing.table.TableCellRenderer;

/** Renders the header of the ledger. */
final class LedgerHeaderCell extends JComponent implements TableCellRenderer, Accessible {
  private static final int TEXT = 18;

  private final Lettering lettering = new Lettering();
  private final Supplier<LedgerHeading> heading;
  private LedgerColumn column = LedgerColumn.NAME;

  LedgerHeaderCell(Supplier<LedgerHeading> heading) {
    this.heading = heading;
    setPreferredSize(new Dimension(1, LedgerCells.HEADER));
  }

  @Override
  public Component getTableCellRendererComponent(
      JTable table, Object value, boolean isSelected, boolean hasFocus, int row, int columnAt) {
    column = LedgerColumn.values()[table.convertColumnIndexToModel(columnAt)];
    return this;
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Graphics2D g = (Graphics2D) graphics;
    Digits.smooth(g);
    Palette palette = Theme.palette();
    g.setColor(palette.paper());
    g.fillRect(0, 0, getWidth(), getHeight());
    String title = heading.get().title(column);
    double right = getWidth() - (double) LedgerCells.PAD;
    Font small = Theme.small();
    switch (column) {
      case NAME -> place(g, palette);
      case BANDS -> bands(g, palette);
      case LEVEL, ALLOWANCE, MASS -> lettering.right(g, small, palette.ink2(), title, right, TEXT);
      case SHARE -> share(g, palette, title);
      case MARGIN -> left(g, palette, title, LedgerCells.MARGIN_START);
      case LAY_UP, SUPPLIER -> left(g, palette, title, LedgerCells.PAD);
    }
    g.setColor(palette.hairline());
    g.fillRect(0, getHeight() - 1, getWidth(), 1);
  }

  private void left(Graphics2D g, Palette palette, String title, double x) {
    lettering.left(g, Theme.small(), palette.ink2(), title, x, TEXT);
  }

  private void place(Graphics2D g, Palette palette) {
    LedgerHeading now = heading.get();
    double x = LedgerCells.NAME_START;
    double room = getWidth() - x - LedgerCells.PAD;
    Font strong = Theme.strong(12);
    if (!now.title().isEmpty()) {
      x += lettering.fitted(g, strong, palette.ink(), now.title(), x, TEXT, room) + LedgerCells.PAD;
    }
    double left = getWidth() - x - LedgerCells.PAD;
    if (left > 3.0 * LedgerCells.PAD) {
      lettering.fitted(g, Theme.small(), palette.ink2(), now.note(), x, TEXT, left);
    }
  }

  /** Right over the numbers; over numbers and rails where it is longer. */
  private void share(Graphics2D g, Palette palette, String title) {
    double end = LedgerCells.SHARE_END + 14.0;
    double width = lettering.width(Theme.small(), title);
    lettering.left(g, Theme.small(), palette.ink2(), title, Math.max(8.0, end - width), TEXT);
  }

  private void bands(Graphics2D g, Palette palette) {
    band(g, palette, "50", "50 Hz");
    band(g, palette, "1000", "1 kHz");
    band(g, palette, "10000", "10 kHz");
  }

  private void band(Graphics2D g, Palette palette, String band, String label) {
    double middle = BandStripPainter.middle(Bands.position(band), getWidth());
    double width = lettering.width(Theme.small(), label);
    double end = BandStripPainter.end(getWidth());
    double x = Math.min(middle - width / 2.0, end - width);
    left(g, palette, label, Math.max(BandStripPainter.start(), x));
  }

  @Override
  public String getToolTipText(MouseEvent event) {
    return Tip.of(List.of(heading.get().tip(column)));
  }

  @Override
  public AccessibleContext getAccessibleContext() {
    if (accessibleContext == null) {
      accessibleContext = new Spoken();
    }
    return accessibleContext;
  }

  /** A heading is read as its title. */
  private final class Spoken extends AccessibleJComponent {
    @Override
    public String getAccessibleName() {
      return heading.get().title(column);
    }
  }
}
