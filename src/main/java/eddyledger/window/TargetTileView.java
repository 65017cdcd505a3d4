package eddyledger.window;

import eddyledger.chart.Palette;
import eddyledger.present.TargetTile;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.event.MouseEvent;
import javax.accessibility.Accessible;
import javax.accessibility.AccessibleAction;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.accessibility.AccessibleState;
import javax.accessibility.AccessibleStateSet;
import javax.swing.JComponent;
import javax.swing.ToolTipManager;

/** One tile of the target strip. */
final class TargetTileView extends JComponent implements Accessible {
  private final Lettering lettering;
  private final Runnable choose;
  private TargetTile tile;
  private TilePainter painter;

  TargetTileView(TargetTile tile, Lettering lettering, Runnable choose) {
    this.tile = tile;
    this.lettering = lettering;
    this.choose = choose;
    setFocusable(true);
    setName("tile-" + tile.conditionId() + "-" + tile.receiverId());
    ToolTipManager.sharedInstance().registerComponent(this);
  }

  TargetTile tile() {
    return tile;
  }

  /** Shows another state of the same receiver and condition. */
  void show(TargetTile other) {
    if (!other.equals(tile)) {
      String before = tile.spoken();
      tile = other;
      getAccessibleContext()
          .firePropertyChange(AccessibleContext.ACCESSIBLE_NAME_PROPERTY, before, tile.spoken());
      repaint();
    }
  }

  void choose() {
    choose.run();
  }

  @Override
  public String getToolTipText(MouseEvent event) {
    return Tip.of(tile.tip());
  }

  @Override
  public AccessibleContext getAccessibleContext() {
    if (accessibleContext == null) {
      accessibleContext = new Spoken();
    }
    return accessibleContext;
  }

  @Override
  protected void paintComponent(Graphics graphics) {
    Palette palette = Theme.palette();
    if (painter == null || !painter.in(palette)) {
      painter = new TilePainter(palette, lettering);
    }
    Graphics2D g = (Graphics2D) graphics.create();
    painter.paint(g, tile, getWidth(), getHeight(), isFocusOwner());
    g.dispose();
  }

  /** What a screen reader learns of the tile, and how it chooses it. */
  private final class Spoken extends AccessibleJComponent implements AccessibleAction {
    @Override
    public String getAccessibleName() {
      return tile.spoken();
    }

    @Override
    public AccessibleRole getAccessibleRole() {
      return AccessibleRole.TOGGLE_BUTTON;
    }

    @Override
    public AccessibleStateSet getAccessibleStateSet() {
      AccessibleStateSet states = super.getAccessibleStateSet();
      if (tile.selected()) {
        states.add(AccessibleState.CHECKED);
      }
      return states;
    }

    @Override
    public AccessibleAction getAccessibleAction() {
      return this;
    }

    @Override
    public int getAccessibleActionCount() {
      return 1;
    }

    @Override
    public String getAccessibleActionDescription(int index) {
      return index == 0 ? "choose" : null;
    }

    @Override
    public boolean doAccessibleAction(int index) {
      choose.run();
      return index == 0;
    }
  }
}
