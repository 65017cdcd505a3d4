package eddyledger.window;

import eddyledger.present.TraceAccount;
import eddyledger.present.TraceStage;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Rectangle;
import java.awt.event.ActionEvent;
import java.util.ArrayList;
import java.util.List;
import java.util.function.IntConsumer;
import javax.accessibility.AccessibleRole;
import javax.swing.AbstractAction;
import javax.swing.KeyStroke;
import javax.swing.Scrollable;
import javax.swing.SwingConstants;

/** The rows of a trace, one below the other; up and down go from row to row. */
final class TracePage extends Painted implements Scrollable {
  private static final int LINE = 24;

  private final transient List<TraceRow> rows = new ArrayList<>();

  TracePage() {
    super(AccessibleRole.LIST);
    Theme.named(this, "trace.stages", "Steps of the trace");
    move("UP", -1);
    move("DOWN", 1);
  }

  private void move(String key, int by) {
    getInputMap(WHEN_ANCESTOR_OF_FOCUSED_COMPONENT).put(KeyStroke.getKeyStroke(key), key);
    getActionMap()
        .put(
            key,
            new AbstractAction() {
              @Override
              public void actionPerformed(ActionEvent event) {
                int now = focused();
                int next = Math.max(0, Math.min(rows.size() - 1, now + by));
                if (!rows.isEmpty()) {
                  rows.get(next).requestFocusInWindow();
                }
              }
            });
  }

  private int focused() {
    for (int i = 0; i < rows.size(); i++) {
      if (rows.get(i).isFocusOwner()) {
        return i;
      }
    }
    return -1;
  }

  /** Shows the stages of an account; the row with the focus keeps it. */
  void show(TraceAccount account, IntConsumer follow) {
    int focused = focused();
    rows.clear();
    removeAll();
    for (TraceStage stage : account.stages()) {
      TraceRow row = new TraceRow(account, stage, follow);
      rows.add(row);
      add(row);
    }
    revalidate();
    repaint();
    if (focused >= 0 && focused < rows.size()) {
      rows.get(focused).requestFocusInWindow();
    }
  }

  @Override
  public void doLayout() {
    int y = 0;
    int spare = Math.max(0, getHeight() - needed(getWidth()));
    int count = Math.max(1, rows.size());
    for (int i = 0; i < rows.size(); i++) {
      // on a large screen the rows share what is left over
      int more = spare / count + (i < spare % count ? 1 : 0);
      int height = rows.get(i).heightFor(getWidth()) + more;
      rows.get(i).setBounds(0, y, getWidth(), height);
      y += height;
    }
  }

  private int needed(int width) {
    return rows.stream().mapToInt(row -> row.heightFor(width)).sum();
  }

  @Override
  public Dimension getPreferredSize() {
    int width =
        Math.max(TraceColumns.LEAST_WIDTH, getParent() == null ? 0 : getParent().getWidth());
    return new Dimension(width, needed(width));
  }

  @Override
  protected void paintComponent(Graphics g) {
    g.setColor(Theme.palette().paper());
    g.fillRect(0, 0, getWidth(), getHeight());
  }

  @Override
  public Dimension getPreferredScrollableViewportSize() {
    return getPreferredSize();
  }

  @Override
  public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
    return LINE;
  }

  @Override
  public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
    return orientation == SwingConstants.VERTICAL ? visible.height - LINE : visible.width;
  }

  @Override
  public boolean getScrollableTracksViewportWidth() {
    return getParent() != null && getParent().getWidth() >= TraceColumns.LEAST_WIDTH;
  }

  @Override
  public boolean getScrollableTracksViewportHeight() {
    return getParent() != null && getParent().getHeight() > getPreferredSize().height;
  }
}
