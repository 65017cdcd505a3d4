package eddyledger.window;

import eddyledger.present.TargetStripPresenter;
import eddyledger.present.TargetTile;
import java.awt.BorderLayout;
import java.awt.Color;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.GradientPaint;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.util.ArrayList;
import java.util.List;
import javax.swing.BorderFactory;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.LayoutFocusTraversalPolicy;
import javax.swing.ScrollPaneConstants;
import javax.swing.SwingUtilities;

/** The target strip: a row of tiles, of which one rules the desk. */
public final class TargetStripView extends JPanel {
  private static final int FADE = 28;

  private final TargetStripPresenter presenter;
  private final Lettering lettering = new Lettering();
  private final TileRow row = new TileRow();
  private final JScrollPane scroll = new JScrollPane(row);
  private final JLabel message = new JLabel();
  private final List<TargetTileView> tiles = new ArrayList<>();
  private int shown = -1;

  /** Shows what the presenter says. */
  public TargetStripView(TargetStripPresenter presenter) {
    super(new BorderLayout());
    this.presenter = presenter;
    Theme.named(this, "target-strip", "Targets");
    setPreferredSize(new Dimension(1, TileRow.HEIGHT));
    setMinimumSize(new Dimension(1, TileRow.HEIGHT));
    scroll.setBorder(BorderFactory.createEmptyBorder());
    scroll.setOpaque(false);
    scroll.getViewport().setOpaque(false);
    scroll.setHorizontalScrollBarPolicy(ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
    scroll.setVerticalScrollBarPolicy(ScrollPaneConstants.VERTICAL_SCROLLBAR_NEVER);
    scroll.setWheelScrollingEnabled(false);
    scroll.addMouseWheelListener(event -> wheel(event.getWheelRotation()));
    scroll.getViewport().addChangeListener(event -> repaint());
    add(scroll);
    message.setBorder(BorderFactory.createEmptyBorder(16, 16, 0, 16));
    add(message, BorderLayout.NORTH);
    row.setFocusTraversalPolicyProvider(true);
    row.setFocusTraversalPolicy(new OnlyTheChosen());
    presenter.onChange(this::refresh);
    refresh();
  }

  private void wheel(int notches) {
    Rectangle view = scroll.getViewport().getViewRect();
    view.x += notches * row.getScrollableUnitIncrement(view, 0, notches);
    row.scrollRectToVisible(view);
  }

  private void refresh() {
    List<TargetTile> wanted = presenter.tiles();
    message.setText(presenter.message());
    message.setVisible(!presenter.message().isEmpty());
    if (same(wanted)) {
      for (int i = 0; i < wanted.size(); i++) {
        tiles.get(i).show(wanted.get(i));
      }
    } else {
      rebuild(wanted);
    }
    int selected = presenter.selectedIndex();
    if (selected != shown && selected >= 0) {
      SwingUtilities.invokeLater(() -> bringIntoView(selected));
    }
    shown = selected;
  }

  private boolean same(List<TargetTile> wanted) {
    boolean same = wanted.size() == tiles.size();
    for (int i = 0; same && i < tiles.size(); i++) {
      TargetTile tile = tiles.get(i).tile();
      same =
          tile.conditionId().equals(wanted.get(i).conditionId())
              && tile.receiverId().equals(wanted.get(i).receiverId());
    }
    return same;
  }

  private void rebuild(List<TargetTile> wanted) {
    row.removeAll();
    tiles.clear();
    shown = -1;
    for (TargetTile tile : wanted) {
      int index = tiles.size();
      TargetTileView view = new TargetTileView(tile, lettering, () -> presenter.choose(index));
      TileInput.install(view, this::go);
      tiles.add(view);
      row.add(view);
    }
    row.revalidate();
    row.repaint();
  }

  /** Chooses the tile so many places on, or the first or last, and gives it the focus. */
  private void go(int from, int to) {
    int index = Math.max(0, Math.min(tiles.size() - 1, to));
    if (index != from) {
      presenter.choose(index);
      tiles.get(index).requestFocusInWindow();
    }
  }

  private void bringIntoView(int index) {
    if (index < tiles.size()) {
      Rectangle bounds = tiles.get(index).getBounds();
      bounds.grow(TileRow.MARGIN + FADE, 0);
      row.scrollRectToVisible(bounds);
    }
  }

  @Override
  protected void paintChildren(Graphics graphics) {
    super.paintChildren(graphics);
    Graphics2D g = (Graphics2D) graphics;
    Rectangle view = scroll.getViewport().getViewRect();
    Color ground = getBackground();
    Color clear = new Color(ground.getRGB() & 0xFFFFFF, true);
    // a soft edge where tiles go on beyond it
    if (view.x > 0) {
      g.setPaint(new GradientPaint(0, 0, ground, FADE, 0, clear));
      g.fillRect(0, 0, FADE, getHeight());
    }
    if (view.x + view.width < row.getWidth()) {
      int from = getWidth() - FADE;
      g.setPaint(new GradientPaint(from, 0, clear, getWidth(), 0, ground));
      g.fillRect(from, 0, FADE, getHeight());
    }
  }

  /** Tab visits the chosen tile only: within the strip the arrow keys move. */
  private static final class OnlyTheChosen extends LayoutFocusTraversalPolicy {
    @Override
    protected boolean accept(Component component) {
      boolean passed = component instanceof TargetTileView view && !view.tile().selected();
      return !passed && super.accept(component);
    }
  }
}
