package eddyledger.window;

import eddyledger.present.TraceAccount;
import eddyledger.present.TraceStage;
import eddyledger.quantity.Bands;
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

/**
 * The rows of a trace, one below the other. Up and down go from row to row, left and right to the
 * band below and above.
 */
final class TracePage extends Painted implements Scrollable {
  private static final int LINE = 24;

  private final transient List<TraceRow> rows = new ArrayList<>();
  private transient TraceAccount account;
  private transient IntConsumer follow = band -> {};

  TracePage() {
    super(AccessibleRole.LIST);
    Theme.named(this, "trace.stages", "Steps of the trace");
    key("UP", () -> row(-1));
    key("DOWN", () -> row(1));
    key("LEFT", () -> band(-1));
    key("RIGHT", () -> band(1));
  }

  private void key(String key, Runnable action) {
    getInputMap(WHEN_ANCESTOR_OF_FOCUSED_COMPONENT).put(KeyStroke.getKeyStroke(key), key);
    getActionMap()
        .put(
            key,
            new AbstractAction() {
              @Override
              public void actionPerformed(ActionEvent event) {
                action.run();
              }
            });
  }

  private void row(int by) {
    int next = Math.max(0, Math.min(rows.size() - 1, focused() + by));
    if (!rows.isEmpty()) {
      rows.get(next).requestFocusInWindow();
    }
  }

  private void band(int by) {
    int band = account.band() + by;
    if (band >= 0 && band < Bands.COUNT) {
      follow.accept(band);
    }
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
  void show(TraceAccount shown, IntConsumer listener) {
    account = shown;
    follow = listener;
    List<TraceStage> stages = shown.stages();
    while (rows.size() > stages.size()) {
      remove(rows.remove(rows.size() - 1));
    }
    for (int i = 0; i < stages.size(); i++) {
      if (i < rows.size()) {
        rows.get(i).show(shown, stages.get(i));
      } else {
        TraceRow row = new TraceRow(shown, stages.get(i), band -> follow.accept(band));
        rows.add(row);
        add(row);
      }
    }
    revalidate();
    repaint();
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
